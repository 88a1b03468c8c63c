import type { AdditiveId } from './additive-id.ts';

/** What a percentage beside an additive counts. */
export type StrengthKind =
  | 'assay' // per cent of pure salt in a powder, or of SO2 in the gas
  | 'SO2-yield' // per cent of SO2 that a powder gives
  | 'salt-per-100mL' // grams of the salt in 100 mL of solution
  | 'SO2-per-100mL'; // grams of SO2 in 100 mL of solution

/** How a strength was read, or why it cannot be. */
export type StrengthRead =
  { readonly kind: StrengthKind } | { readonly problem: 'strength-out-of-range' | 'ambiguous-number' };

interface Range {
  readonly min: number;
  readonly max: number;
  readonly kind: StrengthKind;
  /** Above so many per cent (g per 100 mL) a bare figure could mean two things. */
  readonly clearUpTo?: number;
}

/**
 * What may be read as a strength, in per cent (for solutions grams per 100 mL), and as what.
 * Sources: assays from 90 up JECFA 1999, 95 Austrian law text (read); yields of 50 to 58 that cellars reckon with:
 * common practice; potassium bisulfite at most 200 g/L of SO2: OIV-OENO 646-2019 (read); SO2 in water 50 to 150 g/L:
 * Oeno 46/2000, IFV 2024 (read); purity of the gas 99: Austrian law text (read); the rest common practice, no source.
 *
 * @example
 * ```ts
 * STRENGTH_RANGES['sulfur-dioxide-solution'][0]?.max // => 15
 * ```
 */
export const STRENGTH_RANGES: Readonly<Record<AdditiveId, readonly Range[]>> = {
  'potassium-metabisulfite': [
    { min: 80, max: 100, kind: 'assay' },
    { min: 45, max: 60, kind: 'SO2-yield' },
  ],
  'sodium-metabisulfite': [
    { min: 80, max: 100, kind: 'assay' },
    { min: 60, max: 68, kind: 'SO2-yield' },
  ],
  'potassium-metabisulfite-solution': [{ min: 1, max: 25, kind: 'salt-per-100mL' }],
  'sodium-metabisulfite-solution': [{ min: 1, max: 25, kind: 'salt-per-100mL' }],
  'sulfur-dioxide-solution': [{ min: 1, max: 15, kind: 'SO2-per-100mL', clearUpTo: 8 }],
  'potassium-bisulfite-solution': [{ min: 5, max: 40, kind: 'SO2-per-100mL', clearUpTo: 20 }],
  'ammonium-bisulfite-solution': [{ min: 10, max: 70, kind: 'SO2-per-100mL', clearUpTo: 40 }],
  'sulfur-dioxide-gas': [{ min: 99, max: 100, kind: 'assay' }],
  tablet: [],
};

/**
 * What a percentage beside an additive means. The range is looked at first, then what could be read two ways.
 *
 * @param id the additive
 * @param percent as written; grams per litre divided by ten
 * @param saltSaid whether the word `salt` stood beside it: a bisulfite's strength is then grams of the salt
 * @param nameMeansSO2InWater whether SO2 in water was named so that nothing else can be meant (`sulfurous acid`)
 * @returns the kind, or the problem as data; NaN and negative figures are out of range
 *
 * @example
 * ```ts
 * readStrength('potassium-metabisulfite', 96) // => { kind: 'assay' }
 * readStrength('potassium-metabisulfite', 57) // => { kind: 'SO2-yield' }
 * readStrength('potassium-bisulfite-solution', 30) // => { problem: 'ambiguous-number' }
 * readStrength('potassium-bisulfite-solution', 30, true) // => { kind: 'salt-per-100mL' }
 * readStrength('sulfur-dioxide-solution', 10, false, true) // => { kind: 'SO2-per-100mL' }
 * readStrength('sulfur-dioxide-solution', 16) // => { problem: 'strength-out-of-range' }
 * ```
 */
export function readStrength(
  id: AdditiveId,
  percent: number,
  saltSaid = false,
  nameMeansSO2InWater = false,
): StrengthRead {
  const range = STRENGTH_RANGES[id].find(({ min, max }) => percent >= min && percent <= max);
  if (range === undefined) return { problem: 'strength-out-of-range' };
  if (range.clearUpTo === undefined) return { kind: range.kind };
  if (id === 'sulfur-dioxide-solution') {
    if (saltSaid) return { problem: 'ambiguous-number' }; // no salt is in it: what was meant?
    return percent <= range.clearUpTo || nameMeansSO2InWater
      ? { kind: range.kind }
      : { problem: 'ambiguous-number' };
  }
  if (saltSaid) return { kind: 'salt-per-100mL' };
  return percent <= range.clearUpTo ? { kind: range.kind } : { problem: 'ambiguous-number' };
}
