import { numberText, type DecimalMark } from '../../replies/number-text.ts';
import { concentrationText } from '../../replies/quantity-text.ts';

/** So many decimals at most tell a figure from a limit that it passes by a hair. */
const MOST_DECIMALS = 4;

/**
 * A concentration beside a limit: as always, but never rounded to the limit itself where it is another.
 *
 * @example
 * ```ts
 * apartFromLimit(157.6, 150, '.') // => '158'
 * apartFromLimit(150.1, 150, '.') // => '150.1'
 * ```
 */
export function apartFromLimit(SO2_mg_L: number, limit_mg_L: number, mark: DecimalMark): string {
  const usual = concentrationText(SO2_mg_L, mark);
  const isApart = (text: string): boolean =>
    SO2_mg_L === limit_mg_L || Number(text.replace(mark, '.').replaceAll(/\s/g, '')) !== limit_mg_L;
  if (isApart(usual)) return usual;
  for (let decimals = 1; decimals < MOST_DECIMALS; decimals++) {
    const text = numberText(SO2_mg_L, decimals, mark);
    if (isApart(text)) return text;
  }
  return numberText(SO2_mg_L, MOST_DECIMALS, mark);
}
