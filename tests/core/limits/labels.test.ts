import { expect, test } from 'vitest';
import { needsSulfiteLabel } from '../../../src/core/limits/label-for.ts';
import { LABEL_ROWS } from '../../../src/core/limits/label-rows.ts';
import { labelWarnings } from '../../../src/core/dose/label-warnings.ts';
import { SULFITE_LABELS } from '../../tables/sulfite-labels.ts';

test.each(SULFITE_LABELS)('$region $facts: $needed ($source)', ({ region, facts, needed }) => {
  expect(needsSulfiteLabel(region, facts)).toBe(needed);
});

test('no market has two rows', () => {
  const regions = LABEL_ROWS.flatMap((row) => row.regions);
  expect(new Set(regions).size).toBe(regions.length);
});

test.each([
  ['eu', 4.9, []],
  ['eu', 10, ['no']],
  ['eu', 10.1, ['yes']],
  ['us', 10, ['yes']],
  ['us', 15.1, []],
  ['ca', 12, ['unknown']],
  ['cn', 10, []],
  ['oiv', 10, []],
] as const)('a line about the label in %s at %d mg/L: %j', (region, total, needed) => {
  expect(labelWarnings(region, total).map(({ values }) => values['needed'])).toEqual(needed);
});

test('a figure that cannot be is refused', () => {
  expect(() => needsSulfiteLabel('eu', { total_mg_L: Number.NaN })).toThrow(RangeError);
});
