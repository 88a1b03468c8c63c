import type { Measure } from '../../core/dose/answer.ts';
import { numberText, type DecimalMark } from './number-text.ts';

/**
 * A computed concentration in mg/L, without its unit: whole from 10 up, to 0.1 below.
 *
 * @example
 * ```ts
 * concentrationText(47.94, '.') // => "48"
 * concentrationText(3.26, ',') // => "3,3"
 * ```
 */
export function concentrationText(mg_L: number, mark: DecimalMark): string {
  return numberText(mg_L, Math.abs(mg_L) >= 9.95 ? 0 : 1, mark);
}

/**
 * Molecular SO2 in mg/L, without its unit: to 0.01.
 *
 * @example
 * ```ts
 * molecularText(0.3512, '.') // => "0.35"
 * ```
 */
export function molecularText(mg_L: number, mark: DecimalMark): string {
  return numberText(mg_L, 2, mark);
}

/** Decimals that the instrument shows at least: kilograms and litres to 0.01, under 10 g or mL to 0.1. */
function stepDecimals({ value, unit }: Measure): number {
  if (unit === 'kg' || unit === 'L') return 2;
  return value < 10 ? 1 : 0;
}

/**
 * What a scale or a cylinder shows, with the digits of its step and its unit; tablets (half ones too) without, as their word is the locale's.
 *
 * @example
 * ```ts
 * measureText({ value: 256, unit: 'g' }, '.') // => "256 g"
 * measureText({ value: 4, unit: 'g' }, '.') // => "4.0 g"
 * measureText({ value: 1.2, unit: 'L' }, '.') // => "1.20 L"
 * measureText({ value: 2.5, unit: 'tablets' }, '.') // => "2½"
 * ```
 */
export function measureText(measure: Measure, mark: DecimalMark): string {
  if (measure.unit !== 'tablets')
    return `${numberText(measure.value, 3, mark, stepDecimals(measure))} ${measure.unit}`;
  const whole = Math.floor(measure.value);
  if (measure.value - whole < 0.25) return numberText(whole, 0, mark);
  return `${whole === 0 ? '' : numberText(whole, 0, mark)}½`;
}

/**
 * A mass in grams as a scale shows it, for amounts that carry no `Measure` of their own: under 10 g to 0.1 g (under
 * 1 g to 0.01 g), under 1 kg to 1 g, above in kg to 10 g.
 *
 * @example
 * ```ts
 * massText(4.66, '.') // => "4.7 g"
 * massText(1234, ',') // => "1,23 kg"
 * ```
 */
export function massText(mass_g: number, mark: DecimalMark): string {
  if (mass_g >= 999.5) return `${numberText(mass_g / 1000, 2, mark)} kg`;
  return `${numberText(mass_g, mass_g >= 9.95 ? 0 : mass_g >= 1 ? 1 : 2, mark)} g`;
}
