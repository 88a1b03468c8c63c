import { expect, test } from 'vitest';
import { applyEntry } from '../../../src/core/cellar/apply-entry.ts';
import type { Entry, Happening } from '../../../src/core/cellar/entry.ts';
import { forecastOf, freePoints } from '../../../src/core/cellar/forecast-of.ts';
import { learnedOf } from '../../../src/core/cellar/learned-of.ts';
import type { Vessel } from '../../../src/core/cellar/vessel.ts';

const DAY_ms = 86_400_000;

/** The vessels after some happenings, a day apart. */
function after(...happenings: readonly Happening[]): ReadonlyMap<string, Vessel> {
  const vessels = new Map<string, Vessel>();
  for (const [i, happening] of happenings.entries()) {
    const entry: Entry = {
      ...happening,
      entry: i + 1,
      key: `k${i}`,
      at: i * DAY_ms,
      noted_at: i * DAY_ms,
      by: 1,
    };
    for (const [name, vessel] of applyEntry(vessels, entry)) {
      if (vessel === undefined) vessels.delete(name);
      else vessels.set(name, vessel);
    }
  }
  return vessels;
}

const read = (vessel: string, free_mg_L: number): Happening => ({
  kind: 'reading',
  vessels: [vessel],
  free_mg_L,
});
const add = (vessel: string, added_mg_L: number): Happening => ({
  kind: 'addition',
  vessels: [vessel],
  added_mg_L,
});
const holds = (vessel: string, volume_L: number): Happening => ({
  kind: 'vessel',
  event: 'told',
  vessels: [vessel],
  volume_L,
});
/** Two additions of 20 mg/L of which `bound` binds. */
const dosed = (vessel: string, bound: number): Happening[] => [
  read(vessel, 20),
  add(vessel, 20),
  read(vessel, 20 + 20 * (1 - bound)),
  add(vessel, 20),
  read(vessel, 20 + 40 * (1 - bound)),
];
const brought = (vessel: string, to: string, volume_L?: number): Happening => ({
  kind: 'vessel',
  event: 'moved',
  vessels: [vessel],
  to,
  ...(volume_L !== undefined && { volume_L }),
});
const shareOf = (vessels: ReadonlyMap<string, Vessel>, name: string): number | undefined => {
  const vessel = vessels.get(name);
  return vessel && learnedOf(vessel)?.share;
};

test('what was learned of a wine goes with it when it is moved', () => {
  const vessels = after(...dosed('T4', 0.4), brought('T4', 'T9'));
  expect(shareOf(vessels, 'T9')).toBeCloseTo(0.4, 9);
  expect(shareOf(vessels, 'T4')).toBeUndefined();
});

test('a blend binds by volume, until its own additions tell', () => {
  const both = [holds('T4', 3000), holds('T7', 1000), ...dosed('T4', 0.2), ...dosed('T7', 0.6)];
  expect(shareOf(after(...both, brought('T7', 'T4')), 'T4')).toBeCloseTo(0.3, 9);
  expect(shareOf(after(...both, brought('T7', 'T4', 500)), 'T4')).toBeCloseTo(
    (0.2 * 3000 + 0.6 * 500) / 3500,
    9,
  );
  const dosedAgain = shareOf(after(...both, brought('T7', 'T4'), ...dosed('T4', 0.5)), 'T4') ?? 0;
  expect(dosedAgain).toBeGreaterThan(0.3);
  expect(dosedAgain).toBeLessThan(0.5);
});

test('of a blend with a wine that nothing was learned of, nothing is known', () => {
  const both = [holds('T4', 3000), holds('T7', 1000), ...dosed('T4', 0.2), read('T7', 10)];
  expect(shareOf(after(...both, brought('T7', 'T4')), 'T4')).toBeUndefined();
});

test('after malolactic it is learned anew', () => {
  const malo = (stage: 'malolactic' | 'finished'): Happening => ({
    kind: 'vessel',
    event: 'told',
    vessels: ['T4'],
    stage,
  });
  const over = [...dosed('T4', 0.4), malo('malolactic'), malo('finished')];
  expect(shareOf(after(...over), 'T4')).toBeUndefined();
  expect(shareOf(after(...over, ...dosed('T4', 0.3)), 'T4')).toBeCloseTo(0.3, 9);
});

test('a forecast looks only at readings since the last addition, and of this wine', () => {
  const vessels = after(read('T4', 30), add('T4', 20), read('T4', 40), read('T4', 39), read('T4', 38));
  expect(
    vessels.get('T4') && freePoints(vessels.get('T4') as Vessel).map(({ free_mg_L }) => free_mg_L),
  ).toEqual([40, 39, 38]);
  const blended = after(read('T4', 30), read('T7', 30), brought('T7', 'T4'), read('T4', 31));
  expect(freePoints(blended.get('T4') as Vessel)).toEqual([{ at: 3 * DAY_ms, free_mg_L: 31 }]);
  expect(forecastOf(blended.get('T4') as Vessel, 20)).toEqual({ by: 'none', why: 'no-rate' });
});

test('a forecast begins anew when the wine was racked, moved or partly taken, and not when it was topped', () => {
  const readings = [read('T4', 30), read('T4', 29), read('T4', 28)];
  const happens = (event: 'racked' | 'topped'): Happening => ({ kind: 'vessel', event, vessels: ['T4'] });
  const pointsOf = (name: string, ...happenings: readonly Happening[]): number =>
    freePoints(after(...happenings).get(name) as Vessel).length;
  expect(pointsOf('T4', ...readings, happens('topped'), read('T4', 27))).toBe(4);
  expect(pointsOf('T4', ...readings, happens('racked'), read('T4', 24))).toBe(1);
  expect(pointsOf('T4', ...readings, brought('T4', 'T9', 100), read('T4', 24))).toBe(1);
  expect(pointsOf('T9', ...readings, brought('T4', 'T9'), read('T9', 27), read('T9', 26))).toBe(2);
});

test('a reading of weeks before the addition, and one of almost no free SO2, teach nothing', () => {
  const days = Array.from({ length: 9 }, () => read('T7', 20));
  const old = [read('T4', 20), ...days, add('T4', 20), read('T4', 28), add('T4', 20), read('T4', 36)];
  expect(shareOf(after(...old), 'T4')).toBeUndefined();
  expect(shareOf(after(...dosed('T4', 0.4), read('T4', 4), add('T4', 30), read('T4', 12)), 'T4')).toBeCloseTo(
    0.4,
    9,
  );
});

test('of a reading and an addition of the same minute, the one that was told first came first', () => {
  const atOnce = (...happenings: readonly Happening[]): Vessel => {
    const vessels = new Map<string, Vessel>();
    for (const [i, happening] of happenings.entries())
      for (const [name, vessel] of applyEntry(vessels, {
        ...happening,
        entry: i + 1,
        key: `k${i}`,
        at: 0,
        noted_at: 0,
        by: 1,
      }))
        if (vessel !== undefined) vessels.set(name, vessel);
    return vessels.get('T4') as Vessel;
  };
  expect(freePoints(atOnce(read('T4', 12), add('T4', 25))).length).toBe(0);
  expect(freePoints(atOnce(add('T4', 25), read('T4', 28))).length).toBe(1);
  const blended: Happening = { kind: 'vessel', event: 'blended', vessels: ['T7'], to: 'T4' };
  expect(freePoints(atOnce(read('T4', 22), read('T7', 30), blended)).length).toBe(0);
});

test('a forecast begins anew where free SO2 rose and nothing was noted, and at bottling', () => {
  const free = (...figures: readonly number[]): readonly number[] =>
    freePoints(after(...figures.map((one) => read('T4', one))).get('T4') as Vessel).map(
      (one) => one.free_mg_L,
    );
  expect(free(26, 40, 36, 30)).toEqual([40, 36, 30]);
  expect(free(30, 33, 31, 29)).toEqual([30, 33, 31, 29]);
  expect(free(2, 4, 3)).toEqual([2, 4, 3]);
  const bottled: Happening = { kind: 'vessel', event: 'told', vessels: ['T4'], stage: 'bottled' };
  const vessel = after(read('T4', 30), read('T4', 29), bottled, read('T4', 28)).get('T4') as Vessel;
  expect(freePoints(vessel).length).toBe(1);
  expect(forecastOf(vessel, 20).by).toBe('published');
});
