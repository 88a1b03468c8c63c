import { expect, test } from 'vitest';
import { foldText } from '../../../src/chat/reader/fold-text.ts';

test.each([
  ['a soft hyphen', 'free\u00ad 21', 'free 21'],
  ['zero-width marks', 'p\u200bH\ufeff 3.5', 'ph 3.5'],
  ['right-to-left marks', '\u200f\u202bT4\u202c', 't4'],
  ['no-break and narrow blanks', '1\u00a0200\u202fL', '1 200 l'],
  ['full-width digits', '\uff13\uff0e\uff15', '3.5'],
  ['a variation selector', '\u2764\ufe0f', '\u2764'],
  ['every kind of dash', '\u2013\u2014\u2212\u2010\u2011', '-----'],
  ['ends of line of every machine', 'a\r\nb\rc\n', 'a\nb\nc\n'],
  ['vulgar fractions stay one sign', '1\u00bd', '1\u00bd'],
])('%s', (_, message, text) => {
  expect(foldText(message).text).toBe(text);
});

test('each sign knows where it stood in the message', () => {
  const message = 'p\u200bH \ud83c\udf77 3';
  const { text, at } = foldText(message);
  expect(at).toHaveLength(text.length + 1);
  expect(message[at[text.indexOf('3')] ?? -1]).toBe('3');
});
