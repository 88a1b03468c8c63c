/**
 * mg of SO2 that 1 mg of oxygen takes up in theory (2 SO2 for one O2; computed from the molar masses).
 *
 * @example
 * ```ts
 * SO2_PER_OXYGEN // => 4.004
 * ```
 */
export const SO2_PER_OXYGEN = (2 * 64.058) / 31.998;

/**
 * Oxygen in a wine saturated with air, mg/L, and the SO2 in mg/L that it could use up: as an amateur article prints them (read).
 *
 * @example
 * ```ts
 * SATURATED_WINE.SO2_mg_L // => [20, 32]
 * ```
 */
export const SATURATED_WINE = { oxygen_mg_L: [5, 8], SO2_mg_L: [20, 32] } as const;
