/** The least and the most that a field may be, by the JSON names of the message language. */
export interface Bound {
  readonly min: number;
  readonly max: number;
  /** `true` where `min` itself is refused (a volume of 0). */
  readonly aboveMin?: true;
  readonly unit: string;
}

/**
 * What no cellar has lies outside. The pH is the range in which a dose means anything; the rest keep slips out
 * (own thresholds of this project; no source).
 *
 * @example
 * ```ts
 * BOUNDS.volume_L.max // => 10000000
 * BOUNDS.ph.min // => 2.5
 * ```
 */
export const BOUNDS = {
  volume_L: { min: 0, max: 10_000_000, aboveMin: true, unit: 'L' },
  ph: { min: 2.5, max: 4.8, unit: '' },
  free_mg_L: { min: 0, max: 1000, unit: 'mg/L' },
  total_mg_L: { min: 0, max: 10_000, unit: 'mg/L' },
  temperature_C: { min: -50, max: 150, unit: '°C' },
  alcohol_percent: { min: 0, max: 100, unit: '% vol' },
  sugar_g_L: { min: 0, max: 2000, unit: 'g/L' },
  target_free_mg_L: { min: 0, max: 1000, unit: 'mg/L' },
  target_molecular_mg_L: { min: 0, max: 1000, unit: 'mg/L' },
  target_add_mg_L: { min: 0, max: 1000, unit: 'mg/L' },
  binding_allowance_percent: { min: 0, max: 1000, unit: '%' },
  binding_share: { min: 0, max: 0.8, unit: '' },
  mass_g: { min: 0, max: 100_000_000, unit: 'g' },
  additive_volume_mL: { min: 0, max: 10_000_000_000, unit: 'mL' },
  tablets: { min: 0, max: 1_000_000, unit: '' },
  tablet_SO2_g: { min: 0, max: 1000, aboveMin: true, unit: 'g' },
  tablet_salt_g: { min: 0, max: 1000, aboveMin: true, unit: 'g' },
  rate_mg_L: { min: 0, max: 1_000_000, unit: 'mg/L' },
  added_mg_L: { min: 0, max: 10_000, unit: 'mg/L' },
  oxygen_mg_L: { min: 0, max: 20, unit: 'mg/L' },
  vessels: { min: 1, max: 10_000, unit: '' },
} as const satisfies Readonly<Record<string, Bound>>;

/** The name of a bounded field. */
export type BoundedField = keyof typeof BOUNDS;

/** pH below which, and above which, an answer comes with `ph-unusual` (own threshold, no unit). */
export const PH_USUAL = { min: 2.8, max: 4.2 } as const;

/**
 * Whether a field's value is a finite number inside its bounds.
 *
 * @param field name of the field, which names its unit
 * @param value in that unit
 *
 * @example
 * ```ts
 * isWithinBounds('ph', 3.5) // => true
 * isWithinBounds('volume_L', 0) // => false
 * isWithinBounds('free_mg_L', NaN) // => false
 * ```
 */
export function isWithinBounds(field: BoundedField, value: number): boolean {
  const bound: Bound = BOUNDS[field];
  return (
    Number.isFinite(value) && value <= bound.max && (bound.aboveMin ? value > bound.min : value >= bound.min)
  );
}

/**
 * Refuses a value outside its bounds; an absent one passes.
 *
 * @param action what the caller wanted ("dose"), for the message
 * @param value in the unit that the field's name carries
 * @throws RangeError naming action, value and bound
 *
 * @example
 * ```ts
 * assertWithinBounds('dose', 'ph', 3.5) // => undefined
 * ```
 */
export function assertWithinBounds(action: string, field: BoundedField, value: number | undefined): void {
  if (value === undefined || isWithinBounds(field, value)) return;
  const bound: Bound = BOUNDS[field];
  throw new RangeError(
    `Cannot ${action} as ${field} must be ${bound.aboveMin ? 'above' : 'at least'} ${bound.min} and at most ${bound.max}: current value is ${value}`,
  );
}

/**
 * Refuses NaN, infinities and what lies outside `min` to `max` in a function of plain numbers.
 *
 * @param action what the caller wanted, for the message
 * @param name the argument's name, with its unit
 * @throws RangeError naming action, value and bound
 *
 * @example
 * ```ts
 * assertBetween('convert', 'mass_g', 5, 0, 10) // => undefined
 * ```
 */
export function assertBetween(
  action: string,
  name: string,
  value: number,
  min: number,
  max = Number.MAX_VALUE,
): void {
  if (value >= min && value <= max) return;
  throw new RangeError(
    `Cannot ${action} as ${name} must be a number from ${min} to ${max}: current value is ${value}`,
  );
}
