/** How a language, or chat and message together, group thousands. A blank and an apostrophe group everywhere. */
export interface Grouping {
  readonly point: boolean;
  readonly comma: boolean;
}

/** A numeral as it may be read; `unsure` when it could be off by a thousand. */
export interface Numeral {
  readonly value: number;
  readonly unsure: boolean;
}

const asNumber = (whole: string, decimals: string): number => Number(`${whole || '0'}.${decimals || '0'}`);

/**
 * Reads a numeral as people write it: `1200`, `3,5`, `1.234,5`, `1'200`, `1 200`.
 *
 * @param raw Digits with `.`, `,`, `'` or blanks between them; at least one digit.
 * @param grouping Which separators group thousands here. With one separator and exactly three digits after it
 *   that nothing settles, the value is read as grouped and `unsure` is true.
 * @returns The value, never negative; NaN when `raw` is no numeral.
 * @example
 * ```ts
 * readNumeral('1.234,5', { point: false, comma: true }).value // => 1234.5
 * readNumeral('1.200', { point: false, comma: true }).unsure // => true
 * readNumeral('1,200', { point: false, comma: true }) // => { value: 1200, unsure: false }
 * readNumeral("3'25", { point: false, comma: false }).value // => 3.25
 * ```
 */
export function readNumeral(raw: string, grouping: Grouping): Numeral {
  const text = raw.replaceAll(' ', '');
  const marks = text.replace(/\d/g, '');
  if (marks === '') return { value: Number(text), unsure: false };
  const last = marks.at(-1) ?? '';
  const cut = text.lastIndexOf(last);
  const whole = text.slice(0, cut).replace(/\D/g, '');
  const decimals = text.slice(cut + 1);
  const grouped = Number(text.replace(/\D/g, ''));
  const kinds = new Set(marks).size;
  if (kinds > 1) return { value: asNumber(whole, decimals), unsure: kinds > 2 };
  if (marks.length > 1) return { value: grouped, unsure: !/^\d{1,3}(\D\d{3})+$/.test(text) };
  if (last === "'") {
    return decimals.length === 3
      ? { value: grouped, unsure: false }
      : { value: asNumber(whole, decimals), unsure: false };
  }
  if (decimals.length !== 3 || whole === '' || whole.startsWith('0') || whole.length > 3) {
    return { value: asNumber(whole, decimals), unsure: false };
  }
  const groups = last === '.' ? grouping.point : grouping.comma;
  return { value: groups ? grouped : asNumber(whole, decimals), unsure: !groups };
}

/**
 * Reads a numeral whose every separator is a decimal mark, as a pH is written in every language.
 *
 * @param raw A numeral with at most one separator.
 * @returns The value; NaN when it is none.
 * @example
 * ```ts
 * readDecimal('3,457') // => 3.457
 * ```
 */
export function readDecimal(raw: string): number {
  return Number(raw.replace(/[,']/, '.'));
}
