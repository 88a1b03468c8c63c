import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { AdditiveAtHand } from '../../src/core/additives/additive-id.ts';
import { dose } from '../../src/core/dose/dose.ts';
import { effect } from '../../src/core/dose/effect.ts';
import type { DoseRequest } from '../../src/core/dose/request.ts';
import { plainText } from '../../src/core/working.ts';
import { toStep } from '../../src/core/dose/rounding.ts';
import { LITRES_IN, VOLUME_UNITS } from '../../src/core/units/volume.ts';
import { loose, wrongIn } from '../core/dose/evaluate-step.ts';

const upTo = (min: number, max: number): fc.Arbitrary<number> =>
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

const requests: fc.Arbitrary<DoseRequest & { volume_L: number; ph: number; free_mg_L: number }> = fc
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

describe('dose() and effect() are two ways to one number', () => {
  test('what a dose without allowance says, put back in, gives its target', () => {
    fc.assert(
      fc.property(requests, (request) => {
        const {
          binding_allowance_percent: _allowance,
          binding_share: _share,
          vessels: _vessels,
          ...plain
        } = request;
        const answer = dose(plain);
        if (answer.SO2_g === undefined) return;
        const { mass_g, additive_volume_mL, tablets } = answer;
        const back = effect({
          ...plain,
          ...(mass_g === undefined ? {} : { mass_g }),
          ...(additive_volume_mL === undefined ? {} : { additive_volume_mL }),
          ...(tablets === undefined ? {} : { tablets }),
          toStopFermentation: false,
        });
        const wanted = answer.free_after_mg_L ?? Number.NaN;
        expect(Math.abs((back.free_after_mg_L ?? 0) / wanted - 1)).toBeLessThan(1e-9);
        expect(
          Math.abs((back.molecular_after_mg_L ?? 0) / (answer.molecular_after_mg_L ?? 0) - 1),
        ).toBeLessThan(1e-9);
        if ('free_mg_L' in plain.target!)
          expect(Math.abs(wanted - plain.target.free_mg_L)).toBeLessThan(1e-9);
      }),
      { numRuns: 2000, seed: 1 },
    );
  });
});

describe('dose() agrees with plain arithmetic', () => {
  test('over 10,000 wines, within 1e-9', () => {
    // Shares written out from the atomic weights of K, S and O, apart from the code under test.
    const share = (2 * (32.06 + 2 * 15.999)) / (2 * 39.0983 + 2 * 32.06 + 5 * 15.999);
    fc.assert(
      fc.property(
        upTo(1, 1e6),
        upTo(2.8, 4.2),
        upTo(0, 100),
        upTo(0.1, 2),
        upTo(0, 100),
        (volume_L, ph, free_mg_L, molecular_mg_L, binding_allowance_percent) => {
          const answer = dose({
            volume_L,
            ph,
            free_mg_L,
            target: { molecular_mg_L },
            targetStated: true,
            binding_allowance_percent,
            additive: { id: 'potassium-metabisulfite' },
            stage: 'finished',
            stageStated: true,
            basis: 'pk-1.81',
          });
          const powers = 1 + Math.exp(Math.LN10 * (ph - 1.81));
          const need = Math.max(0, molecular_mg_L * powers - free_mg_L);
          const dosed = need + (need * binding_allowance_percent) / 100;
          const mass_g = (dosed * volume_L) / share / 1000;
          const close = (a: number, b: number): boolean => Math.abs(a - b) <= 1e-9 * Math.max(Math.abs(b), 1);
          expect(close(answer.molecular_mg_L ?? Number.NaN, free_mg_L / powers)).toBe(true);
          expect(close(answer.dose_mg_L ?? Number.NaN, dosed)).toBe(true);
          // A need that is the small difference of two figures carries their last digits.
          const slack = 1e-9 * mass_g + (1e-13 * molecular_mg_L * powers * 2 * volume_L) / share / 1000;
          expect(Math.abs((answer.mass_g ?? 0) - mass_g)).toBeLessThanOrEqual(slack);
        },
      ),
      { numRuns: 10_000, seed: 2 },
    );
  });
});

describe('the working', () => {
  test('evaluates line by line as it stands, each line carries on with the printed one, the last gives the measure', () => {
    fc.assert(
      fc.property(requests, (request) => {
        const { steps, measure } = dose(request);
        expect(steps.map(wrongIn).filter(Boolean)).toEqual([]);
        expect(loose(steps)).toEqual([]);
        const last = steps.at(-1)?.result;
        if (measure === undefined || last === undefined) return;
        const size =
          measure.unit === 'kg' || measure.unit === 'L'
            ? Number((measure.value * 1000).toFixed(2))
            : measure.value;
        // The printed line rounds to the very figure that the instrument shows, by one of the instrument's steps.
        const steps_of = last.unit === '' ? [0.5] : [0.01, 0.1, 1, 10];
        const rounded = steps_of.flatMap((one) => [toStep(last.value, one), toStep(last.value, one, true)]);
        expect(rounded).toContain(size);
      }),
      { numRuns: 1500, seed: 3 },
    );
  });

  test('shows no raw double: no number of more than 15 digits, none with an exponent', () => {
    fc.assert(
      fc.property(requests, (request) => {
        for (const { substituted, result } of dose(request).steps) {
          for (const number of `${substituted} ${plainText(result.value)}`.match(/[\d.]+(e[-+]?\d+)?/g) ??
            []) {
            expect(number).not.toContain('e');
            expect(number.replace(/^0\.0*|\./g, '').length).toBeLessThanOrEqual(15);
          }
        }
      }),
      { numRuns: 1500, seed: 4 },
    );
  });
});

describe('rounding', () => {
  test('of a dose that keeps to the limit never passes it', () => {
    fc.assert(
      fc.property(requests, (request) => {
        const answer = dose({ ...request, total_mg_L: 100 });
        const limit_mg_L = request.style === 'red' ? 150 : 200;
        if (answer.dose_mg_L === undefined || answer.rounding_mg_L === undefined) return;
        if (100 + answer.dose_mg_L > limit_mg_L) return;
        expect(100 + answer.dose_mg_L + answer.rounding_mg_L).toBeLessThanOrEqual(limit_mg_L + 1e-9);
      }),
      { numRuns: 3000, seed: 5 },
    );
  });

  test('changes no more than 1 % or 0.5 mg/L, or it says so', () => {
    fc.assert(
      fc.property(requests, (request) => {
        const answer = dose(request);
        const shown = answer.per_vessel ?? answer;
        if (answer.dose_mg_L === undefined || shown.rounding_mg_L === undefined) return;
        const coarse =
          Math.abs(shown.rounding_mg_L) > 0.5 * (1 + 1e-9) &&
          Math.abs(shown.rounding_mg_L) > 0.01 * answer.dose_mg_L * (1 + 1e-9);
        if (coarse) expect(answer.warnings.map(({ code }) => code)).toContain('rounding-coarse');
      }),
      { numRuns: 3000, seed: 6 },
    );
  });
});

describe('an answer', () => {
  test('has no number that is none, and nothing negative but a rounding or a change', () => {
    fc.assert(
      fc.property(requests, (request) => {
        const visit = (value: unknown, key: string): void => {
          if (typeof value === 'number') {
            expect(Number.isFinite(value)).toBe(true);
            if (!/rounding_mg_L|need_change_mg_L/.test(key)) expect(value).toBeGreaterThanOrEqual(0);
          } else if (typeof value === 'object' && value !== null) {
            for (const [name, part] of Object.entries(value)) visit(part, name);
          }
        };
        visit(dose(request), '');
      }),
      { numRuns: 2000, seed: 7 },
    );
  });

  test('is plain data without an undefined key, so that it can be kept as JSON', () => {
    fc.assert(
      fc.property(requests, (request) => {
        const answer = dose(request);
        expect(JSON.parse(JSON.stringify(answer))).toStrictEqual(answer);
      }),
      { numRuns: 500, seed: 8 },
    );
  });
});
