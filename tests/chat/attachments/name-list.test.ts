import fc from 'fast-check';
import { expect, test } from 'vitest';
import { joinNames, splitNames } from '../../../src/chat/attachments/name-list.ts';

test.each([
  ['one', ['tank 4'], 'tank 4'],
  ['several', ['tank 4', 'B17'], 'tank 4, B17'],
  ['a comma within a name', ['a, b', 'c'], 'a\\, b, c'],
  ['a backslash within a name', ['a\\b'], 'a\\\\b'],
  ['none', [], ''],
])('%s: names stand in one cell and come out of it as they were', (_, names, cell) => {
  expect(joinNames(names)).toBe(cell);
  expect(splitNames(cell)).toEqual(names);
});

test('whatever names vessels have, they come out of a cell as they went in', () => {
  const name = fc
    .string({ unit: 'grapheme', minLength: 1 })
    .filter((one) => one.trim() === one && one !== '');
  fc.assert(
    fc.property(fc.array(name), (names) => {
      expect(splitNames(joinNames(names))).toEqual(names);
    }),
  );
});
