import fc from 'fast-check';
import { expect, test } from 'vitest';
import { totalsToFetch, type Weighed } from '../../../src/core/dose/totals-to-fetch.ts';

const powder = { id: 'potassium-metabisulfite' } as const;
const weighed = (value: number, unit: Weighed['measure']['unit'], more: Partial<Weighed> = {}): Weighed => ({
  additive: powder,
  measure: { value, unit },
  count: 1,
  ...more,
});

test('what is fetched is the sum of what the lines show, and not of what was reckoned', () => {
  expect(totalsToFetch([weighed(0.1, 'g'), weighed(0.2, 'g')])).toEqual([
    { additive: 'potassium-metabisulfite', mass_g: 0.3, measure: { value: 0.3, unit: 'g' } },
  ]);
});

test('grams and kilograms are one additive, and from a kilogram on the sum is one of kilograms', () => {
  expect(totalsToFetch([weighed(980, 'g'), weighed(1.24, 'kg')])[0]).toMatchObject({
    mass_g: 2220,
    measure: { value: 2.22, unit: 'kg' },
  });
});

test('each of several vessels gets what is shown', () => {
  expect(totalsToFetch([weighed(7.8, 'g', { count: 24 })])[0]?.mass_g).toBe(187.2);
});

test('another strength, another size and the rest of a tablet are other things to fetch', () => {
  const solution = { id: 'potassium-metabisulfite-solution', strength_percent: 10 } as const;
  const totals = totalsToFetch([
    weighed(2.5, 'tablets', { additive: { id: 'tablet', tablet_SO2_g: 2 } }),
    weighed(3, 'tablets', { additive: { id: 'tablet', tablet_SO2_g: 5 } }),
    weighed(8.4, 'mL', { additive: solution }),
    weighed(1.2, 'L', { additive: { ...solution, strength_percent: 5 } }),
    weighed(0.5, 'tablets', { additive: { id: 'tablet', tablet_SO2_g: 2 } }),
  ]);
  expect(totals.map(({ measure }) => measure)).toEqual([
    { value: 3, unit: 'tablets' },
    { value: 3, unit: 'tablets' },
    { value: 8.4, unit: 'mL' },
    { value: 1.2, unit: 'L' },
  ]);
});

test('the sum of a round is the same in whatever order its lines come', () => {
  const line = fc.record({
    hundredths: fc.integer({ min: 1, max: 500_000 }),
    count: fc.integer({ min: 1, max: 60 }),
  });
  fc.assert(
    fc.property(fc.array(line, { minLength: 1, maxLength: 60 }), (lines) => {
      const all = lines.map(({ hundredths, count }) => weighed(hundredths / 100, 'g', { count }));
      const grams = lines.reduce((sum, { hundredths, count }) => sum + BigInt(hundredths * count), 0n);
      expect(totalsToFetch(all)).toEqual(totalsToFetch(all.toReversed()));
      expect(BigInt(Math.round((totalsToFetch(all)[0]?.mass_g ?? 0) * 100))).toBe(grams);
    }),
  );
});
