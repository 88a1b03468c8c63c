import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { dose } from '../../src/core/dose/dose.ts';
import { toStep } from '../../src/core/dose/rounding.ts';
import { plainText, roundTo } from '../../src/core/working.ts';
import { loose, wrongIn } from '../core/dose/evaluate-step.ts';
import { requests } from './wines.ts';

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

  test('says the free SO2 needed and the dose as the answer does, to three digits', () => {
    fc.assert(
      fc.property(requests, (request) => {
        const answer = dose(request);
        const printed = (...names: string[]): number | undefined =>
          answer.steps.findLast(({ name }) => names.includes(name))?.result.value;
        const pairs = [
          [printed('free-needed'), answer.target_free_mg_L],
          [printed('addition', 'dose-with-allowance', 'dose-with-share'), answer.dose_mg_L],
        ] as const;
        for (const [shown, exact] of pairs) {
          // At a rounding mark the last bit of a double decides.
          if (shown === undefined || exact === undefined || Math.abs(shown - exact) < 1e-12 * exact) continue;
          expect(roundTo(shown, 3)).toBe(roundTo(exact, 3));
        }
      }),
      { numRuns: 2000, seed: 9 },
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
