/**
 * A strength of grams in a litre, as it stands on a label, in per cent (grams in 100 mL); other texts as they are.
 *
 * @example
 * ```ts
 * strengthAnswer('150 g/L') // => '15%'
 * strengthAnswer('15') // => '15'
 * ```
 */
export function strengthAnswer(text: string): string {
  const match = /^\s*(\d+(?:[.,]\d{1,2})?)\s*g\s*\/\s*l\s*$/i.exec(text);
  if (!match) return text;
  return `${Number(((Number(match[1]?.replace(',', '.')) || 0) / 10).toPrecision(6))}%`;
}
