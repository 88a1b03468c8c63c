import { expect, test } from 'vitest';
import { decimalMarkOf } from '../../../src/chat/attachments/decimal-mark-of.ts';

test.each([
  ['no broken number', ['256', '', undefined, 'red'], ',', '.'],
  ['no broken number between semicolons', ['256'], ';', ','],
  ['points', ['3.58', '0.8'], ',', '.'],
  ['commas between semicolons', ['3,58', '5,489'], ';', ','],
  ['points between semicolons, as Switzerland has them', ['3.58', '5.489'], ';', '.'],
  ['commas in a text parted by tabs', ['3,58'], '\t', ','],
  ['numbers of a spreadsheet, which have no mark', [3.58, 5.489], undefined, '.'],
  ['both', ['3.58', '3,58'], ',', undefined],
  ['what may be thousands: 5.200', ['5.200', '10.400'], ';', undefined],
  ['what may be thousands: 5,200', ['5,200'], ',', undefined],
])('%s', (_, cells, delimiter, mark) => {
  expect(decimalMarkOf(cells, delimiter)).toBe(mark);
});
