import { expect, test } from 'vitest';
import { shownName } from '../../src/edge/shown-name.ts';

test.each([
  ['Ana', 'Ana'],
  ['  María  José ', 'María José'],
  ['Ana\nadded 5 kg', 'Ana added 5 kg'],
  ['\u202eanA', 'anA'],
  ['👩‍🌾', '👩‍🌾'],
  ['n'.repeat(65), 'n'.repeat(64)],
  ['🍷'.repeat(65), '🍷'.repeat(64)],
  ['\ud800', undefined],
  [' \u200f ', undefined],
  ['', undefined],
  [undefined, undefined],
])('of the name %j there is shown %j', (given, name) => {
  expect(shownName(given)).toBe(name);
});
