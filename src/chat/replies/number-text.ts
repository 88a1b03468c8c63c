/** The mark between whole and broken parts of a number, as the person writes it. */
export type DecimalMark = '.' | ',';

/** Groups of three digits are parted by a narrow no-break space, which no language reads as a decimal. */
const THIN_SPACE = '\u202f';

/**
 * A number as text: rounded to at most `decimals` places (0 to 10), trailing zeros dropped, thousands parted by
 * a narrow space. Throws a RangeError for what is no finite number, so that none ever reaches a person.
 *
 * @example
 * ```ts
 * numberText(5488.85, 0, '.') // => "5\u202f489"
 * numberText(0.3550, 2, ',') // => "0,36"
 * numberText(0.8, 2, '.') // => "0.8"
 * ```
 */
export function numberText(value: number, decimals: number, mark: DecimalMark): string {
  if (!Number.isFinite(value)) throw new RangeError(`Cannot write a number as it is not finite: ${value}`);
  const [whole = '', broken = ''] = Math.abs(value).toFixed(decimals).split('.');
  const kept = broken.replace(/0+$/, '');
  const grouped = whole.replace(/(?<=\d)(?=(?:\d{3})+$)/g, THIN_SPACE);
  const sign = value < 0 && (kept !== '' || /[1-9]/.test(whole)) ? '-' : '';
  return `${sign}${grouped}${kept === '' ? '' : mark + kept}`;
}
