import { plainText, type Quantity } from '../../core/working.ts';
import { numberText, type DecimalMark } from './number-text.ts';

/** How the working's units are written for people. */
const UNIT_TEXT: Readonly<Record<string, string>> = { galUS: 'gal', galUK: 'imp gal' };

/** A factor between two units: the figure is what a calculator takes. */
const PER = /\b(\d[\d.]*) \w+\/(?:g|hL|cL|dL|mL|m3|galUS|galUK)\b/g;

/** Every digit stays as it was reckoned with: only the mark and the grouping change. */
function withMark(text: string, mark: DecimalMark): string {
  return text.replace(/(\d+)(?:\.(\d+))?/g, (_, whole: string, broken?: string) => {
    const grouped = numberText(Number(whole), 0, mark);
    return broken === undefined ? grouped : grouped + mark + broken;
  });
}

/**
 * An expression of the working as people write it: × and ÷, their decimal mark, thin grouping. Factors between units
 * are bare figures, and ppm stands where the person wrote ppm.
 *
 * @example
 * ```ts
 * expressionText('0.8 * (10^(3.58 - 1.81) + 1)', ',') // => "0,8 × (10^(3,58 − 1,81) + 1)"
 * expressionText('147.69 g / 0.57629', '.') // => "147.69 g ÷ 0.57629"
 * expressionText('26.9 mg/L * 1450 L / (1000 mg/g)', '.', 'ppm') // => "26.9 ppm × 1\u202f450 L ÷ 1\u202f000"
 * expressionText('75 g / (15 g / (100 mL))', '.') // => "75 g ÷ (15 g ÷ 100 mL)"
 * ```
 */
export function expressionText(expression: string, mark: DecimalMark, unit: 'mg/L' | 'ppm' = 'mg/L'): string {
  const written = expression
    .replaceAll('sqrt(', '√(')
    .replaceAll(' * ', ' × ')
    .replaceAll(' / ', ' ÷ ')
    .replaceAll(' - ', ' − ')
    .replace(PER, '$1')
    .replace(/\((\d[\d.]*(?: \w+)?)\)/g, '$1') // a figure alone needs no brackets
    .replaceAll('mg/L', unit)
    .replace(/\bgalU[SK]\b/g, (one) => UNIT_TEXT[one] ?? one);
  return withMark(written, mark);
}

/**
 * The same, shorter: every unit is left out of a sum that has mg/L in it, as its figures alone give the result.
 *
 * @example
 * ```ts
 * shortExpression('47.91 mg/L - 21 mg/L') // => "47.91 - 21"
 * shortExpression('26.9 mg/L * 5488.8 L / (1000 mg/g)') // => "26.9 * 5488.8 / 1000"
 * shortExpression('147.7 g / 0.57629') // => "147.7 g / 0.57629"
 * ```
 */
export function shortExpression(expression: string): string {
  if (!/mg\/[Lg]/.test(expression)) return expression;
  return expression.replace(/(\d) (?:mg\/L|mg\/g|[a-zA-Z]\w*)/g, '$1').replace(/\((\d[\d.]*)\)/g, '$1');
}

/**
 * The result of a line of the working with its unit, ppm where the person wrote ppm.
 *
 * @example
 * ```ts
 * resultText({ value: 256.3, unit: 'g' }, ',') // => "256,3 g"
 * resultText({ value: 47.91, unit: 'mg/L' }, '.', 'ppm') // => "47.91 ppm"
 * resultText({ value: 2.2, unit: '' }, '.') // => "2.2"
 * ```
 */
export function resultText(
  { value, unit }: Quantity,
  mark: DecimalMark,
  concentrationUnit: 'mg/L' | 'ppm' = 'mg/L',
): string {
  const number = withMark(plainText(value), mark);
  if (unit === '') return number;
  return `${number} ${unit === 'mg/L' ? concentrationUnit : (UNIT_TEXT[unit] ?? unit)}`;
}
