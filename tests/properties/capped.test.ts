import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { capped } from '../../src/core/dose/capped.ts';
import { dose } from '../../src/core/dose/dose.ts';
import type { CappedDose, DoseAnswer } from '../../src/core/dose/answer.ts';
import type { DoseRequest } from '../../src/core/dose/request.ts';
import { toStep } from '../../src/core/dose/rounding.ts';
import { REGIONS } from '../../src/core/limits/region.ts';
import { loose, wrongIn } from '../core/dose/evaluate-step.ts';
import { requests, upTo } from './wines.ts';

const lawful = fc
  .tuple(
    requests,
    fc.record({
      region: fc.constantFrom(...REGIONS),
      sugar_g_L: upTo(0, 120),
      total_mg_L: upTo(60, 420),
    }),
    fc.oneof(
      fc.constant({}),
      upTo(0, 60).map((reserve_mg_L) => ({ reserve_mg_L })),
    ),
    fc.oneof(
      fc.constant({}),
      upTo(0.99, 1.08).map((density_kg_L) => ({ density_kg_L })),
    ),
  )
  .map(([request, law, reserve, density]): DoseRequest & { total_mg_L: number; free_mg_L: number } => ({
    ...request,
    ...law,
    ...reserve,
    ...density,
  }));

/** What the wine has of what a limit counts, with what the instrument shows in it. */
function reached(answer: DoseAnswer, request: { total_mg_L: number; free_mg_L: number }) {
  const { capped: cap } = answer;
  // A stock is of the powder in grams per 100 mL, measured in whole or tenths of millilitres.
  const isMore = ({ stock }: Pick<CappedDose, 'stock'>): boolean =>
    stock !== undefined &&
    stock.measure.unit === 'mL' &&
    stock.measure.value > stock.additive_volume_mL * (1 + 1e-9);
  if (cap !== undefined) expect([isMore(cap), isMore(cap.per_vessel ?? {})]).toEqual([false, false]);
  const into = cap === undefined ? 0 : cap.dose_mg_L + (cap.rounding_mg_L ?? 0);
  const each = cap === undefined ? 0 : cap.dose_mg_L + (cap.per_vessel?.rounding_mg_L ?? 0);
  return { total: request.total_mg_L + Math.max(into, each), free: request.free_mg_L + Math.max(into, each) };
}

describe('the dose that keeps under the limit', () => {
  test('stays 15 mg/L and the reserve under every limit that was read, after rounding too', () => {
    let tried = 0;
    fc.assert(
      fc.property(lawful, (request) => {
        const answer = dose(request);
        if (answer.capped === undefined || answer.capped.dose_mg_L === 0) return;
        tried += 1;
        const after = reached(answer, request);
        for (const { of, limit_mg_L, confidence } of answer.limits ?? [])
          if (confidence === 'read')
            expect(after[of] + 15 + (request.reserve_mg_L ?? 0)).toBeLessThanOrEqual(limit_mg_L + 1e-6);
      }),
      { numRuns: 4000, seed: 41 },
    );
    expect(tried).toBeGreaterThan(200);
  });

  test('is less than the full dose, and there only where that one passes a limit that was read', () => {
    fc.assert(
      fc.property(lawful, (request) => {
        const { capped: cap, dose_mg_L = 0, limits = [] } = dose(request);
        const kept = request.reserve_mg_L ?? 0;
        const before = { total: request.total_mg_L, free: request.free_mg_L };
        const room = limits
          .filter(({ confidence }) => confidence === 'read')
          .map(
            ({ of, limit_mg_L, operator }) => limit_mg_L - before[of] - kept - (operator === '<' ? 1e-9 : 0),
          );
        const passes = room.some((one) => dose_mg_L > one + 1e-6);
        if (cap === undefined) {
          expect(dose_mg_L > 0 && passes).toBe(false);
          return;
        }
        expect(cap.dose_mg_L).toBeLessThan(dose_mg_L);
        expect(room.some((one) => dose_mg_L > one - 1e-6)).toBe(true);
      }),
      { numRuns: 4000, seed: 42 },
    );
  });

  test('has a working that evaluates line by line and leads to what is weighed', () => {
    fc.assert(
      fc.property(lawful, (request) => {
        const cap = dose(request).capped;
        if (cap?.measure === undefined) return;
        expect(cap.steps[0]?.name).toBe('room-to-limit');
        expect(cap.steps[0]?.result).toEqual({ value: cap.dose_mg_L, unit: 'mg/L' });
        expect(cap.steps.map(wrongIn).filter(Boolean)).toEqual([]);
        expect(loose(cap.steps)).toEqual([]);
        const last = cap.steps.at(-1)?.result;
        const { value, unit } = cap.measure;
        const size = unit === 'kg' || unit === 'L' ? Number((value * 1000).toFixed(2)) : value;
        const marks = last?.unit === '' ? [0.5] : [0.01, 0.1, 1, 10];
        expect(
          marks.flatMap((one) => [toStep(last?.value ?? 0, one), toStep(last?.value ?? 0, one, true)]),
        ).toContain(size);
      }),
      { numRuns: 1500, seed: 43 },
    );
  });

  test('is none where the total is unknown and passes at its least', () => {
    const answer = dose({
      style: 'red',
      volume_L: 1000,
      free_mg_L: 60,
      additive: { id: 'potassium-metabisulfite' },
      target: { add_mg_L: 100 },
      targetStated: true,
      stage: 'finished',
      stageStated: true,
      basis: 'pk-1.81',
    });
    expect(answer.capped).toEqual({ dose_mg_L: 0, rule: 'oiv-red-dry', kept_mg_L: 15, steps: [] });
    expect(answer.warnings.find(({ code }) => code === 'total-unknown')?.values).toMatchObject({
      most_total_mg_L: 50,
      room_mg_L: 75,
    });
  });
});

test('two half doses are one: what is left after the first is what the whole has left', () => {
  fc.assert(
    fc.property(lawful, upTo(1, 60), (wine, half_mg_L) => {
      const {
        target: _target,
        binding_allowance_percent: _allowance,
        binding_share: _share,
        ...request
      } = wine;
      const ask = (add_mg_L: number, total_mg_L: number, free_mg_L: number): DoseAnswer =>
        dose({
          ...request,
          total_mg_L,
          free_mg_L,
          target: { add_mg_L },
          targetStated: true,
        });
      const whole = ask(2 * half_mg_L, request.total_mg_L, request.free_mg_L);
      const second = ask(half_mg_L, request.total_mg_L + half_mg_L, request.free_mg_L + half_mg_L);
      expect(second.total_after_mg_L).toBeCloseTo(whole.total_after_mg_L ?? Number.NaN, 6);
      const overIn = ({ warnings }: DoseAnswer): readonly unknown[] =>
        warnings.filter(({ code }) => code.endsWith('over-limit')).map(({ values }) => values['rule']);
      expect(overIn(second)).toEqual(overIn(whole));
    }),
    { numRuns: 2000, seed: 44 },
  );
});

test('what is capped is a function of its own, which a dose of nothing leaves alone', () => {
  const room = { found: { notes: [] }, least_total_mg_L: 0, totalKnown: true, kept_mg_L: 15 };
  const request = { stage: 'finished', stageStated: true, targetStated: true, basis: 'pk-1.81' } as const;
  expect(capped(request, { dose_mg_L: 0, add_mg_L: 0 }, room, 1.81)).toBeUndefined();
  expect(capped(request, { dose_mg_L: 500, add_mg_L: 500 }, room, 1.81)).toBeUndefined();
});
