import type { LoggedEntry } from '../../../src/core/cellar/entry.ts';

/** How a library that knows nothing of us has a cell: of text all is text, of a spreadsheet a number is one. */
export type ForeignRow = Readonly<Record<string, unknown>>;

/** How the cells of a file are written: with which decimal mark, and whether an apostrophe keeps formulas away. */
export interface Writing {
  readonly decimal?: ',';
  readonly apostrophe?: true;
}

const MAY_RECKON = /^'*[=+\-@\t\r＝＋－＠]/;

/**
 * What in a foreign library's row is not the entry's value, by the names in brackets: stated here anew and with
 * nothing of the code that writes and reads, so that a slip in both is found.
 */
export function differences(entry: LoggedEntry, row: ForeignRow, writing: Writing = {}): string[] {
  const { struck, ...own } = entry;
  const { usual, ...rest } = own.kind === 'vessel' ? own : { ...own, usual: undefined };
  const values: Record<string, unknown> = { ...rest, ...usual, struck_by: struck?.entry };
  const names = Object.keys(row).flatMap((heading) => /\[(\w+)\]$/.exec(heading)?.[1] ?? []);
  const unknown = Object.keys(values).filter((name) => values[name] !== undefined && !names.includes(name));
  const wrong = Object.entries(row).flatMap(([heading, cell]) => {
    const name = /\[(\w+)\]$/.exec(heading)?.[1];
    if (name === undefined || name === 'name') return [];
    return isSame(values[name], cell ?? '', name, writing)
      ? []
      : [`${name}: ${JSON.stringify(values[name])} is ${JSON.stringify(cell)}`];
  });
  return [...unknown.map((name) => `${name} has no column`), ...wrong];
}

function isSame(value: unknown, cell: unknown, name: string, writing: Writing): boolean {
  if (value === undefined) return cell === '';
  if (['at', 'noted_at', 'until'].includes(name)) return Date.parse(String(cell)) === value;
  if (typeof value === 'number') return numberIn(cell, writing) === value;
  if (typeof value === 'boolean') return cell === (value ? 'yes' : 'no');
  const parts = (Array.isArray(value) ? value : []).map(String);
  const text =
    typeof value === 'string'
      ? value
      : parts.map((one) => one.replaceAll('\\', '\\\\').replaceAll(',', '\\,')).join(', ');
  return cell === (writing.apostrophe && MAY_RECKON.test(text) ? `'${text}` : text);
}

function numberIn(cell: unknown, { decimal }: Writing): number {
  return typeof cell === 'number' ? cell : Number(decimal ? String(cell).replace(decimal, '.') : cell);
}
