import type { Line } from '../replies/reply.ts';
import type { RecordColumn, ShownColumn } from './columns.ts';

/** Whatever an export says in words. */
export type ExportWord = ShownColumn | RecordColumn | 'is-late' | 'is-calculated' | 'is-not-calculated';

/** The words of an export in a language, and what a person without a name is called. */
export interface ExportWords {
  readonly words: Readonly<Record<ExportWord, string>>;
  /** By the number of the person. */
  readonly unnamed: Readonly<Record<number, string>>;
}

/** The line that says a word of an export. */
export function exportWordLine(word: ExportWord): Line {
  return { room: 'first', key: `export-${word}`, values: {} };
}

/** The line that says how somebody is called who has no name. */
export function unnamedLine(number: number): Line {
  return { room: 'first', key: 'export-unnamed', values: { number: String(number) } };
}
