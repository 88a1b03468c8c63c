import fc from 'fast-check';
import { expect, test } from 'vitest';
import { dose } from '../../src/core/dose/dose.ts';
import { effect } from '../../src/core/dose/effect.ts';
import type { DoseRequest } from '../../src/core/dose/request.ts';
import { solution } from '../../src/core/dose/solution.ts';
import { upTo } from './wines.ts';

const RUNS = { numRuns: 2000, seed: 5 } as const;
const POWDER = { id: 'potassium-metabisulfite' } as const;
const stockOf = (strength_percent: number) =>
  ({ id: 'potassium-metabisulfite-solution', strength_percent }) as const;
const close = (a: number | undefined, b: number | undefined): void =>
  expect(Math.abs((a ?? Number.NaN) - (b ?? Number.NaN))).toBeLessThan(1e-9 * Math.max(1, Math.abs(b ?? 0)));

const WINE = {
  stage: 'finished',
  stageStated: true,
  targetStated: true,
  basis: 'pk-1.81',
} as const satisfies DoseRequest;

test('a stock that is made and used gives the wine the powder that the dose asks for', () => {
  fc.assert(
    fc.property(
      upTo(1, 25),
      upTo(0.1, 100),
      upTo(1, 10_000),
      upTo(1, 100),
      (percent, made_L, volume_L, add) => {
        const wine = { ...WINE, volume_L, target: { add_mg_L: add } };
        const { salt_g = 0 } = solution({ volume_L: made_L, additive: stockOf(percent) });
        const { additive_volume_mL = 0 } = dose({ ...wine, additive: stockOf(percent) });
        close((salt_g / (made_L * 1000)) * additive_volume_mL, dose({ ...wine, additive: POWDER }).mass_g);
      },
    ),
    RUNS,
  );
});

test('the millilitres that a stock takes for a barrel bring what they say', () => {
  fc.assert(
    fc.property(upTo(1, 25), upTo(0.1, 10), upTo(1, 100), (percent, volume_L, rise_mg_L) => {
      const { per_barrel } = solution({ volume_L, additive: stockOf(percent), rise_mg_L });
      const { adds_mg_L } = effect({
        ...WINE,
        toStopFermentation: false,
        volume_L: per_barrel?.barrel_L ?? Number.NaN,
        additive: stockOf(percent),
        additive_volume_mL: per_barrel?.additive_volume_mL ?? Number.NaN,
      });
      close(adds_mg_L, rise_mg_L);
    }),
    RUNS,
  );
});

test('what stands before bottling, less what the oxygen takes, is what was aimed at', () => {
  fc.assert(
    fc.property(
      upTo(2.8, 4.2),
      upTo(0.1, 2),
      upTo(0, 20),
      upTo(1, 5),
      (ph, molecular_mg_L, oxygen_mg_L, each) => {
        const wine = { ...WINE, ph, free_mg_L: 0, target: { molecular_mg_L } };
        const before = dose({ ...wine, oxygen_mg_L, SO2_mg_per_mg_O2: each }).free_after_mg_L;
        close((before ?? Number.NaN) - oxygen_mg_L * each, dose(wine).free_after_mg_L);
      },
    ),
    RUNS,
  );
});

test('must of fruit by weight takes what the same litres take', () => {
  fc.assert(
    fc.property(upTo(1, 100_000), upTo(20, 100), upTo(1, 100), (fruit_kg, yield_L_per_100_kg, add_mg_L) => {
      const volume_L = (fruit_kg * yield_L_per_100_kg) / 100;
      const must = { ...WINE, stage: 'must', volume_L, target: { add_mg_L }, additive: POWDER } as const;
      close(dose({ ...must, fruit: { fruit_kg, yield_L_per_100_kg } }).mass_g, dose(must).mass_g);
    }),
    RUNS,
  );
});
