import { assertBetween } from '../bounds.ts';

/** What is titrated with: sodium hydroxide after aeration, or iodine; iodate makes iodine in the flask. */
export type Titrant = 'NaOH' | 'iodine' | 'iodate';

/** How the strength of a titrant is written: equivalents (N) or moles (M) in a litre. */
export type TitrantUnit = 'N' | 'M';

/** Strongest titrant that is taken for one, N (own threshold). */
export const NORMALITY_MOST = 2;

/** Equivalents in one mole of each titrant: NaOH one, iodine (I2) two, potassium iodate six by the iodine it makes. */
const EQUIVALENTS: Readonly<Record<Titrant, number>> = { NaOH: 1, iodine: 2, iodate: 6 };

/**
 * Normality of a titrant: 0.01 M iodine is 0.02 N.
 *
 * @param strength as it stands on the bottle, in `unit`, above 0 and at most 2
 * @returns equivalents in a litre
 * @throws RangeError outside that range
 *
 * Source: one I2 takes up two electrons; KIO3 + 5 KI + 6 H+ gives 3 I2 (chemistry, no source needed).
 *
 * @example
 * ```ts
 * normalityOf(0.01, 'M', 'iodine') // => 0.02
 * normalityOf(0.01, 'M', 'NaOH') // => 0.01
 * normalityOf(0.02, 'N', 'iodine') // => 0.02
 * ```
 */
export function normalityOf(strength: number, unit: TitrantUnit, titrant: Titrant): number {
  assertBetween('work out a normality', `strength in ${unit}`, strength, Number.MIN_VALUE, NORMALITY_MOST);
  return unit === 'N' ? strength : strength * EQUIVALENTS[titrant];
}

/** Molar mass of potassium iodate, KIO3, g/mol (conventional atomic weights, I 126.904; from memory). */
export const IODATE_MOLAR_MASS = 213.999;

/**
 * Normality, as iodine, of potassium iodate that was weighed into a flask.
 *
 * @param iodate_mg mg of KIO3, above 0
 * @param flask_mL mL that it was made up to, above 0
 * @returns equivalents in a litre
 * @throws RangeError outside these ranges
 *
 * Source: KIO3 + 5 KI + 6 H+ gives 3 I2 (chemistry, no source needed).
 *
 * @example
 * ```ts
 * iodateNormality(27.8, 500) // => 0.00155889
 * ```
 */
export function iodateNormality(iodate_mg: number, flask_mL: number): number {
  assertBetween('work out a normality', 'iodate_mg', iodate_mg, Number.MIN_VALUE, 1_000_000);
  assertBetween('work out a normality', 'flask_mL', flask_mL, Number.MIN_VALUE, 100_000);
  return (EQUIVALENTS.iodate * iodate_mg) / IODATE_MOLAR_MASS / flask_mL;
}
