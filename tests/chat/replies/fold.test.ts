import { expect, test } from 'vitest';
import { fold, MOST_ROWS, PHONE_COLUMNS, rowsOf, type SpokenLine } from '../../../src/chat/replies/fold.ts';
import type { Room } from '../../../src/chat/replies/reply.ts';

const rows = (room: Room, count: number): SpokenLine[] =>
  Array.from({ length: count }, (_, at) => ({ line: { room }, text: `${room} ${at}` }));
const folded = (lines: readonly SpokenLine[]): string[] => fold(lines, () => 'press More').split('\n');

test.each([
  ['', 1],
  ['one', 1],
  ['a\n\nb', 3],
  ['x'.repeat(PHONE_COLUMNS), 1],
  [`${'x'.repeat(PHONE_COLUMNS)} y`, 2],
  ['word '.repeat(18).trim(), 2],
  ['x'.repeat(100), 1],
])('rowsOf() wraps whole words: %s', (text, count) => {
  expect(rowsOf(text, PHONE_COLUMNS)).toBe(count);
});

test('fold() leaves a reply alone that a phone shows whole', () => {
  const lines = [...rows('first', 5), ...rows('working', 10), ...rows('caution', 10)];
  expect(folded(lines)).toHaveLength(MOST_ROWS);
  expect(folded(lines)).not.toContain('press More');
});

test('fold() puts the working behind More first, and says so', () => {
  const lines = [...rows('first', 15), ...rows('working', 6), ...rows('warning', 2), ...rows('caution', 5)];
  expect(folded(lines)).toEqual([
    ...[...rows('first', 15), ...rows('warning', 2), ...rows('caution', 5)].map(({ text }) => text),
    'press More',
  ]);
});

test('fold() then keeps the weightiest warning alone', () => {
  const lines = [...rows('first', 18), ...rows('warning', 3), ...rows('caution', 5)];
  expect(folded(lines)).toContain('warning 0');
  expect(folded(lines)).not.toContain('warning 1');
});

test('fold() never hides a caution, an assumption or a question, however long the reply is', () => {
  const kept = [...rows('question', 10), ...rows('assumed', 10), ...rows('caution', 10)];
  expect(folded([...kept, ...rows('working', 5)])).toEqual([...kept.map(({ text }) => text), 'press More']);
  expect(folded(kept)).toEqual(kept.map(({ text }) => text));
});
