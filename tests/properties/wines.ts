import fc from 'fast-check';
import type { AdditiveAtHand } from '../../src/core/additives/additive-id.ts';
import type { DoseRequest } from '../../src/core/dose/request.ts';
import { LITRES_IN, VOLUME_UNITS } from '../../src/core/units/volume.ts';

/** Any number between two. */
export const upTo = (min: number, max: number): fc.Arbitrary<number> =>
  fc.double({ min, max, noNaN: true, noDefaultInfinity: true });
/** A figure as a person types it. */
const typed = (min: number, max: number, decimals: number): fc.Arbitrary<number> =>
  upTo(min, max).map((value) => Number(value.toFixed(decimals)));

const additives = fc.constantFrom<AdditiveAtHand>(
  { id: 'potassium-metabisulfite' },
  { id: 'potassium-metabisulfite', strength_percent: 96 },
  { id: 'potassium-metabisulfite', strength_percent: 57 },
  { id: 'potassium-metabisulfite', tablet_salt_g: 0.44 },
  { id: 'sodium-metabisulfite' },
  { id: 'potassium-metabisulfite-solution', strength_percent: 10 },
  { id: 'potassium-bisulfite-solution', strength_percent: 15 },
  { id: 'potassium-bisulfite-solution', strength_percent: 30, strength_of: 'salt' },
  { id: 'ammonium-bisulfite-solution', strength_percent: 40 },
  { id: 'sulfur-dioxide-solution', strength_percent: 6 },
  { id: 'sulfur-dioxide-gas' },
  { id: 'sulfur-dioxide-gas', strength_percent: 99.9 },
  { id: 'tablet', tablet_SO2_g: 5 },
);

const volumes = fc
  .record({ value: typed(0.5, 10_000, 1), unit: fc.constantFrom(...VOLUME_UNITS) })
  .map((volume_display) => ({
    volume_display,
    volume_L: volume_display.value * LITRES_IN[volume_display.unit],
  }));

/** Questions for a dose of any finished wine, with readings, volume and additive. */
export const requests: fc.Arbitrary<DoseRequest & { volume_L: number; ph: number; free_mg_L: number }> = fc
  .tuple(
    volumes,
    fc.record({
      ph: typed(2.8, 4.2, 2),
      free_mg_L: typed(0, 60, 1),
      additive: additives,
      target: fc.oneof(
        typed(0.3, 2, 2).map((molecular_mg_L) => ({ molecular_mg_L })),
        typed(1, 120, 1).map((free_mg_L) => ({ free_mg_L })),
        typed(1, 120, 1).map((add_mg_L) => ({ add_mg_L })),
      ),
      targetStated: fc.boolean(),
      stage: fc.constant('finished' as const),
      stageStated: fc.boolean(),
      basis: fc.constantFrom('pk-1.81' as const, 'oiv' as const),
      alcohol_percent: typed(8, 16, 1),
      temperature_C: typed(15, 30, 0),
      style: fc.constantFrom('red' as const, 'white' as const),
    }),
    fc.oneof(
      fc.constant({}),
      typed(1, 100, 0).map((binding_allowance_percent) => ({ binding_allowance_percent })),
      fc.constantFrom({ binding_share: 1 / 3 }, { binding_share: 0.5 }, { binding_share: 0.35 }),
    ),
    fc.oneof(
      fc.constant({}),
      fc.integer({ min: 2, max: 40 }).map((vessels) => ({ vessels })),
    ),
    fc.oneof(
      fc.constant({}),
      typed(60, 300, 0).map((total_mg_L) => ({ total_mg_L })),
    ),
  )
  .map(([volume, request, allowance, vessels, total]) => ({
    ...volume,
    ...request,
    ...allowance,
    ...vessels,
    ...total,
  }));
