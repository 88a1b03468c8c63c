import { expect, test } from 'vitest';
import { CHECK_DEFAULTS } from '../../../src/core/cellar/check-settings.ts';
import { dueVessels } from '../../../src/core/cellar/due-vessels.ts';
import { freshVessel } from '../../../src/core/cellar/fresh-vessel.ts';
import { isBarrel } from '../../../src/core/cellar/is-barrel.ts';
import { nextCheck } from '../../../src/core/cellar/next-check.ts';
import { reminderAt } from '../../../src/core/cellar/reminder-at.ts';
import { isoWithZone } from '../../../src/core/time/iso-with-zone.ts';
import type { Vessel } from '../../../src/core/cellar/vessel.ts';
import type { Stage } from '../../../src/core/wine.ts';

const HOUR = 3_600_000;
const DAY = 24 * HOUR;
const START = Date.parse('2026-09-01T08:00Z');

/** A vessel heard of on day 0; days may be fractions. */
function vessel(name: string, facts: Partial<Vessel> = {}): Vessel {
  return { ...freshVessel(name, { entry: 1, at: START }), ...facts };
}

const free = (value: number, days: number): Partial<Vessel> => ({
  free_mg_L: { value, at: START + days * DAY, entry: 2 },
});

/** Additions on these days, none of which has landed. */
const added = (...days: readonly number[]): Partial<Vessel> => ({
  additions: days.map((day, index) => ({ entry: 10 + index, at: START + day * DAY, by: 1 })),
  unlanded: days.map((_day, index) => 10 + index),
});

const stage = (value: Stage): Partial<Vessel> => ({ traits: { stage: { value, at: START, entry: 1 } } });

/** `day why`, with `low` and `no dose` where that is said. */
function shown(one: Vessel, settings = CHECK_DEFAULTS): string {
  const check = nextCheck(one, settings);
  if (check === undefined) return 'never';
  const day = (check.at - START) / DAY;
  return `${day} ${check.why}${check.is_low ? ' low' : ''}${check.urges_dose ? '' : ' no dose'}`;
}

// Common practice, no source: 24 hours after an addition, a month after a reading. Own choice: every two weeks.
test.each<[string, Vessel, string]>([
  ['never read: a month after it was heard of', vessel('tank 4'), '30 usual'],
  ['read: a month after that', vessel('tank 4', free(24, 3)), '33 usual'],
  ['10 mg/L is not low', vessel('tank 4', free(10, 3)), '33 usual'],
  ['below 10 mg/L', vessel('tank 4', free(9.9, 3)), '17 often low'],
  ['nothing found', vessel('tank 4', free(0, 3)), '17 often low'],
  ['a barrel', vessel('barrel 17', free(24, 3)), '17 often'],
  ['a barrel never read', vessel('B12'), '14 often'],
  ['tank B is no barrel', vessel('tank B', free(24, 3)), '33 usual'],
  ['an addition', vessel('tank 4', { ...free(24, 3), ...added(5) }), '6 landing'],
  [
    'an addition long after the check was due',
    vessel('tank 4', { ...free(24, 3), ...added(60.25) }),
    '61.25 landing',
  ],
  ['an addition to what was never read', vessel('tank 4', added(0.5)), '1.5 landing'],
  [
    'several additions: after the last',
    vessel('tank 4', { ...free(24, 3), ...added(5, 5.5) }),
    '6.5 landing',
  ],
  [
    'an addition told late, before one that was told',
    vessel('tank 4', { ...free(24, 3), ...added(5.5, 5) }),
    '6.5 landing',
  ],
  ['an addition that landed', vessel('tank 4', { ...free(31, 6), ...added(5), unlanded: [] }), '36 usual'],
  ['an addition to a wine that was low', vessel('tank 4', { ...free(4, 3), ...added(5) }), '6 landing low'],
  ['postponed', vessel('tank 4', { ...free(24, 3), later: START + 40 * DAY }), '40 usual'],
  ['postponed to before it is due', vessel('tank 4', { ...free(24, 3), later: START + 4 * DAY }), '33 usual'],
  ['postponed after an addition', vessel('tank 4', { ...added(5), later: START + 8 * DAY }), '8 landing'],
  ['empty', vessel('tank 4', { ...added(5), empty: START + 6 * DAY }), 'never'],
  ['not watched', vessel('tank 4', { ...added(5), unwatched: true }), 'never'],
  ['bottled', vessel('tank 4', { ...added(5), ...stage('bottled') }), 'never'],
  ['finished', vessel('tank 4', { ...free(24, 3), ...stage('finished') }), '33 usual'],
  ['must', vessel('tank 4', { ...free(24, 3), ...stage('must') }), 'never'],
  ['fermenting', vessel('barrel 17', stage('fermenting')), 'never'],
  ['must with an addition', vessel('tank 4', { ...added(5), ...stage('must') }), 'never'],
  [
    'fermenting with an addition',
    vessel('tank 4', { ...free(2, 3), ...added(5), ...stage('fermenting') }),
    'never',
  ],
  [
    'in malolactic, low as it should be',
    vessel('tank 4', { ...free(2, 3), ...stage('malolactic') }),
    '33 usual no dose',
  ],
  [
    'in malolactic in a barrel',
    vessel('barrel 17', { ...free(2, 3), ...stage('malolactic') }),
    '17 often no dose',
  ],
  ['base wine', vessel('tank 4', { ...free(24, 3), ...stage('base') }), '33 usual no dose'],
  [
    'made by a blend: a month after it',
    vessel('tank 4', { voided: { ph: { event: 'blended', at: START + 9 * DAY } } }),
    '39 usual',
  ],
  [
    'racked and never read: since it was heard of',
    vessel('tank 4', { voided: { volume_L: { event: 'racked', at: START + 9 * DAY } } }),
    '30 usual',
  ],
])('%s (%#): %s', (_case, one, expected) => {
  expect(shown(one)).toBe(expected);
});

test('the times are settings', () => {
  const settings = { after_addition_hours: 48, usual_days: 20, often_days: 7 };
  expect(shown(vessel('tank 4', added(5)), settings)).toBe('7 landing');
  expect(shown(vessel('tank 4', free(24, 3)), settings)).toBe('23 usual');
  expect(shown(vessel('barrel 17', free(24, 3)), settings)).toBe('10 often');
});

test.each([
  ['barrel 17', true],
  ['barrel 17A', true],
  ['B12', true],
  ['B12A', true],
  ['tank 4', false],
  ['tank B', false],
  ['BV12', false],
  ['FB12', false],
  ['barrels', false],
])('whether %s is a barrel: %s', (name, is) => {
  expect(isBarrel(name)).toBe(is);
});

const CELLAR = [
  vessel('tank 1', free(24, 0)), // due on day 30
  vessel('tank 2', free(24, 5)), // 35
  vessel('tank 3', free(6, 10)), // 24, low
  vessel('tank 4', free(4, 12)), // 26, low
  vessel('tank 5', { ...free(24, 0), ...added(36) }), // 37, landing
  vessel('tank 6', { ...free(6, 0), ...added(38.5) }), // 39.5, landing
  vessel('barrel 7', free(24, 20)), // 34
  vessel('tank 8', { ...free(24, 0), empty: START }),
  vessel('tank 9', free(24, 39)), // 69
  vessel('tank 10', free(24, 0)), // 30
];
const due = (day: number, until = day): string[] =>
  dueVessels(CELLAR, { at: START + day * DAY, until: START + until * DAY, settings: CHECK_DEFAULTS }).map(
    (one) => `${one.vessel.vessel} ${one.overdue_days}`,
  );

test('landings come first, then low wines, then the longest overdue', () => {
  expect(due(40)).toEqual([
    'tank 5 3',
    'tank 6 0',
    'tank 3 16',
    'tank 4 14',
    'tank 1 10',
    'tank 10 10',
    'barrel 7 6',
    'tank 2 5',
  ]);
});

test('what falls due at a moment is due at it, and later on the same day where that is asked for', () => {
  expect(due(23.99)).toEqual([]);
  expect(due(24)).toEqual(['tank 3 0']);
  expect(due(39.1)).not.toContain('tank 6 0');
  expect(due(39.1, 39.9)).toContain('tank 6 0');
  expect(due(39.1, 39.5)).not.toContain('tank 6 0');
});

test('a reminder comes exactly 24 hours after the addition, when the clock shows another hour and in the night', () => {
  const evening = Date.parse('2026-10-24T21:05:00+02:00');
  expect(isoWithZone(reminderAt(evening), 'Europe/Madrid')).toBe('2026-10-25T20:05:00+01:00');
  expect(reminderAt(evening) - evening).toBe(24 * HOUR);
});

test('where its own readings say that it may fall short sooner, it is measured then; never later than usual', () => {
  const readings = [0, 7, 14, 21].map((day, index) => ({
    entry: 20 + index,
    at: START + day * DAY,
    free_mg_L: 40 * Math.exp(-0.012 * day),
  }));
  const last = readings.at(-1)?.free_mg_L ?? 0;
  const wine = vessel('tank 4', { readings, ...free(last, 21) });
  const by = (needed: number) => nextCheck(wine, { ...CHECK_DEFAULTS, neededOf: () => needed });
  expect(by(27)).toMatchObject({ why: 'forecast' });
  expect(by(27)?.at).toBeLessThan(START + 51 * DAY);
  expect(by(27)?.at).toBeGreaterThanOrEqual(START + 24 * DAY);
  expect(by(5)).toMatchObject({ why: 'usual', at: START + 51 * DAY });
  expect(nextCheck(wine, CHECK_DEFAULTS)).toMatchObject({ why: 'usual', at: START + 51 * DAY });
  expect(nextCheck({ ...wine, later: START + 60 * DAY }, { ...CHECK_DEFAULTS, neededOf: () => 27 })?.at).toBe(
    START + 60 * DAY,
  );
});

test('two readings, or a wine that has enough of a rise, call for no sooner check', () => {
  const two = [0, 14].map((day, index) => ({
    entry: 20 + index,
    at: START + day * DAY,
    free_mg_L: 40 - day,
  }));
  const wine = vessel('tank 4', { readings: two, ...free(26, 14) });
  expect(nextCheck(wine, { ...CHECK_DEFAULTS, neededOf: () => 20 })?.why).toBe('usual');
});
