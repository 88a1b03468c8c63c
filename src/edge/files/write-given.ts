import { makeSheet } from '../../chat/attachments/make-sheet.ts';
import type { SheetSource } from '../../chat/attachments/make-sheet.ts';
import type { DecimalMark } from '../../chat/replies/number-text.ts';
import { writeCsv } from './write-csv.ts';
import { writeXlsx } from './write-xlsx.ts';

/** What the thread that makes exports is given. */
export interface GivenExport {
  readonly source: SheetSource;
  readonly format: 'csv' | 'xlsx';
  readonly decimalMark: DecimalMark;
}

/** The work of that thread: the bytes of an export. */
export async function writeGiven({ source, format, decimalMark }: GivenExport): Promise<Uint8Array> {
  const sheet = makeSheet(source);
  return format === 'csv' ? writeCsv(sheet, decimalMark) : writeXlsx(sheet);
}
