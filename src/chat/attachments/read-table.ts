import type { Table } from './cell.ts';
import { headingRowOf } from './heading-row.ts';
import type { ImportRead } from './import-read.ts';
import { readLog } from './read-log.ts';
import { readVessels } from './read-vessels.ts';
import type { ListReading } from './read-vessels.ts';

/** What a table holds: our own export, known by the names in brackets behind its headings, or a list of vessels. */
export function readTable(table: Table, reading: ListReading): ImportRead {
  const heading = headingRowOf(table);
  return heading ? readLog(table, heading) : readVessels(table, reading);
}
