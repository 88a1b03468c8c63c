import { COLUMNS } from '../../chat/attachments/columns.ts';
import { exportWordLine, unnamedLine } from '../../chat/attachments/export-words.ts';
import type { ExportWord, ExportWords } from '../../chat/attachments/export-words.ts';
import type { Language } from '../../chat/reader/understood.ts';
import type { Line } from '../../chat/replies/reply.ts';
import type { Say } from '../../chat/replies/say.ts';

/** The words of an export in a language; `by` are the numbers of people who may have no name. */
export function sayExportWords(say: Say, language: Language, by: Iterable<number>): ExportWords {
  const text = (line: Line): string => say({ language, lines: [line], buttons: [] }).text;
  const words = [
    ...COLUMNS.map((column) => ('shown' in column ? column.shown : column.record)),
    ...(['is-late', 'is-calculated', 'is-not-calculated'] as const),
  ];
  return {
    words: Object.fromEntries(words.map((word) => [word, text(exportWordLine(word))])) as Record<
      ExportWord,
      string
    >,
    unnamed: Object.fromEntries([...new Set(by)].map((number) => [number, text(unnamedLine(number))])),
  };
}
