import { expect, test } from 'vitest';
import type { AwaitedField, Reading } from '../../../src/chat/reader/understood.ts';
import { readMessage } from '../../../src/chat/reader/read-message.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';

const [partial] = readMessage('T4 pH 3.58 free 21', READER_DEFAULTS).readings as [Reading];

const ROWS: readonly (readonly [AwaitedField['field'], string, unknown])[] = [
  ['volume_L', '5200', { volume_L: 5200 }],
  ['volume_L', '5,200', { volume_L: 5200 }],
  ['ph', '3,58', { ph: 3.58 }],
  ['free_mg_L', '21', { free_mg_L: 21 }],
  ['free_mg_L', '21 ppm', { free_mg_L: 21 }],
  ['target', '0.6', { target: { molecular_mg_L: 0.6 } }],
  ['target', '2', { target: { molecular_mg_L: 2 } }],
  ['target', '2.1', { target: { free_mg_L: 2.1 } }],
  ['target', '30', { target: { free_mg_L: 30 } }],
  ['strength_percent', '10 %', { strength_percent: 10 }],
  ['tablet_salt_g', '0.44 g', { tablet_salt_g: 0.44 }],
  ['tablet_SO2_g', '5', { tablet_SO2_g: 5 }],
  ['mass_g', '30 g', { mass_g: 30 }],
  ['vessel', '4', { vessel: 'tank 4' }],
];

test.each(ROWS)('while %s is asked, %j is its value', (field, text, fields) => {
  const waiting: AwaitedField = { field, reading: partial };
  expect(readMessage(text, READER_DEFAULTS, waiting).readings[0]?.fields).toEqual(fields);
});

const BAD = [
  ['ph', '36', 'ph-out-of-range'],
  ['ph', '4.81', 'ph-out-of-range'],
  ['ph', '2.49', 'ph-out-of-range'],
  ['volume_L', '0', 'volume-not-positive'],
  ['volume_L', '10000001', 'value-out-of-range'],
  ['volume_L', '1.200', 'ambiguous-number'],
  ['free_mg_L', '-4', 'negative-value'],
  ['free_mg_L', '1001', 'value-out-of-range'],
] as const;

test.each(BAD)('while %s is asked, %j is refused as %s', (field, text, code) => {
  const waiting: AwaitedField = { field, reading: partial };
  const [reading] = readMessage(text, READER_DEFAULTS, waiting).readings;
  expect(reading?.problems.map((problem) => problem.code)).toEqual([code]);
  expect(reading?.fields).toEqual({});
});
