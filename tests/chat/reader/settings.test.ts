import { describe, expect, test } from 'vitest';
import { readMessage } from '../../../src/chat/reader/read-message.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';
import type { Fields, ReaderSettings } from '../../../src/chat/reader/understood.ts';

const read = (text: string, settings: Partial<ReaderSettings>) =>
  readMessage(text, { ...READER_DEFAULTS, ...settings }).readings[0];

// The imperial gallon has 4.54609 L and 160 fluid ounces, the US gallon 3.785411784 L and 128: by legal definition,
// NIST Handbook 44 and the UK Weights and Measures Act (from memory).
test.each([
  ['US', 3.785411784, 128],
  ['imperial', 4.54609, 160],
] as const)('in a chat of %s gallons a gallon has %d L and %d fluid ounces', (gallon, litres, ounces) => {
  expect(read('300 gal pH 3.4 free 12', { gallon })?.fields.volume_L).toBeCloseTo(300 * litres, 6);
  const added = read('8 fl oz 6% so2 in 300 L', { gallon })?.fields.additive_volume_mL;
  expect(added).toBeCloseTo((8 * litres * 1000) / ounces, 6);
});

test.each([
  ['C', 14],
  ['F', -10],
] as const)('a bare temperature is in the unit of the chat: %s', (temperatureUnit, celsius) => {
  expect(read('T4 20 hl temp 14', { temperatureUnit })?.fields.temperature_C).toBeCloseTo(celsius, 9);
});

describe('the usual target is that of the chat', () => {
  // 0.8 and 0.6: Understanding Wine Chemistry, table 17.1 (read); the split by colour common practice, no source;
  // 1.5 for sweet: a French-language page without author (read).
  test.each([
    ['red', 0.6],
    ['white', 0.8],
    ['rose', 0.8],
    ['sweet', 1.5],
    ['', 0.8],
  ])('of %j wine at first: %d mg/L molecular', (kind, molecular_mg_L) => {
    const reading = read(`T4 20 hl pH 3.5 free 12 ${kind}`, {});
    expect(reading?.assumed.target).toEqual({ molecular_mg_L });
  });

  test('and another one where the chat has set it', () => {
    const targets = { red: 0.5, white: 0.7, sweet: 1.2 };
    expect(read('T4 20 hl pH 3.5 free 12 red', { targets })?.assumed.target).toEqual({ molecular_mg_L: 0.5 });
  });
});

/** Thousands are grouped only as the chat's and the message's language agree; else asked. */
test.each([
  ['de', '1.200 L', 1200],
  ['en', '1,200 L', 1200],
  ['de', '1,200 L', 'ambiguous-number'],
  ['en', '1.200 L', 'ambiguous-number'],
  ['de', 'der Tank hat 1.200 L, frei 18', 1200],
  ['de', 'gisteren overgeheveld 1.200 L', 'ambiguous-number'],
  ['de', 'aujourd’hui soutiré 1.200 L', 'ambiguous-number'],
  ['es', 'vasca da 1.200 L', 1200],
  ['de', 'volume 1.200 L', 'ambiguous-number'],
] as const)('in a chat in %s %j is %s', (language, text, expected) => {
  const reading = read(text, { language });
  const fields: Fields = reading?.fields ?? {};
  expect(reading?.problems[0]?.code ?? fields.volume_L).toBe(expected);
});
