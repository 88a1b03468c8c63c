import { assertBetween } from '../bounds.ts';
import { SO2_MOLAR_MASS } from '../chemistry/molar-mass.ts';
import { line, printAlike, withEnoughDigits, type Line } from '../dose/line.ts';
import { number } from '../dose/terms.ts';
import { shown } from '../units/shown.ts';
import { minus, over, times, type Step } from '../working.ts';
import { ASCORBIC_MOLAR_MASS, ascorbicCountsAs_mg_L } from './ascorbic.ts';
import {
  IODATE_MOLAR_MASS,
  iodateNormality,
  normalityOf,
  NORMALITY_MOST,
  type TitrantUnit,
} from './titrant.ts';

/** How SO2 is titrated: aeration–oxidation with NaOH, or iodine in the wine itself. */
export type TitrationMethod = 'aeration' | 'iodine';

/** The titrant: by its strength, or iodate by what was weighed in. */
export type TitrantMade =
  | {
      /** In the unit beside it. */
      readonly strength: number;
      readonly unit: TitrantUnit;
    }
  | { readonly iodate_mg: number; readonly flask_mL: number };

/** A titration: volumes in mL as the burette and pipette show them. */
export interface Titration {
  readonly method: TitrationMethod;
  readonly of: 'free' | 'total';
  readonly sample_mL: number;
  readonly titrant_mL: number;
  /** What the same takes without wine. */
  readonly blank_mL?: number;
  readonly titrant: TitrantMade;
  /** Ascorbic acid in the wine, mg/L; only iodine counts it. */
  readonly ascorbic_mg_L?: number;
}

/** What a titration comes to: mg/L, and how many mg/L one mL of this titrant stands for. */
export interface TitrationAnswer {
  readonly free_mg_L?: number;
  readonly total_mg_L?: number;
  readonly factor: number;
  readonly normality: number;
  /** What the ascorbic acid counted as and was taken off, mg/L. */
  readonly ascorbic_as_SO2_mg_L?: number;
  readonly steps: readonly Step[];
}

/** mg of SO2 in a litre that one litre of 1 N titrant takes up: 32 g an equivalent, as the methods print it. */
export const SO2_OF_NORMAL_mg_L = 32_000;

const isIodate = (made: TitrantMade): made is Extract<TitrantMade, { iodate_mg: number }> =>
  'iodate_mg' in made;

function normality({ method, titrant }: Titration): number {
  return isIodate(titrant)
    ? iodateNormality(titrant.iodate_mg, titrant.flask_mL)
    : normalityOf(titrant.strength, titrant.unit, method === 'aeration' ? 'NaOH' : 'iodine');
}

function check(titration: Titration): void {
  const { sample_mL, titrant_mL, blank_mL = 0, method, titrant } = titration;
  assertBetween('reckon a titration', 'sample_mL', sample_mL, 0.1, 1000);
  assertBetween('reckon a titration', 'titrant_mL', titrant_mL, 0, 1000);
  assertBetween('reckon a titration', 'blank_mL', blank_mL, 0, titrant_mL);
  if (isIodate(titrant) && method === 'aeration')
    throw new TypeError('Cannot reckon a titration as iodate is no titrant of aeration–oxidation');
  assertBetween(
    'reckon a titration',
    'normality',
    normality(titration),
    Number.MIN_VALUE,
    2 * NORMALITY_MOST,
  );
}

/**
 * SO2 by a titration: 32 000 × normality × (titrant − blank) ÷ sample, all volumes in mL. Ascorbic acid, which iodine
 * counts too, is taken off where it is told (never below 0).
 *
 * @throws RangeError for volumes and strengths that no burette has, and for a blank above the titrant
 *
 * Source: the general formula (read); official factors 6.4 for 50 mL with 0.01 M NaOH (Regulation (EEC) No 2676/90,
 * read) and 32 for 50 mL with 0.025 M iodine (OIV-MA-AS323-04B, from memory) follow from it.
 *
 * @example
 * ```ts
 * titrate({ method: 'aeration', of: 'free', sample_mL: 20, titrant_mL: 2.3, titrant: { strength: 0.01, unit: 'N' } }).free_mg_L // => 36.8
 * titrate({ method: 'aeration', of: 'free', sample_mL: 50, titrant_mL: 1, titrant: { strength: 0.01, unit: 'M' } }).factor // => 6.4
 * titrate({ method: 'iodine', of: 'total', sample_mL: 50, titrant_mL: 1, titrant: { strength: 0.025, unit: 'M' } }).total_mg_L // => 32
 * ```
 */
export function titrate(titration: Titration): TitrationAnswer {
  check(titration);
  const { method, of, sample_mL, titrant_mL, blank_mL = 0, ascorbic_mg_L = 0 } = titration;
  const eq_L = normality(titration);
  const factor = (SO2_OF_NORMAL_mg_L * eq_L) / sample_mL;
  const titrated = factor * (titrant_mL - blank_mL);
  const counted = method === 'iodine' ? ascorbicCountsAs_mg_L(ascorbic_mg_L) : 0;
  const found = Math.max(0, titrated - counted);
  return {
    ...(of === 'free' ? { free_mg_L: found } : { total_mg_L: found }),
    factor,
    normality: eq_L,
    ...(counted > 0 && { ascorbic_as_SO2_mg_L: counted }),
    steps: titrationSteps(titration, found),
  };
}

/** Alike with four digits, and with the one decimal that a result is told with. */
const isSame = (printed: number, found: number): boolean =>
  printAlike(printed, found) && Math.round(printed * 10) === Math.round(found * 10);

function titrationSteps(titration: Titration, found: number): readonly Step[] {
  const made = withEnoughDigits(
    (digits) => linesOf(titration, digits),
    (lines) => found === 0 || isSame(lines.at(-1)?.result.value ?? 0, found),
  );
  return made.map(({ step }) => step);
}

function linesOf(titration: Titration, digits: number): readonly Line[] {
  const { method, sample_mL, titrant_mL, blank_mL = 0, ascorbic_mg_L = 0, titrant } = titration;
  const lines: Line[] = [];
  const take = (made: Line): Line['result'] => (lines.push(made), made.result);
  const strength = isIodate(titrant)
    ? take(
        line(
          'iodate-normality',
          over(
            over(times(number(6, digits), number(titrant.iodate_mg, digits)), number(IODATE_MOLAR_MASS, 6)),
            number(titrant.flask_mL, digits),
          ),
          '',
          digits,
        ),
      )
    : titrant.unit === 'M' && method === 'iodine'
      ? take(
          line('titrant-normality', times(number(2, digits), number(titrant.strength, digits)), '', digits),
        )
      : number(titrant.strength, digits);
  const burette = shown(titrant_mL, 'mL', digits);
  const used =
    blank_mL === 0
      ? burette
      : take(line('titrant-used', minus(burette, shown(blank_mL, 'mL', digits)), 'mL', digits));
  const titrated = times(times(shown(SO2_OF_NORMAL_mg_L, 'mg/L'), strength), used);
  const so2 = take(line('so2-by-titration', over(titrated, shown(sample_mL, 'mL', digits)), 'mg/L', digits));
  if (method !== 'iodine' || ascorbic_mg_L === 0) return lines;
  const ratio = over(number(SO2_MOLAR_MASS, 5), number(ASCORBIC_MOLAR_MASS, 6));
  const counted = take(
    line('ascorbic-counted', times(shown(ascorbic_mg_L, 'mg/L', digits), ratio), 'mg/L', digits),
  );
  if (so2.value > counted.value) take(line('so2-without-ascorbic', minus(so2, counted), 'mg/L', digits));
  return lines;
}
