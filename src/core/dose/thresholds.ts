/** Free SO2 in mg/L above which a need that nobody stated becomes a choice (own threshold). */
export const FREE_NEED_HIGH_mg_L = 60;

/** Molecular SO2 in mg/L above which it is smelt (Understanding Wine Chemistry 2016, table 17.1; read). */
export const MOLECULAR_SMELT_mg_L = 2;

/** mg/L of SO2 below which a rise is smaller than any reading shows, so that nothing is worth adding (own threshold). */
export const RISE_NEGLIGIBLE_mg_L = 0.5;

/** Grams of SO2 below which the gas cannot be measured out (own threshold). */
export const GAS_LEAST_g = 5;

/** mg/L of free SO2 by which two ways out of a choice must differ to be two (own threshold). */
export const CHOICES_APART_mg_L = 5;

/** SO2 in mg/L above which one addition is worth a second look at the volume's unit (own threshold). */
export const ADDITION_LARGE_mg_L = 100;

/** Molecular target of a red in mg/L (table 17.1 gives 0.6 to 0.8; the split by colour is common practice). */
export const RED_TARGET_MOLECULAR_mg_L = 0.6;

/** pH above which the red's amount stands beside the white's where the colour is unknown (own threshold). */
export const STYLE_MATTERS_ABOVE_PH = 3.5;

/**
 * Ceilings under which malolactic fermentation is possible: free below 5 to 10, total below 30 to 40 mg/L,
 * published for pH 3.3 to 3.5 (AWRI, Ask the AWRI: MLF; read).
 *
 * @example
 * ```ts
 * MALOLACTIC_CEILINGS.free_ceiling_high_mg_L // => 10
 * ```
 */
export const MALOLACTIC_CEILINGS = {
  free_ceiling_low_mg_L: 5,
  free_ceiling_high_mg_L: 10,
  total_ceiling_low_mg_L: 30,
  total_ceiling_high_mg_L: 40,
  published_ph_low: 3.3,
  published_ph_high: 3.5,
} as const;
