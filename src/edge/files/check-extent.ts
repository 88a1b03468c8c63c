import { FileFault } from './file-fault.ts';
import { FILE_LIMITS } from './file-limits.ts';

const PLACE = /\br\s*=\s*["'](\p{Lu}{0,9})(\d+)["']/gu;

/**
 * Throws a `FileFault` where a cell of a sheet says that it stands outside of what a sheet may have: one cell at the
 * far corner would make whoever reads it lay out all the empty ones before it.
 */
export function checkExtent(sheet: Uint8Array): void {
  for (const [, letters = '', row = ''] of Buffer.from(sheet).toString('latin1').matchAll(PLACE)) {
    if (Number(row) > FILE_LIMITS.rows + 1) throw new FileFault('too-many-rows');
    if (columnNumber(letters) > FILE_LIMITS.columns) throw new FileFault('too-many-columns');
  }
}

/** `A` is 1, `AA` is 27. */
function columnNumber(letters: string): number {
  let number = 0;
  for (const letter of letters) number = number * 26 + letter.charCodeAt(0) - 64;
  return number;
}
