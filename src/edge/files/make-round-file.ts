import { additiveNames } from '../../chat/attachments/round/additive-names.ts';
import { roundName } from '../../chat/attachments/round/round-name.ts';
import { roundTable } from '../../chat/attachments/round/round-table.ts';
import { roundWords, type SayLine } from '../../chat/attachments/round/round-words.ts';
import type { Errand } from '../../chat/conversation/ports.ts';
import type { Say } from '../../chat/replies/say.ts';
import type { BroughtFile } from '../brought.ts';
import { writeCsv } from './write-csv.ts';
import { writeXlsx } from './write-xlsx.ts';

/** The sheet of a round as CSV or as a spreadsheet: some hundred rows, made at once. */
export async function makeRoundFile(
  { sheet, zone, language }: Extract<Errand, { kind: 'round-sheet' }>,
  format: 'csv' | 'xlsx',
  say: Say,
): Promise<BroughtFile> {
  const sayLine: SayLine = (line) => say({ language, lines: [line], buttons: [] }).text;
  const nameOf = additiveNames(sayLine, sheet.mark);
  const table = roundTable(sheet, roundWords(sayLine), {
    sayLine,
    nameOf: (id) => nameOf({ id }),
  });
  const bytes = format === 'csv' ? writeCsv(table, sheet.mark) : await writeXlsx(table);
  return { name: roundName(sheet.at, zone, { ending: format }), bytes };
}
