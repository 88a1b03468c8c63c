import { expect, test } from 'vitest';
import { readMessage } from '../../../src/chat/reader/read-message.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';

const PLACES: readonly (readonly [string, Readonly<Record<string, string>>])[] = [
  [
    'T4 1450 gal pH 3.58 free 21',
    { vessel: 'T4', volume_L: '1450 gal', ph: 'pH 3.58', free_mg_L: 'free 21' },
  ],
  ['🍷 T10 – 2,150 gal – pH 3.63', { vessel: 'T10', volume_L: '2,150 gal', ph: 'pH 3.63' }],
  ['SO₂ free 17 mg/L,\u00a0pH\u202f３.５０', { free_mg_L: 'SO₂ free 17 mg/L', ph: 'pH\u202f３.５０' }],
  ['add 28 ppm to Tank 4', { target: 'add 28 ppm', vessel: 'Tank 4' }],
];

test.each(PLACES)('in %j each thing read keeps where it stood', (text, places) => {
  const [reading] = readMessage(text, READER_DEFAULTS).readings;
  for (const [field, words] of Object.entries(places)) {
    const place = reading?.where[field as 'ph'];
    expect(place?.text).toBe(words);
    expect(text.slice(place?.start, place?.end)).toBe(words);
  }
});

test('what was said, assumed and is unknown stands apart', () => {
  const [reading] = readMessage('T4 6 barrels pH 3.58', READER_DEFAULTS).readings;
  expect(reading?.fields).toEqual({ vessel: 'tank 4', ph: 3.58 });
  expect(reading?.assumed).toEqual({
    additive: 'potassium-metabisulfite',
    target: { molecular_mg_L: 0.8 },
    stage: 'finished',
    volume_L: 1350,
  });
  expect(reading?.asks).toEqual(['free_mg_L']);
});
