import { plainText, type Quantity } from '../../core/working.ts';
import { numberText, type DecimalMark } from './number-text.ts';

/** How the working's units are written for people. */
const UNIT_TEXT: Readonly<Record<string, string>> = { galUS: 'gal', galUK: 'imp gal' };

/** Every digit stays as it was reckoned with: only the mark and the grouping change. */
function withMark(text: string, mark: DecimalMark): string {
  return text.replace(/(\d+)(?:\.(\d+))?/g, (_, whole: string, broken?: string) => {
    const grouped = numberText(Number(whole), 0, mark);
    return broken === undefined ? grouped : grouped + mark + broken;
  });
}

/**
 * An expression of the working as people write it: × and ÷, their decimal mark, thin grouping. `mg/L` stays.
 *
 * @example
 * ```ts
 * expressionText('0.8 * (10^(3.58 - 1.81) + 1)', ',') // => "0,8 × (10^(3,58 − 1,81) + 1)"
 * expressionText('147.69 g / 0.57629', '.') // => "147.69 g ÷ 0.57629"
 * expressionText('26.9 mg/L * 1450 galUS', '.') // => "26.9 mg/L × 1\u202f450 gal"
 * ```
 */
export function expressionText(expression: string, mark: DecimalMark): string {
  const written = expression
    .replaceAll(' * ', ' × ')
    .replaceAll(' / ', ' ÷ ')
    .replaceAll(' - ', ' − ')
    .replace(/\bgalU[SK]\b/g, (unit) => UNIT_TEXT[unit] ?? unit);
  return withMark(written, mark);
}

/**
 * The same, shorter: where every unit in it is mg/L, and the result has it too, it is left out of the sum.
 *
 * @example
 * ```ts
 * shortExpression('47.91 mg/L - 21 mg/L', 'mg/L') // => "47.91 - 21"
 * shortExpression('26.9 mg/L * 1450 galUS', 'g') // => "26.9 mg/L * 1450 galUS"
 * ```
 */
export function shortExpression(expression: string, unit: string): string {
  if (unit !== 'mg/L') return expression;
  const bare = expression.replaceAll(' mg/L', '');
  return /[a-z]/i.test(bare) ? expression : bare;
}

/**
 * The result of a line of the working with its unit.
 *
 * @example
 * ```ts
 * resultText({ value: 256.3, unit: 'g' }, ',') // => "256,3 g"
 * resultText({ value: 2.2, unit: '' }, '.') // => "2.2"
 * ```
 */
export function resultText({ value, unit }: Quantity, mark: DecimalMark): string {
  const number = withMark(plainText(value), mark);
  return unit === '' ? number : `${number} ${UNIT_TEXT[unit] ?? unit}`;
}
