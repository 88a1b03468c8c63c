import { expect, test } from 'vitest';
import { readMessage } from '../../../src/chat/reader/read-message.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';

/** Figures that look like one field and are another's, or nobody's: `[text, field, never this value]`. */
const NEVER: readonly (readonly [string, string, unknown])[] = [
  ['barrel 17 225 L', 'volume_L', 17225],
  ['free 20 800 gal', 'volume_L', 20800 * 3.785411784],
  ['T8 900 gal pH 3.5 free 18', 'volume_L', 8900 * 3.785411784],
  ['TA 3.8 free 20 25 hl', 'ph', 3.8],
  ['VA 0.45 T4 20 hl pH 3.5', 'free_mg_L', 0.45],
  ['2023 Chard T4 20 hl pH 3.4', 'free_mg_L', 2023],
  ['back at 3.30', 'ph', 3.3],
  ['10/12 T4 20 hl pH 3.5', 'free_mg_L', 10],
  ['100 g kmbs in 20', 'free_mg_L', 20],
  ['T4 60 hl/h pump', 'volume_L', 6000],
  ['lot 44 kmbs T4 20 hl pH 3.5', 'free_mg_L', 44],
  ['1,250 kg kmbs in 200 hl', 'mass_g', 1250],
  ['50 ppm kmbs T4 20 hl', 'target', { add_mg_L: 50 }],
  ['added 50 ppm kmbs T4', 'added_mg_L', 50],
  ['5 G of must, pH 3.4', 'mass_g', 5],
  ['sulphate 80 g in 20 hl', 'additive', 'potassium-metabisulfite'],
  ['kmbs 13% 20 hl pH 3.5 free 12', 'strength_percent', 13],
  ['4 puncheons 3.66 22 free', 'volume_L', 900],
  ['molecular is 0.4 T4 20 hl', 'target', { molecular_mg_L: 0.4 }],
  ['pH 3.5 to 3.6 T4 20 hl free 12', 'target', { free_mg_L: 3.6 }],
  ['tank 4 in 20 minutes', 'free_mg_L', 20],
  ['barrels 1-6 3.6 20 225 L each\nbarrels 7-12 3.7 18 225 L each', 'volume_L', 121350],
  ['T1 3.6 20 225 L\nT2 3.5 18 900 L', 'volume_L', 20225],
  ['T1 20 hl 3.6 20\nT2 30 hl 3.7 18\ntotal 50 hl', 'volume_L', 5000],
  ['T8 free 20 -> 35 950 gal', 'volume_L', 35950 * 3.785411784],
  ['12° T4 20 hl pH 3.5 free 12', 'temperature_C', 12],
];

test.each(NEVER)('%j never gives %s %j', (text, field, value) => {
  for (const { fields } of readMessage(text, READER_DEFAULTS).readings) {
    expect(fields[field as 'ph']).not.toEqual(value);
  }
});

const NO_ENTRY = [
  "haven't added the 80 g to T4",
  'no kmbs added to T4 today',
  'if I added 80 g kmbs to T4 what then',
  'did anyone add 80 g to T4?',
  '80 g has to be added to T4 tomorrow',
  'T4 needs 80 g kmbs added',
  'ML done in T4, 20 hl',
  'who added 80 g to T4',
  'forgot to add 80 g kmbs T4',
] as const;

test.each(NO_ENTRY)('%j is no entry for the log', (text) => {
  expect(readMessage(text, READER_DEFAULTS).readings.map(({ intent }) => intent)).not.toContain('added');
});

/** Messages beside whose words no dose of the usual salt may stand, with the problem they get. */
const REFUSED = [
  ['T4 20 hl pH 3.5 free 20 sodium bisulfite', 'unknown-additive'],
  ['T4 20 hl pH 3.5 free 20 with sulfur', 'unknown-additive'],
  ['T4 20 hl pH 3.5 free 20 NaHSO3 38%', 'unknown-additive'],
  ['sulphur wick for barrel 17 pH 3.5 free 10', 'unknown-additive'],
  ['sanitise barrels 10 L kmbs 2% citric acid', 'unknown-additive'],
  ['mix kmbs with bleach 10 L', 'unknown-additive'],
  ['T4 half full of 40 hl pH 3.5 free 18', 'ambiguous-number'],
  ['free collapsed from 30 to 10 T4 20 hl pH 3.5', 'ambiguous-number'],
  ['total 60,950 L pH 3.5 free 20', 'ambiguous-number'],
] as const;

test.each(REFUSED)('%j is refused as %s', (text, code) => {
  const [reading] = readMessage(text, READER_DEFAULTS).readings;
  expect(reading?.problems.map((problem) => problem.code)).toContain(code);
});

const IN_DANGER = [
  'T4 1000 L pH 3.5 free 20, Marco passed out',
  'T4 1000 L pH 3.5 free 20 Marco fainted',
  'T4 20 hl pH 3.5, Pete collapsed',
  'my mate fell off the ladder into the vat',
  'nobody answers from inside T7',
  'the so2 bottle fell and it is hissing',
] as const;

test.each(IN_DANGER)('%j comes before every figure', (text) => {
  expect(readMessage(text, READER_DEFAULTS).readings.map(({ intent }) => intent)).toEqual(['emergency']);
});

test.each(['the pump on T3 is down', 'free is down to 12 in T4', 'the foam in T4 has collapsed'])(
  '%j is no emergency',
  (text) => {
    expect(readMessage(text, READER_DEFAULTS).readings.map(({ intent }) => intent)).not.toContain(
      'emergency',
    );
  },
);
