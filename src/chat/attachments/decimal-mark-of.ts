import type { DecimalMark } from '../replies/number-text.ts';
import type { TableCell } from './cell.ts';

/** A number as spreadsheets save it. */
const WITH_MARK = /^\s*[-+]?\d+[.,]\d+(?:e[-+]?\d+)?\s*$/i;
/** Three digits behind the mark: it may be one between thousands as well. */
const GROUPED = /^\s*[-+]?\d{1,3}[.,]\d{3}\s*$/;

/**
 * The decimal mark of a file's numbers. What parts its cells tells the usual one: countries that write a comma part
 * cells by semicolons. Undefined where the numbers contradict each other, or are of the other kind and could all be
 * thousands: a tank of 5.200 must not become one of 5,2.
 */
export function decimalMarkOf(
  cells: Iterable<TableCell>,
  delimiter: string | undefined,
): DecimalMark | undefined {
  const usual: DecimalMark = delimiter === ';' ? ',' : '.';
  const seen = { '.': 0, ',': 0 };
  const clear = { '.': 0, ',': 0 };
  for (const cell of cells) {
    if (typeof cell !== 'string' || !WITH_MARK.test(cell)) continue;
    const mark: DecimalMark = cell.includes(',') ? ',' : '.';
    seen[mark] += 1;
    if (!GROUPED.test(cell)) clear[mark] += 1;
  }
  if (seen['.'] > 0 && seen[','] > 0) return undefined;
  const other: DecimalMark = usual === '.' ? ',' : '.';
  if (seen[other] === 0) return usual;
  return clear[other] > 0 ? other : undefined;
}
