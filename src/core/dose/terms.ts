import type { SO2Content } from '../additives/so2-content.ts';
import { cellAround } from '../chemistry/interpolate.ts';
import { OIV_TABLE_2 } from '../chemistry/dissociation-tables.ts';
import type { Dissociation } from '../chemistry/dissociation.ts';
import type { StepName } from '../step-names.ts';
import { shown, type ShownUnit } from '../units/shown.ts';
import { minus, over, plus, roundTo, tenTo, termOf, times, type Term } from '../working.ts';
import { line, type Line } from './line.ts';

const ONE = termOf(1, '', 1, 4);
const HUNDRED = termOf(100, '', 1, 4);
const HUNDRED_mL = shown(100, 'mL');

/**
 * A pure number as the working shows it, with at least 5 digits (a share is 0.57629).
 *
 * @example
 * ```ts
 * number(0.5762902160750947, 4).text // => '0.57629'
 * ```
 */
export function number(value: number, digits: number): Term {
  return termOf(value, '', 1, Math.max(digits, 5));
}

/**
 * 10^(pH − pK) + 1 as a term, a pure number above 1.
 *
 * @example
 * ```ts
 * freeToMolecularTerm(3.58, { text: '1.81', value: 1.81, holds: 'number' }, 4).text // => '10^(3.58 - 1.81) + 1'
 * ```
 */
export function freeToMolecularTerm(ph: number, pK: Term, digits: number): Term {
  return plus(tenTo(minus(number(ph, digits), pK)), ONE);
}

/**
 * The line that finds the pK between four values of the OIV table, or none where the pK is a plain constant.
 *
 * @param alcohol_percent % vol
 * @param temperature_C °C
 *
 * @example
 * ```ts
 * pKLine({ pK: 1.81, basis: 'pk-1.81', source: 'uc-1982' }, 13, 14, 4).pK.text // => '1.81'
 * ```
 */
export function pKLine(
  dissociation: Dissociation,
  alcohol_percent: number | undefined,
  temperature_C: number | undefined,
  digits: number,
): { readonly pK: Term; readonly lines: readonly Line[] } {
  if (dissociation.basis !== 'oiv' || alcohol_percent === undefined || temperature_C === undefined) {
    return { pK: number(dissociation.pK, digits), lines: [] };
  }
  const cell = cellAround(OIV_TABLE_2, alcohol_percent, temperature_C);
  const [a0, a1] = cell.alcohol_percent.map((value) => number(value, digits)) as [Term, Term];
  const [t0, t1] = cell.temperature_C.map((value) => number(value, digits)) as [Term, Term];
  const [ll, lh, hl, hh] = cell.pK.map((value) => number(value, digits)) as [Term, Term, Term, Term];
  const alcohol = number(alcohol_percent, digits);
  const temperature = number(temperature_C, digits);
  const between = (low: Term, high: Term): Term =>
    plus(times(low, minus(a1, alcohol)), times(high, minus(alcohol, a0)));
  const sum = plus(
    times(between(ll, hl), minus(t1, temperature)),
    times(between(lh, hh), minus(temperature, t0)),
  );
  // One digit more than the rest, as it stands in an exponent.
  const pK = line('dissociation', over(sum, times(minus(a1, a0), minus(t1, t0))), '', digits + 1);
  return { pK: pK.result, lines: [pK] };
}

/**
 * A share that binds, 0 to 0.8: as a fraction where it is one (`1 / 3`).
 *
 * @example
 * ```ts
 * shareTerm(1 / 3, 4).text // => '1 / 3'
 * shareTerm(0.35, 4).text // => '0.35'
 * ```
 */
export function shareTerm(share: number, digits: number): Term {
  const isShort = roundTo(share, 4) === share;
  for (const divisor of isShort ? [] : [3, 6, 7, 9]) {
    const part = Math.round(share * divisor);
    if (part > 0 && Math.abs(share * divisor - part) < 1e-9) {
      return over(number(part, digits), number(divisor, digits));
    }
  }
  return number(share, digits);
}

/**
 * 1 + p ÷ 100 as a term.
 *
 * @param percent share added, %, not negative
 *
 * @example
 * ```ts
 * allowanceTerm(30, 4).text // => '1 + 30 / 100'
 * ```
 */
export const allowanceTerm = (percent: number, digits: number): Term =>
  plus(ONE, over(number(percent, digits), HUNDRED));

/**
 * 1 − s as a term.
 *
 * @param share that binds, from 0 to 0.8
 *
 * @example
 * ```ts
 * remainderTerm(0.5, 4).text // => '1 - 0.5'
 * ```
 */
export const remainderTerm = (share: number, digits: number): Term => minus(ONE, shareTerm(share, digits));

/** How a line is named that turns SO2 into an amount of additive, by what is known of its strength; and its unit. */
export const AMOUNT_LINES: Readonly<Record<SO2Content['of'], readonly [StepName, ShownUnit]>> = {
  salt: ['additive-mass', 'g'],
  assay: ['additive-mass-by-assay', 'g'],
  yield: ['additive-mass-by-yield', 'g'],
  gas: ['gas-by-purity', 'g'],
  'salt-solution': ['additive-volume-by-salt', 'mL'],
  'SO2-solution': ['additive-volume-by-so2', 'mL'],
  'SO2-tablet': ['tablets-by-so2', ''],
  'salt-tablet': ['tablets-by-salt', ''],
};

/**
 * SO2 in a gram, a millilitre or a tablet (above 0), as a term; `undefined` for pure SO2, which needs no line.
 *
 * @example
 * ```ts
 * contentTerm({ of: 'SO2-solution', per: 'mL', SO2_g_per_100_mL: 6 }, 4)?.text // => '6 g / (100 mL)'
 * ```
 */
export function contentTerm(content: SO2Content, digits: number): Term | undefined {
  switch (content.of) {
    case 'salt':
      return number(content.share, digits);
    case 'assay':
      return times(number(content.assay_share, digits), number(content.share, digits));
    case 'yield':
      return number(content.fraction, digits);
    case 'gas':
      return content.purity_share === 1 ? undefined : number(content.purity_share, digits);
    case 'salt-solution':
      return times(over(shown(content.salt_g_per_100_mL, 'g'), HUNDRED_mL), number(content.share, digits));
    case 'SO2-solution':
      return over(shown(content.SO2_g_per_100_mL, 'g'), HUNDRED_mL);
    case 'SO2-tablet':
      return shown(content.SO2_g, 'g');
    case 'salt-tablet':
      return times(shown(content.salt_g, 'g'), number(content.share, digits));
  }
}
