import { describe, expect, test } from 'vitest';
import type { Table } from '../../../src/chat/attachments/cell.ts';
import { readTable } from '../../../src/chat/attachments/read-table.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';

const noting = { key: 'import:9', at: 1_762_900_000_000, by: 3 };
const read = (rows: Table['rows'], reader = READER_DEFAULTS) => readTable({ rows }, { reader, noting });

test('a list with headings is entries that tell of each vessel, and the lines that are not understood', () => {
  const read_ = read([
    ['Tank', 'Volume (hL)', 'Capacity (hL)', 'Colour', 'Stage', 'Lot', 'pH'],
    ['4', 52, 60, 'red', 'finished', 'Blanca 2026', 3.5],
    [],
    ['T9', 0, 60, '', '', '', ''],
    ['Big Bertha', 10, 20, 'red', '', '', ''],
    ['T4', 10, 20, 'red', '', '', ''],
    ['T5', 10, 20, 'purple', '', '', ''],
  ]);
  const told = { kind: 'vessel', event: 'told', at: noting.at, noted_at: noting.at, by: 3 };
  expect(read_).toEqual({
    kind: 'vessels',
    entries: [
      {
        ...told,
        entry: 1,
        key: 'import:9:2',
        vessels: ['tank 4'],
        volume_L: 5200,
        capacity_L: 6000,
        style: 'red',
        stage: 'finished',
      },
      { ...told, entry: 2, key: 'import:9:2:lot', event: 'lot', vessels: ['tank 4'], lot: 'Blanca 2026' },
      { ...told, entry: 3, key: 'import:9:4', vessels: ['tank 9'], capacity_L: 6000 },
      { ...told, entry: 4, key: 'import:9:4:empty', event: 'emptied', vessels: ['tank 9'] },
    ],
    lines: [2, 2, 4, 4],
    people: [],
    vessels: 2,
    notUnderstood: [5, 6, 7],
    notTaken: ['pH'],
    problems: [],
  });
});

describe('units stand in the heading, in a column of their own, in the cell, or are assumed and told', () => {
  test.each([
    [['Vessel', 'Volume L'], ['T4', '5200'], 5200],
    [['Vessel', 'Vol. [hl]'], ['T4', '52,5'], 5250],
    [['Vessel', 'volume_L'], ['T4', '5200.5'], 5200.5],
    [['Vessel', 'Litres'], ['T4', '5,200'], 5200],
    [['Vessel', 'US gallons'], ['T4', '1000'], 3785.411784],
    [['Vessel', 'Gallons'], ['T4', '1000'], 3785.411784],
    [['Vessel', 'Imperial gallons'], ['T4', 1000], 4546.09],
    [['Vessel', 'Volume', 'Unit'], ['T4', '52', 'hL'], 5200],
    [['Vessel', 'Volume'], ['T4', '52 hL'], 5200],
    [['Vessel', 'Volume (gal)'], ['T4', '5200 L'], 5200],
  ])('%j %j', (headings, row, volume_L) => {
    const { entries, assumedUnit } = read([headings, row]);
    expect(entries[0]).toMatchObject({ vessels: ['tank 4'] });
    expect(entries[0] && 'volume_L' in entries[0] ? entries[0].volume_L : undefined).toBeCloseTo(volume_L, 6);
    expect(assumedUnit).toBe(headings[1] === 'Volume' && headings.length === 2 ? 'L' : undefined);
  });

  test('a cellar that works in gallons has its gallons assumed', () => {
    const gallons = { ...READER_DEFAULTS, volumeUnit: 'galUK' as const, gallon: 'imperial' as const };
    const { entries, assumedUnit } = read(
      [
        ['Vessel', 'Volume'],
        ['T4', '1000'],
      ],
      gallons,
    );
    expect(entries).toMatchObject([{ volume_L: 4546.09 }]);
    expect(assumedUnit).toBe('galUK');
  });
});

test.each([
  ['a volume that may be two', ['T4', '5.200', 'red']],
  ['a volume that is none', ['T4', 'lots', 'red']],
  ['less than nothing', ['T4', -5, 'red']],
  ['more than a cellar has', ['T4', 1e12, 'red']],
  ['a unit of something else', ['T4', '5200 kg', 'red']],
  ['a date where a spreadsheet made one of a number', ['T4', new Date(0), 'red']],
  ['a cell beside all headings', ['T4', '5200', '5', 'red']],
  ['two vessels in a cell', ['T4 and T5', '5200', 'red']],
  ['a bare number that no word names', ['4', '5200', 'red']],
])('%s: the line is not understood', (_, row) => {
  const { kind, problems } = read([['Vessel', 'Volume L', 'Colour'], row]);
  expect({ kind, codes: problems.map(({ code, lines }) => [code, lines]) }).toEqual({
    kind: 'nothing',
    codes: [['no-vessels', [2]]],
  });
});

test('of a list without headings every line is read as a message is, in a text and in a spreadsheet', () => {
  const rows = [['T4', '5200 L', 'red'], ['hello'], ['T5', '10 hL']];
  const lines = ['T4;5200 L;red', 'hello', 'T5;10 hL'];
  const expected = { vessels: 2, notUnderstood: [2], lines: [1, 3] };
  expect(read(rows)).toMatchObject(expected);
  expect(readTable({ rows, lines, delimiter: ';' }, { reader: READER_DEFAULTS, noting })).toMatchObject(
    expected,
  );
});
