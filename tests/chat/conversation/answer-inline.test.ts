import { expect, test } from 'vitest';
import { answerInline } from '../../../src/chat/conversation/answer-inline.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { say } from './talk.ts';

const inline = (text: string): string | undefined => {
  const reply = answerInline(text, 'en', DEFAULT_SETTINGS);
  return reply && say(reply).text;
};

test('a whole reading gives its dose, whole and without buttons', () => {
  const reply = answerInline('T4 1450 gal pH 3.58 free 21 red, ML done', 'en', DEFAULT_SETTINGS);
  expect(reply?.buttons).toEqual([]);
  expect(inline('T4 1450 gal pH 3.58 free 21 red, ML done')).toMatch(/^T4: weigh 1\d\d g/);
  expect(inline('40 hl pH 3.4 free 15 white, ML done')).toMatch(/^Weigh 117 g/);
});

test('nothing is said to be kept, as nothing is', () => {
  expect(inline('T4 1450 gal pH 3.58 free 21 red, ML done')).not.toMatch(/kept|new to me|noted/i);
});

test('a round of tanks gives all its doses', () => {
  expect(inline('T4 40 hl pH 3.4 free 15\nT5 20 hl pH 3.4 free 20')).toMatch(/T4[^]*T5/);
});

test.each([
  '',
  'hello',
  'T4',
  'T4 pH 3.4 free 15',
  'T4 40 hl pH 3.4',
  'T4 40 hl pH 9 free 15',
  'T4 40 hl pH 4.1 free 15',
  'T4 40 hl pH 3.4 free 60',
  'added 82 g kmbs T4',
  'vessels',
  'forget T4',
  'T4 40 hl must pH 3.4 free 15',
  'Luis collapsed next to the tank',
  'T4 40 hl pH 3.4 free 15\nT5 20 hl pH 3.4',
  'x'.repeat(5000),
])('there is no dose to insert for %j', (text) => {
  expect(inline(text)).toBeUndefined();
});
