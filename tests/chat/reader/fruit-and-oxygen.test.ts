import { expect, test } from 'vitest';
import { readMessage } from '../../../src/chat/reader/read-message.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';

const marksOf = (text: string, settings = READER_DEFAULTS) => readMessage(text, settings).readings[0]?.marks;

test.each([
  ['must 20 hl sound', 'sound'],
  ['must 20 hl, some damage', 'damaged'],
  ['must 20 hl sound, a bit of rot', 'rot'],
  ['must 20 hl, no rot', undefined],
  ['must 20 hl', undefined],
  ['T4 40 hl pH 3.4 free 20 sound', undefined],
])('%j: the fruit is %s', (text, state) => {
  expect(marksOf(text)?.fruitState).toBe(state);
});

// A short ton is 907.18474 kg (NIST Handbook 44, from memory).
test.each([
  ['2 tons grapes', 'L', 2000],
  ['2 tons grapes', 'galUS', 1814.36948],
  ['2 tonnes grapes', 'galUS', 2000],
  ['2 tons grapes 160 gal/ton', 'L', 1814.36948],
  ['2 t grapes', 'galUS', 2000],
] as const)('%j where wine is counted in %s: %d kg', (text, volumeUnit, fruit_kg) => {
  expect(marksOf(text, { ...READER_DEFAULTS, volumeUnit })?.fruit_kg).toBeCloseTo(fruit_kg, 6);
});

test.each([
  ['bottling T4 40 hl pH 3.4 free 22 oxygen 2 mg/L', 2, undefined],
  ['bottling T4 40 hl pH 3.4 free 22, 1.5 ppm DO', 1.5, undefined],
  ['bottling T4 40 hl pH 3.4 free 22 oxygen 2 at 2.5', 2, 2.5],
  ['bottling T4 40 hl pH 3.4 free 22', undefined, undefined],
  ['T4 40 hl pH 3.4 free 22 oxygen 2 mg/L', undefined, undefined],
])('%j: %s mg/L oxygen, each takes %s', (text, oxygen_mg_L, each) => {
  const marks = marksOf(text);
  expect([marks?.oxygen_mg_L, marks?.SO2_mg_per_mg_O2]).toEqual([oxygen_mg_L, each]);
});
