import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { dose } from '../../src/core/dose/dose.ts';
import { effect } from '../../src/core/dose/effect.ts';
import { requests, upTo } from './wines.ts';

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
