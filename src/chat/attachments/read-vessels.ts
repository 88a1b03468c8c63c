import type { Entry } from '../../core/cellar/entry.ts';
import type { ReaderSettings } from '../reader/understood.ts';
import type { Table } from './cell.ts';
import { cellText, isBlank } from './cell-text.ts';
import { nothingRead } from './import-read.ts';
import type { ImportRead } from './import-read.ts';
import { readVesselLine } from './read-vessel-line.ts';
import { readVesselHeadings, readVesselRow } from './read-vessel-table.ts';
import { changesOf } from './vessel-row.ts';
import type { ImportNoting, VesselRow } from './vessel-row.ts';

/** What a list of vessels is read with. */
export interface ListReading {
  readonly reader: ReaderSettings;
  readonly noting: ImportNoting;
}

/**
 * The vessels of a list: with headings where the first row has some, else a line each as a message has it. A line that
 * is not understood whole is left out and told; so is one whose vessel stands in an earlier line.
 */
export function readVessels(table: Table, { reader, noting }: ListReading): ImportRead {
  const first = table.rows.findIndex((row) => !row.every(isBlank));
  if (first === -1) return nothingRead('empty');
  const headed = readVesselHeadings(table.rows[first] ?? [], reader);
  const notTaken = new Set<string>(headed?.notTaken);
  const lines = headed ? undefined : (table.lines ?? table.rows.map((row) => row.map(cellText).join('; ')));
  const names = new Set<string>();
  const rows: VesselRow[] = [];
  const notUnderstood: number[] = [];

  const take = (row: Omit<VesselRow, 'line'> | undefined, line: number): void => {
    if (row === undefined || row.vessels.some((name) => names.has(name)))
      return void notUnderstood.push(line);
    for (const name of row.vessels) names.add(name);
    rows.push({ ...row, line });
  };
  if (headed) {
    for (const [i, cells] of table.rows.slice(first + 1).entries())
      if (!cells.every(isBlank)) take(readVesselRow(cells, headed, reader), first + i + 2);
  } else {
    for (const [i, text] of (lines ?? []).entries()) {
      if (text.replaceAll(/[;,\t|]/g, '').trim() === '') continue;
      const read = readVesselLine(text, reader);
      for (const field of read?.notTaken ?? []) notTaken.add(field);
      take(read?.row, i + 1);
    }
  }
  if (rows.length === 0) return nothingRead('no-vessels', { lines: notUnderstood });
  const changes = rows.flatMap((row) => changesOf(row, noting).map((change) => ({ change, line: row.line })));
  return {
    kind: 'vessels',
    entries: changes.map(({ change }, i): Entry => ({ ...change, entry: i + 1 })),
    lines: changes.map(({ line }) => line),
    people: [],
    vessels: names.size,
    notUnderstood,
    notTaken: [...notTaken],
    ...(headed?.assumedUnit !== undefined && { assumedUnit: headed.assumedUnit }),
    problems: [],
  };
}
