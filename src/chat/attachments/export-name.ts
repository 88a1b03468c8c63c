import { localTimeOf } from '../../core/time/local-time-of.ts';
import type { ExportSpan } from './make-sheet.ts';

/** What the name of an export is made from. */
export interface NamedExport extends ExportSpan {
  readonly zone: string;
  readonly format: 'csv' | 'xlsx';
}

/**
 * The name of an export's file: what it holds, nothing of whose it is. `cellar-2026-11.csv` is a month,
 * `cellar-2026.csv` a year, `cellar-2026-11-03-to-2026-11-17-tank-4.xlsx` two weeks of one tank, `cellar.csv` all, `stock.csv` the chemical store.
 */
export function exportName({ from, to, vessel, of, zone, format }: NamedExport): string {
  const span = from === undefined && to === undefined ? [] : [spanText({ from, to, zone })];
  const plain = vessel
    ?.toLowerCase()
    .normalize('NFKD')
    .replaceAll(/[^a-z0-9]+/g, '-')
    .replaceAll(/^-+|-+$/g, '');
  return `${[of ?? 'cellar', ...span, ...(plain ? [plain] : [])].join('-')}.${format}`;
}

interface ZonedSpan {
  readonly from: number | undefined;
  readonly to: number | undefined;
  readonly zone: string;
}

function spanText({ from, to, zone }: ZonedSpan): string {
  const first = from === undefined ? undefined : dateText(from, zone);
  // `to` is the moment after the last one.
  const last = to === undefined ? undefined : dateText(to - 1, zone);
  if (first === undefined) return `to-${last}`;
  if (last === undefined) return `from-${first}`;
  const after = dateText(to ?? 0, zone);
  const isWhole = (digits: number): boolean =>
    first.slice(0, digits) === last.slice(0, digits) && first.slice(digits) === '-01-01'.slice(digits - 4);
  if (isWhole(4) && after === `${Number(first.slice(0, 4)) + 1}-01-01`) return first.slice(0, 4);
  if (isWhole(7) && after.endsWith('-01') && after.slice(0, 7) !== first.slice(0, 7))
    return first.slice(0, 7);
  return first === last ? first : `${first}-to-${last}`;
}

function dateText(at: number, zone: string): string {
  const { year, month, day } = localTimeOf(at, zone);
  return [String(year), ...[month, day].map((part) => String(part).padStart(2, '0'))].join('-');
}
