import { expect, test } from 'vitest';
import { exportName } from '../../../src/chat/attachments/export-name.ts';

const ZONE = 'Europe/Madrid';
/** Midnight in Madrid: an hour ahead of UTC in winter, two in summer. */
const winter = (year: number, month: number, day: number): number =>
  Date.UTC(year, month - 1, day) - 3_600_000;

test.each([
  ['all', {}, 'cellar.csv'],
  ['a month', { from: winter(2026, 11, 1), to: winter(2026, 12, 1) }, 'cellar-2026-11.csv'],
  ['the last month of a year', { from: winter(2026, 12, 1), to: winter(2027, 1, 1) }, 'cellar-2026-12.csv'],
  ['a year', { from: winter(2026, 1, 1), to: winter(2027, 1, 1) }, 'cellar-2026.csv'],
  ['a day', { from: winter(2026, 11, 3), to: winter(2026, 11, 4) }, 'cellar-2026-11-03.csv'],
  [
    'two weeks',
    { from: winter(2026, 11, 3), to: winter(2026, 11, 18) },
    'cellar-2026-11-03-to-2026-11-17.csv',
  ],
  [
    'two months',
    { from: winter(2026, 11, 1), to: winter(2027, 1, 1) },
    'cellar-2026-11-01-to-2026-12-31.csv',
  ],
  ['from a day on', { from: winter(2026, 11, 3) }, 'cellar-from-2026-11-03.csv'],
  ['up to a day', { to: winter(2026, 11, 4) }, 'cellar-to-2026-11-03.csv'],
  ['one vessel', { vessel: 'tank 4' }, 'cellar-tank-4.csv'],
  ['a vessel whose name could leave the folder', { vessel: '../Ä b/' }, 'cellar-a-b.csv'],
])('the name of an export says what it holds: %s', (_, span, name) => {
  expect(exportName({ ...span, zone: ZONE, format: 'csv' })).toBe(name);
});
