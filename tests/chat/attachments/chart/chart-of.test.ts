import { describe, expect, test } from 'vitest';
import { chartOf } from '../../../../src/chat/attachments/chart/chart-of.ts';
import type { VesselEvent } from '../../../../src/core/cellar/entry.ts';
import { aimAt } from '../../../../src/core/dose/aim.ts';
import { CASES, OPTIONS, addition, day, entriesOf, reading } from './chart-cases.ts';
import type { Told } from './chart-cases.ts';

const told = (event: VesselEvent, at: number, more: Told = {}): Told =>
  ({ kind: 'vessel', event, at: day(at), ...more }) as Told;
const chart = (entries: readonly Told[], options = {}): ReturnType<typeof chartOf> =>
  chartOf(entriesOf(entries), { ...OPTIONS, ...options });

test('readings and additions are there with their figures, in the order of time and not of noting', () => {
  const data = chart([reading(9, 19), addition(4, 30), reading(0, 21, 58), addition(2)], { limit_mg_L: 150 });
  expect(data).toMatchObject({
    vessel: 'tank 4',
    readings: [
      { at: day(0), free_mg_L: 21, total_mg_L: 58 },
      { at: day(9), free_mg_L: 19 },
    ],
    additions: [{ at: day(2) }, { at: day(4), added_mg_L: 30 }],
    limit_mg_L: 150,
  });
});

test.each<[string, Told[]]>([
  ['nothing at all', []],
  ['a pH alone', [reading(0, undefined, undefined, 3.5)]],
  ['an addition alone', [addition(0, 30)]],
  ['a reading that was struck', [{ ...reading(0, 21), struck: { entry: 2, reason: 'wrong' } }]],
  ['a reading of another vessel', [{ ...reading(0, 21), vessels: ['tank 9'] }]],
  [
    'a wine that is gone, and a new one without a reading',
    [reading(0, 21), told('emptied', 3), told('told', 5, { style: 'red' })],
  ],
  ['a vessel that was forgotten', [reading(0, 21), told('forgotten', 3)]],
])('there is no picture of %s', (_, entries) => {
  expect(chart(entries)).toBeUndefined();
});

test('what was struck and what strikes it are left out', () => {
  const { entries } = CASES['a struck reading'] ?? { entries: [] };
  expect(chartOf(entries, OPTIONS)?.readings.map(({ free_mg_L }) => free_mg_L)).toEqual([21, 20]);
});

test('an addition to several vessels is as many mg/L in each', () => {
  const shared = { ...addition(1, 30), vessels: ['tank 3', 'tank 4'] };
  expect(chart([reading(0, 21), shared])?.additions).toEqual([{ at: day(1), added_mg_L: 30 }]);
});

describe('a picture shows the wine that is in the vessel', () => {
  test('and not the one that was in it before', () => {
    const data = chart([reading(0, 99, 150, 3.2), told('emptied', 5), reading(8, 21, 58, 3.5)]);
    expect(data?.readings).toEqual([{ at: day(8), free_mg_L: 21, total_mg_L: 58 }]);
    expect(data?.needed).toMatchObject([{ at: day(8), ph: 3.5 }]);
  });

  test('of an empty vessel it shows the last one, and since when it is gone', () => {
    expect(chart([reading(0, 21), told('emptied', 5)])).toMatchObject({
      readings: [{ at: day(0) }],
      empty: day(5),
    });
  });

  test('it says where the wine came from; with the entries of that vessel its pH is known too', () => {
    const move = told('moved', 5, { vessels: ['tank 9'], to: 'tank 4' });
    const before = { ...reading(0, 30, 80, 3.5), vessels: ['tank 9'] };
    const alone = chart([move, reading(8, 21, 58)]);
    expect(alone).toMatchObject({
      came_from: { at: day(5), vessels: ['tank 9'] },
      readings: [{ at: day(8) }],
    });
    expect(alone?.needed).toEqual([{ at: day(5), nothing: 'no-ph' }]);
    expect(chart([before, move, reading(8, 21, 58)])?.needed).toMatchObject([
      { at: day(5), ph: 3.5, ph_at: day(0) },
    ]);
  });

  test.each(['blended', 'moved'] as const)(
    'wine that is %s into other wine is marked, and the pH is not known',
    (event) => {
      const data = chart([
        reading(0, 21, 58, 3.5),
        told(event, 5, { vessels: ['tank 9'], to: 'tank 4' }),
        reading(8, 25),
      ]);
      expect(data?.blended).toEqual([day(5)]);
      expect(data?.readings).toHaveLength(2);
      expect(data?.needed.at(-1)).toEqual({ at: day(5), nothing: 'no-ph' });
    },
  );
});

describe('the free SO2 that is needed', () => {
  const white = { molecular_mg_L: OPTIONS.targets.white };

  test('is what a dose aims at, from each pH to the next', () => {
    const data = chart([reading(0, 21, 58, 3.58), reading(9, 20), reading(20, 19, 57, 3.61)]);
    const aims = [3.58, 3.61].map((ph) => aimAt(white, { ph }, 1.81).target_free_mg_L);
    expect(data?.needed).toEqual([
      { at: day(0), needed_mg_L: aims[0], ph: 3.58, ph_at: day(0), molecular_mg_L: 0.8 },
      { at: day(20), needed_mg_L: aims[1], ph: 3.61, ph_at: day(20), molecular_mg_L: 0.8 },
    ]);
  });

  // Molecular share at pH 3.5 and pK 1.81 from the published 1 + 10^(pH - pK): 49.98, so 0.6 mg/L take 30.
  test.each<[string, Told, number]>([
    ['a red', { style: 'red' }, 0.6],
    ['a white', { style: 'white' }, 0.8],
    ['a sweet wine', { category: 'sweet' }, 1.5],
    ['a wine of which nothing is told', { capacity_L: 500 }, 0.8],
  ])('of %s is reckoned by its own target', (_, traits, molecular_mg_L) => {
    const data = chart([told('told', 0, traits), reading(1, 21, 58, 3.5)]);
    expect(data?.needed.at(-1)).toMatchObject({ molecular_mg_L });
    expect(data?.needed.at(-1)).toHaveProperty('needed_mg_L', expect.closeTo(molecular_mg_L * 49.98, 1));
  });

  test.each<[string, Told]>([
    ['still ferments', { stage: 'fermenting' }],
    ['has malolactic before it', { stage: 'malolactic' }],
    ['is sparkling', { category: 'sparkling' }],
    ['is fortified', { category: 'fortified' }],
    ['has 19 % vol', { alcohol_percent: 19 }],
  ])('is nothing of a wine that %s', (_, traits) => {
    const data = chart([told('told', 0, traits), reading(1, 21, 58, 3.5)]);
    expect(data?.needed).toEqual([{ at: day(0), nothing: 'no-target' }]);
  });

  test('ends where an acid made the pH another one, and goes on with the next pH', () => {
    const data = chart([reading(0, 21, 58, 3.58), told('acid', 4), reading(9, 20, 57, 3.4)]);
    expect(data?.needed).toMatchObject([
      { ph: 3.58 },
      { at: day(4), nothing: 'no-ph' },
      { at: day(9), ph: 3.4 },
    ]);
  });

  test('takes the table of the cellar where alcohol and temperature are known', () => {
    const at = { ...reading(1, 21, 58, 3.5), temperature_C: 20, alcohol_percent: 10 };
    const [first] = chart([at], { basis: 'oiv' })?.needed ?? [];
    expect(first).toMatchObject({ needed_mg_L: aimAt(white, { ph: 3.5 }, 1.916).target_free_mg_L });
  });
});
