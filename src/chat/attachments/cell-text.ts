import type { TableCell } from './cell.ts';

/** A cell as text: a number as short as it can be said without loss, a date as nothing that we read. */
export function cellText(cell: TableCell): string {
  if (cell === undefined) return '';
  return cell instanceof Date ? '?' : String(cell);
}

/** Whether nothing stands in a cell. */
export function isBlank(cell: TableCell): boolean {
  return cellText(cell).trim() === '';
}
