import fc from 'fast-check';
import { expect, test } from 'vitest';
import { readMessage } from '../../../src/chat/reader/read-message.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';
import type { Fields } from '../../../src/chat/reader/understood.ts';

/** Ways to say one thing each, with what they mean; figures invented. */
const PARTS: readonly (readonly (readonly [string, Fields])[])[] = [
  [
    ['T8', { vessel: 'tank 8' }],
    ['tank 8', { vessel: 'tank 8' }],
    ['FV3', { vessel: 'FV3' }],
  ],
  [
    ['950 L', { volume_L: 950 }],
    ['12 hl', { volume_L: 1200 }],
    ['1,250 L', { volume_L: 1250 }],
    ['40 x 225 L', { volume_L: 9000 }],
    ['2.5k L', { volume_L: 2500 }],
    ['6 barrels of 228 L', { volume_L: 1368 }],
    ['1 250 L', { volume_L: 1250 }],
    ['3 m3', { volume_L: 3000 }],
    ['300L', { volume_L: 300 }],
  ],
  [
    ['pH 3.52', { ph: 3.52 }],
    ['ph3,52', { ph: 3.52 }],
    ['pH=3.52', { ph: 3.52 }],
    ['3.52 pH', { ph: 3.52 }],
    ['pH is 3.52', { ph: 3.52 }],
    ['pH: 3.52', { ph: 3.52 }],
  ],
  [
    ['free 20', { free_mg_L: 20 }],
    ['FSO2 20 ppm', { free_mg_L: 20 }],
    ['free: 20', { free_mg_L: 20 }],
    ['20 free', { free_mg_L: 20 }],
    ['20 ppm free', { free_mg_L: 20 }],
    ['free at 20', { free_mg_L: 20 }],
    ['free SO2: 20 mg/L', { free_mg_L: 20 }],
    ['free so2 2 g/hl', { free_mg_L: 20 }],
  ],
  [
    ['total 60', { total_mg_L: 60 }],
    ['TSO2 60', { total_mg_L: 60 }],
    ['60 total', { total_mg_L: 60 }],
    ['total so2 60 ppm', { total_mg_L: 60 }],
  ],
  [
    ['target 35', { target: { free_mg_L: 35 } }],
    ['0.8 molecular', { target: { molecular_mg_L: 0.8 } }],
    ['+25 ppm', { target: { add_mg_L: 25 } }],
    ['add 25 ppm', { target: { add_mg_L: 25 } }],
    ['-> 35', { target: { free_mg_L: 35 } }],
    ['up to 35', { target: { free_mg_L: 35 } }],
  ],
  [
    ['13.5%', { alcohol_percent: 13.5 }],
    ['alc 13.5', { alcohol_percent: 13.5 }],
  ],
  [
    ['14 °C', { temperature_C: 14 }],
    ['14C', { temperature_C: 14 }],
  ],
  [
    ['red', { style: 'red' }],
    ['white', { style: 'white' }],
  ],
  [
    ['kmbs 57%', { additive: 'potassium-metabisulfite', strength_percent: 57 }],
    ['10% kmbs', { additive: 'potassium-metabisulfite-solution', strength_percent: 10 }],
    ['kmbs', { additive: 'potassium-metabisulfite' }],
    ['smbs', { additive: 'sodium-metabisulfite' }],
  ],
  [
    ['ML done', { stage: 'finished' }],
    ['before ML', { stage: 'malolactic' }],
    ['no ML', { stage: 'finished' }],
    ['still fermenting', { stage: 'fermenting' }],
  ],
  [
    ['RS 3 g/L', { sugar_g_L: 3 }],
    ['3 g/L RS', { sugar_g_L: 3 }],
    ['RS 0.3%', { sugar_g_L: 3 }],
  ],
  [
    ['+30%', { binding_allowance_percent: 30 }],
    ['1/3 binds', { binding_share: 1 / 3 }],
    ['30% bind', { binding_allowance_percent: 30 }],
    ['no binding', { binding_allowance_percent: 0 }],
  ],
];

const anyMessage = (separator: string): fc.Arbitrary<{ text: string; fields: Fields }> =>
  fc
    .shuffledSubarray(PARTS.slice(1), { minLength: 3 })
    .chain((some) => fc.shuffledSubarray([PARTS[0] ?? [], ...some], { minLength: some.length + 1 }))
    .chain((chosen) => fc.tuple(...chosen.map((ways) => fc.constantFrom(...ways))))
    .filter((said) =>
      said.some(([, fields]) => 'ph' in fields || 'free_mg_L' in fields || 'target' in fields),
    )
    .map((said) => ({
      text: said.map(([words]) => words).join(separator),
      fields: Object.assign({}, ...said.map(([, fields]) => fields)) as Fields,
    }));

test.each([', ', '; ', ' - ', '\n'])('parts with %j between them mean the same in any order', (separator) => {
  fc.assert(
    fc.property(anyMessage(separator), ({ text, fields }) => {
      const { readings } = readMessage(text, READER_DEFAULTS);
      expect(readings.map((reading) => [reading.problems, reading.fields])).toEqual([[[], fields]]);
    }),
    { seed: 1412, numRuns: 800 },
  );
});

test.each([' ', '\t', ' | ', '|', ' / ', '. ', ' – '])(
  'parts with only %j between them mean the same in any order, or are asked about',
  (separator) => {
    fc.assert(
      fc.property(anyMessage(separator), ({ text, fields }) => {
        const { readings } = readMessage(text, READER_DEFAULTS);
        for (const reading of readings) {
          if (reading.problems.length > 0) continue;
          expect({ ...reading.fields, text }).toEqual({ ...fields, text });
        }
      }),
      { seed: 1412, numRuns: 1500 },
    );
  },
);
