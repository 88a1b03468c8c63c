/**
 * What a spreadsheet takes for the start of a formula, plain or in full width. The library that writes CSV puts an
 * apostrophe before such a text.
 */
const FORMULA = '[=+\\-@\\t\\r\\uFF1D\\uFF0B\\uFF0D\\uFF20]';
const MARKED = new RegExp(`^'+${FORMULA}`);

/** Puts an apostrophe before a text that begins as if it had been given one, so that taking it away is never wrong. */
export function markMarked(text: string): string {
  return MARKED.test(text) ? `'${text}` : text;
}

/** Takes the apostrophe away that was put before a text so that no spreadsheet reckons with it. */
export function unmark(text: string): string {
  return MARKED.test(text) ? text.slice(1) : text;
}
