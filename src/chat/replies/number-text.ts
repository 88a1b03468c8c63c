/** The mark between whole and broken parts of a number, as the person writes it. */
export type DecimalMark = '.' | ',';

/** Groups of three digits are parted by a narrow no-break space, which no language reads as a decimal. */
const THIN_SPACE = '\u202f';

/**
 * A number as text: rounded to at most `decimals` places (0 to 10), trailing zeros dropped but for
 * the `least` places, thousands parted by a narrow space. Throws a RangeError for what is no finite number, so that none ever reaches a person.
 *
 * @example
 * ```ts
 * numberText(5488.85, 0, '.') // => "5\u202f489"
 * numberText(0.356, 2, ',') // => "0,36"
 * numberText(0.8, 2, '.') // => "0.8"
 * numberText(4, 3, '.', 1) // => "4.0"
 * ```
 */
export function numberText(value: number, decimals: number, mark: DecimalMark, least = 0): string {
  if (!Number.isFinite(value)) throw new RangeError(`Cannot write a number as it is not finite: ${value}`);
  const [whole = '', broken = ''] = Math.abs(value).toFixed(decimals).split('.');
  let places = broken.length;
  while (places > least && broken[places - 1] === '0') places -= 1;
  const kept = broken.slice(0, places);
  const grouped = whole.length > 3 ? whole.replace(/(?<=\d)(?=(?:\d{3})+$)/g, THIN_SPACE) : whole;
  const sign = value < 0 && (kept !== '' || /[1-9]/.test(whole)) ? '-' : '';
  return `${sign}${grouped}${kept === '' ? '' : mark + kept}`;
}

/** Shares that people write as a fraction. */
const FRACTIONS = [
  [1, 2],
  [1, 3],
  [2, 3],
  [1, 4],
  [3, 4],
  [1, 5],
  [2, 5],
] as const;

/**
 * A share from 0 to 1 as people write it: a small fraction, else to 0.01.
 *
 * @example
 * ```ts
 * shareText(1 / 3, '.') // => "1/3"
 * shareText(0.35, ',') // => "0,35"
 * ```
 */
export function shareText(share: number, mark: DecimalMark): string {
  const found = FRACTIONS.find(([over, under]) => Math.abs(share - over / under) < 1e-4);
  return found ? found.join('/') : numberText(share, 2, mark);
}
