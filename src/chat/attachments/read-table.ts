import type { Table } from './cell.ts';
import { headingRowOf } from './heading-row.ts';
import type { ImportRead } from './import-read.ts';
import { readLog } from './read-log.ts';
import { readRoundTable } from './round/read-round-table.ts';
import { readVessels } from './read-vessels.ts';
import type { ListReading } from './read-vessels.ts';

/**
 * What a table holds: our own export, known by the names in brackets behind its headings, a list of vessels, a round of
 * readings, or both of these.
 */
export function readTable(table: Table, reading: ListReading): ImportRead {
  const heading = headingRowOf(table);
  if (heading) return readLog(table, heading);
  const vessels = readVessels(table, reading);
  const round = readRoundTable(table, reading);
  if (round === undefined) return vessels;
  return vessels.kind === 'nothing'
    ? { ...vessels, kind: 'round', problems: [], round }
    : { ...vessels, round };
}
