import { expect, test } from 'vitest';
import { readDecimal, readNumeral } from '../../../src/chat/reader/numbers.ts';

const comma = { point: false, comma: true };
const point = { point: true, comma: false };
const none = { point: false, comma: false };

const ROWS = [
  ['1200', comma, 1200, false],
  ['1,200', comma, 1200, false],
  ['1,200', point, 1.2, true],
  ['1.200', comma, 1.2, true],
  ['1.200', point, 1200, false],
  ['1.200', none, 1.2, true],
  ['0.250', comma, 0.25, false],
  ['3,5', comma, 3.5, false],
  ['1.234,5', comma, 1234.5, false],
  ['1,234.5', point, 1234.5, false],
  ['1,200,000', comma, 1_200_000, false],
  ["1'200", none, 1200, false],
  ["3'25", none, 3.25, false],
  ['12.3456', comma, 12.3456, false],
  ["1.234,567'8", comma, 1234567.8, true],
  ['1.23.4', comma, 1234, true],
] as const;

test.each(ROWS)('the numeral %s with %j is %d, unsure: %s', (raw, grouping, value, unsure) => {
  expect(readNumeral(raw, grouping)).toEqual({ value, unsure });
});

test('every separator of a decimal is a decimal mark', () => {
  expect(['3.58', '3,58', "3'58", '3,457'].map(readDecimal)).toEqual([3.58, 3.58, 3.58, 3.457]);
});
