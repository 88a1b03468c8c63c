import { expect, test } from 'vitest';
import { readVesselLine } from '../../../src/chat/attachments/read-vessel-line.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';

const read = (line: string) => readVesselLine(line, READER_DEFAULTS);

test.each([
  ['T4;5200 L;red', { vessels: ['tank 4'], volume_L: 5200, traits: { style: 'red' } }],
  ['T4,5200,5 L,red', { vessels: ['tank 4'], volume_L: 5200.5, traits: { style: 'red' } }],
  ['Tank 4 52 hL white', { vessels: ['tank 4'], volume_L: 5200, traits: { style: 'white' } }],
  [
    'T4; 5200 L; red; in malo',
    { vessels: ['tank 4'], volume_L: 5200, traits: { style: 'red', stage: 'malolactic' } },
  ],
  ['T4; 5200 L; lot Blanca 2026', { vessels: ['tank 4'], volume_L: 5200, lot: 'Blanca 2026', traits: {} }],
  ['T4; capacity 6000 L; 5200 L', { vessels: ['tank 4'], volume_L: 5200, capacity_L: 6000, traits: {} }],
  ['T9; capacity 60 hL; empty', { vessels: ['tank 9'], capacity_L: 6000, empty: true, traits: {} }],
  [
    'T4; 5200 L; white; 13.5 % vol',
    { vessels: ['tank 4'], volume_L: 5200, traits: { style: 'white', alcohol_percent: 13.5 } },
  ],
  ['T7', { vessels: ['tank 7'], traits: {} }],
  ['B1-B3; 225 L; red', { vessels: ['B1', 'B2', 'B3'], volume_L: 225, traits: { style: 'red' } }],
])('%s', (line, row) => {
  expect(read(line)).toEqual({ row, notTaken: [] });
});

test('US and imperial gallons are litres', () => {
  // 3.785411784 L: NIST Handbook 44; 4.54609 L: UK Weights and Measures Act 1985.
  expect(read('T4; 1450 US gal')?.row.volume_L).toBeCloseTo(1450 * 3.785411784, 9);
  expect(read('T4; 1450 imperial gal')?.row.volume_L).toBeCloseTo(1450 * 4.54609, 9);
});

test('a reading in a list is not taken, as nobody knows when it was measured, and that is told', () => {
  expect(read('T4; 5200 L; pH 3.5; free 21')).toEqual({
    row: { vessels: ['tank 4'], volume_L: 5200, traits: {} },
    notTaken: ['ph', 'free_mg_L'],
  });
});

test('a variety is no trait that we keep, and that is told', () => {
  expect(read('T4; 5200 L; red; Zweigelt')).toEqual({
    row: { vessels: ['tank 4'], volume_L: 5200, traits: { style: 'red' } },
    notTaken: ['Zweigelt'],
  });
});

test.each([
  ['a title', 'Our vessels, November'],
  ['no vessel', '5200 L red'],
  ['a volume that may be two', 'T4; 5.200 L; red'],
  ['a bare number', 'T4; 5200; red'],
  ['two volumes', 'T4; 6000 L; 5200 L; red'],
  ['a capacity among other words', 'T4 cap 6000 L red'],
  ['wine in an empty tank', 'T4; 5200 L; empty'],
  ['a dose', 'T4; 5200 L; add 250 g kmbs'],
  ['a target', 'T4; 5200 L; raise to 30 free'],
  ['a line too long to be one', `T4; ${'red '.repeat(100)}`],
  ['signs that steer a screen', 'T4; 5200 L; lot \u001B[2J'],
])('%s is not understood', (_, line) => {
  expect(read(line)).toBeUndefined();
});
