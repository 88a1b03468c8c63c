import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import { toSendings } from '../../../src/edge/telegram/from-reply.ts';
import { splitText } from '../../../src/edge/telegram/split-text.ts';
import { faultsOfCall } from './bot-api-schema.ts';

const button = (label: string, key = `key of ${label}`): { key: string; mark: string; label: string } => ({
  key,
  mark: '1',
  label,
});

const rowsOf = (buttons: readonly ReturnType<typeof button>[]): string[][] =>
  toSendings({ text: 'x', buttons }).flatMap((sending) =>
    (sending.reply_markup?.inline_keyboard ?? []).map((row) => row.map((one) => one.text)),
  );

describe('a reply becomes a call', () => {
  test('with the text as it is and no parse mode, so that nothing in it is markup', () => {
    const text = 'T4 <b>_x_</b> [a](http://b.example) &amp;';
    expect(toSendings({ text, buttons: [] })).toEqual([
      { text, link_preview_options: { is_disabled: true } },
    ]);
  });

  test('with the key of a button as the data of it', () => {
    const [sending] = toSendings({ text: 'x', buttons: [button('Working', 'w:3')] });
    expect(sending?.reply_markup).toEqual({ inline_keyboard: [[{ text: 'Working', callback_data: 'w:3' }]] });
  });

  test.each<[string, string[], string[][]]>([
    ['two short ones in a row', ['Working', 'Safety', 'More'], [['Working', 'Safety'], ['More']]],
    [
      'a long one alone',
      ['Working', 'Leave it as it is for now', 'More', 'Safety'],
      [['Working'], ['Leave it as it is for now'], ['More', 'Safety']],
    ],
    ['none where there is none', [], []],
  ])('with buttons: %s', (_, labels, rows) => {
    expect(rowsOf(labels.map((label) => button(label)))).toEqual(rows);
  });

  test('with a key of 64 bytes, and without a button whose key is longer or empty', () => {
    const keys = ['k'.repeat(64), 'ü'.repeat(32), 'k'.repeat(65), 'ü'.repeat(33), ''];
    expect(rowsOf(keys.map((key, index) => button(`b${index}`, key)))).toEqual([['b0', 'b1']]);
  });

  test('or several when it is long: cut between lines, the buttons under the last', () => {
    const line = `${'x'.repeat(99)}\n`;
    const sendings = toSendings({ text: line.repeat(100), buttons: [button('Working')] });
    expect(sendings.map(({ text }) => text.length)).toEqual([4099 - 100, 4099 - 100, 1999 + 1]);
    expect(sendings.map(({ reply_markup }) => reply_markup !== undefined)).toEqual([false, false, true]);
  });

  test('or none when there is nothing to say', () => {
    expect(toSendings({ text: ' \n', buttons: [button('Working')] })).toEqual([]);
  });

  test('that is as the platform publishes it, whatever the text and the buttons are', () => {
    const buttons = fc.array(
      fc.record({ key: fc.string({ unit: 'binary', maxLength: 70 }), mark: fc.string(), label: fc.string() }),
    );
    const text = fc.oneof(
      fc.string({ unit: 'binary' }),
      fc.string({ minLength: 4000, maxLength: 9000, unit: 'grapheme' }),
    );
    fc.assert(
      fc.property(text, buttons, (said, marks) => {
        const faults = toSendings({ text: said, buttons: marks }).flatMap((sending) =>
          faultsOfCall('sendMessage', { chat_id: 1, ...sending }),
        );
        expect(faults).toEqual([]);
      }),
      { numRuns: 100 },
    );
  });
});

describe('splitText()', () => {
  test.each<[string, string, number, string[]]>([
    ['leaves a short text whole', 'one\ntwo', 10, ['one\ntwo']],
    ['cuts at the last line that fits', 'one\ntwo\nsix', 8, ['one\ntwo', 'six']],
    ['takes a line that fits exactly', 'one\ntwo', 3, ['one', 'two']],
    ['cuts after a line of one sign', 'a\nbb c', 4, ['a', 'bb c']],
    ['cuts a long line at a space', 'one two six', 8, ['one two', 'six']],
    ['cuts a long word anywhere', 'abcdefgh', 3, ['abc', 'def', 'gh']],
    ['never cuts through a character of two units', '🍷🍷🍷', 3, ['🍷', '🍷', '🍷']],
    ['keeps the indent of the next line', 'one\n  two', 6, ['one', '  two']],
  ])('%s', (_, text, longest, pieces) => {
    expect(splitText(text, longest)).toEqual(pieces);
  });

  test('loses nothing but the blanks at the cuts', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), fc.integer({ min: 2, max: 20 }), (text, longest) => {
        const pieces = splitText(text, longest);
        expect(pieces.every((piece) => piece.length <= longest && piece.trim() !== '')).toBe(true);
        const bare = (from: string): string => from.replaceAll(/\s/g, '');
        expect(bare(pieces.join(''))).toBe(bare(text));
      }),
    );
  });

  test('refuses a length in which no character fits', () => {
    expect(() => splitText('x', 1)).toThrow(RangeError);
    expect(() => splitText('x', Number.NaN)).toThrow(RangeError);
  });
});
