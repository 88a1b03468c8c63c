import type { DecimalMark } from '../replies/number-text.ts';
import type { TableCell } from './cell.ts';
import { cellText } from './cell-text.ts';
import type { EntryField, FieldForm } from './entry-fields.ts';
import { FIELD_FORMS } from './entry-fields.ts';
import { readExactTime } from './exact-time.ts';
import type { FieldValue } from './fields-of-entry.ts';
import { splitNames } from './name-list.ts';

/** The longest text of a field in UTF-16 units: a message's; a key has a bound of its own. */
const LONGEST_TEXT = 4096;
const LONGEST_KEY = 200;

/** Signs that steer a screen; no text of ours has them. */
const STEERING = /[\p{Cc}--[\t\n\r]]/v;

const NUMBER: Readonly<Record<DecimalMark, RegExp>> = {
  '.': /^[-+]?\d+(?:\.\d+)?(?:e[-+]?\d+)?$/i,
  ',': /^[-+]?\d+(?:,\d+)?(?:e[-+]?\d+)?$/i,
};

/** The value of a field that a cell holds, which is not empty; undefined where it holds none. */
export function readField(field: EntryField, cell: TableCell, mark: DecimalMark): FieldValue | undefined {
  const form = FIELD_FORMS[field];
  if (form.is === 'number') return readNumber(form, cell, mark);
  if (cell instanceof Date) return undefined;
  const text = cellText(cell);
  const word = text.trim();
  switch (form.is) {
    case 'text':
      return isText(text, field === 'key' ? LONGEST_KEY : LONGEST_TEXT) ? text : undefined;
    case 'names':
      return isText(text, LONGEST_TEXT) ? splitNames(text) : undefined;
    case 'count':
      return /^[1-9]\d{0,14}$/.test(word) ? Number(word) : undefined;
    case 'time':
      return readExactTime(word);
    case 'yes-no':
      return word === 'yes' ? true : word === 'no' ? false : undefined;
    case 'choice':
      return Object.hasOwn(form.of, word) ? word : undefined;
  }
}

/** Whether a text is one that the log may hold. */
export function isText(text: string, most: number): boolean {
  return text.length <= most && text.isWellFormed() && !STEERING.test(text);
}

function readNumber(
  { min, max }: FieldForm & { readonly is: 'number' },
  cell: TableCell,
  mark: DecimalMark,
): number | undefined {
  if (cell instanceof Date) return undefined;
  const text = cellText(cell).trim();
  const isNumber = typeof cell === 'number' || NUMBER[mark].test(text);
  const value = isNumber ? Number(text.replace(',', '.')) : NaN;
  return Number.isFinite(value) && value >= min && value <= max ? value : undefined;
}
