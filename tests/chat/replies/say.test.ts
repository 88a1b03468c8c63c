import { expect, test } from 'vitest';
import { LANGUAGES } from '../../../src/chat/reader/words/languages.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import type { Line } from '../../../src/chat/replies/reply.ts';
import { loadLocales } from '../../../src/edge/locales.ts';

/** A line of sentences that are made up here. */
const line = (key: string, values: Line['values'] = {}, more: Partial<Line> = {}): Line => ({
  room: 'first',
  key,
  values,
  ...more,
});
const saying = (en: string, ...lines: Line[]): string =>
  makeSay({ en })({ language: 'en', lines, buttons: [] }).text;

test('say puts the values into the sentence, a line a row', () => {
  expect(saying('a = Weigh { $amount }\nb = B\n', line('a', { amount: '256 g' }), line('b'))).toBe(
    'Weigh 256 g\nB',
  );
});

test.each([
  ['a sentence that is in no language', 'a = A\n', line('b')],
  ['a value that nobody handed in', 'a = Weigh { $amount }\n', line('a')],
  [
    'a value that is missing in what is selected on',
    'a = { $x ->\n    [one] A\n   *[other] B\n }\n',
    line('a'),
  ],
  ['a value that is missing in a sentence inside', 'a = { b }\nb = { $x }\n', line('a')],
  [
    'a part of a list that is in no language',
    'a = { $list }\nlist-separator = , \n',
    line('a', {}, { list: [line('c')] }),
  ],
])('say throws for %s, as half a sentence about a dose is worse than none', (_, en, one) => {
  expect(() => saying(en, one)).toThrow(TypeError);
});

test('say throws for a button whose label is in no language', () => {
  const button = { key: 'w:1', mark: '1', label: 'nothing', values: {} } as never;
  expect(() => makeSay({ en: 'a = A\n' })({ language: 'en', lines: [], buttons: [button] })).toThrow(
    TypeError,
  );
});

test('a list has its own separator where its sentence has one, else the usual one', () => {
  const en =
    'a = { $list }\na-separator = { "; " }\nb = { $list }\nlist-separator = { ", " }\nx = X\ny = Y\n';
  const list = [line('x'), line('y')];
  expect(saying(en, line('a', {}, { list }), line('b', {}, { list }))).toBe('X; Y\nX, Y');
});

test('what a language has not yet is said in English, and a line can be in a language of its own', () => {
  const say = makeSay({ en: 'a = English\nb = More\n', es: 'a = Español\n' });
  expect(say({ language: 'es', lines: [line('a'), line('b')], buttons: [] }).text).toBe('Español\nMore');
  expect(say({ language: 'en', lines: [line('a', {}, { language: 'es' })], buttons: [] }).text).toBe(
    'Español',
  );
});

test('a person’s words cannot become sentences of ours', () => {
  expect(saying('a = “{ $text }”\n', line('a', { text: '{ $amount } { b } *[x]' }))).toBe(
    '“{ $amount } { b } *[x]”',
  );
});

test.each(LANGUAGES)('the locale of %s can be read', (language) => {
  const say = makeSay(loadLocales());
  expect(say({ language, lines: [line('progress-done')], buttons: [] }).text).not.toBe('');
});
