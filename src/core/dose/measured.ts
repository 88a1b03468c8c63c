import { amountFor } from '../additives/amount-for.ts';
import type { AdditiveAtHand } from '../additives/additive-id.ts';
import { ADDITIVES } from '../additives/additives.ts';
import type { AdditiveAmount } from '../additives/so2-in.ts';
import type { AsStock, Measure, PerVessel } from './answer.ts';
import { measureOf, type Instrument, type Rounded, type RoundingLimits } from './rounding.ts';
import { RISE_NEGLIGIBLE_mg_L } from './thresholds.ts';

/** Strength of the stock that small amounts are also given in, grams of powder in 100 mL (common practice). */
export const STOCK_PERCENT = 10;

/** Grams of powder under which a stock is easier to measure (own threshold). */
export const STOCK_BELOW_g = 5;

/** How much goes into how much wine, and how far it may be rounded. */
export interface Portion {
  readonly additive: AdditiveAtHand;
  readonly dose_mg_L: number;
  readonly volume_L: number;
  readonly ceiling_mg_L?: number;
}

/** A portion measured: the amount, what the instrument shows, the stock. `rounded` is for the working. */
export interface Measured {
  readonly amount: AdditiveAmount & { readonly SO2_g: number };
  readonly measure?: Measure;
  readonly rounding_mg_L?: number;
  readonly measure_gives_mg_L?: number;
  readonly stock?: AsStock;
  readonly rounded: Rounded;
}

const instrumentFor = (amount: AdditiveAmount): readonly [number, Instrument] => {
  if (amount.tablets !== undefined) return [amount.tablets, 'tablets'];
  if (amount.mass_g !== undefined) return [amount.mass_g, 'scale'];
  return [amount.additive_volume_mL ?? 0, 'cylinder'];
};

const STOCK_OF = {
  'potassium-metabisulfite': 'potassium-metabisulfite-solution',
  'sodium-metabisulfite': 'sodium-metabisulfite-solution',
  tablet: 'potassium-metabisulfite-solution',
} as const;

function stockFor(additive: AdditiveAtHand, SO2_g: number, limits: RoundingLimits): AsStock | undefined {
  const { id } = additive;
  if (id !== 'potassium-metabisulfite' && id !== 'sodium-metabisulfite' && id !== 'tablet') return undefined;
  // The stock is made of the same powder, so its strength counts in grams of that powder.
  const powder: AdditiveAtHand =
    id === 'tablet'
      ? { id: 'potassium-metabisulfite' }
      : {
          id,
          ...(additive.strength_percent === undefined ? {} : { strength_percent: additive.strength_percent }),
        };
  const mass_g = amountFor(SO2_g, powder)?.mass_g;
  if (mass_g === undefined) return undefined;
  const additive_volume_mL = (mass_g / STOCK_PERCENT) * 100;
  const { measure } = measureOf(additive_volume_mL, 'cylinder', limits);
  return { additive: STOCK_OF[id], strength_percent: STOCK_PERCENT, additive_volume_mL, measure };
}

/**
 * A dose for a volume as an amount of the additive, and as the instrument shows it. Under 5 g of powder the same
 * as a 10 % stock; tablets down to the half with the rest as stock where it is 0.5 mg/L or more, and no `measure` below half a tablet.
 *
 * @param portion dose in mg/L SO2, volume in L
 * @returns `undefined` when the additive's strength or size is missing
 *
 * @example
 * ```ts
 * measured({ additive: { id: 'potassium-metabisulfite' }, dose_mg_L: 26.9075, volume_L: 5488.847 })?.measure // => { value: 256, unit: 'g' }
 * ```
 */
export function measured(portion: Portion): Measured | undefined {
  const { additive, dose_mg_L, volume_L, ceiling_mg_L } = portion;
  const SO2_g = (dose_mg_L * volume_L) / 1000;
  const amount = amountFor(SO2_g, additive);
  if (amount === undefined) return undefined;
  const [size, instrument] = instrumentFor(amount);
  const limits = { dose_mg_L, ...(ceiling_mg_L === undefined ? {} : { ceiling_mg_L }) };
  const rounded = measureOf(size, instrument, limits);
  const whole = { amount: { SO2_g, ...amount }, rounded };
  const { measure, rounding_mg_L } = rounded;
  if (instrument !== 'tablets') {
    const small = ADDITIVES[additive.id].kind === 'powder' && size < STOCK_BELOW_g;
    const stock = small ? stockFor(additive, SO2_g, limits) : undefined;
    return { ...whole, measure, rounding_mg_L, ...(stock === undefined ? {} : { stock }) };
  }
  const rest_g = SO2_g * (1 - measure.value / size);
  const rest_mg_L = dose_mg_L * (1 - measure.value / size);
  const left = ceiling_mg_L === undefined ? {} : { ceiling_mg_L: ceiling_mg_L - (dose_mg_L - rest_mg_L) };
  const stock =
    rest_mg_L < RISE_NEGLIGIBLE_mg_L
      ? undefined
      : stockFor(additive, rest_g, { dose_mg_L: rest_mg_L, ...left });
  const rest = stock === undefined ? {} : { stock };
  if (measure.value === 0) return { ...whole, ...rest };
  return { ...whole, measure, rounding_mg_L, measure_gives_mg_L: dose_mg_L + rounding_mg_L, ...rest };
}

/**
 * The same for each of several equal vessels.
 *
 * @param portion of all vessels together: mg/L and L, not negative
 * @param count how many, 2 or more
 *
 * @example
 * ```ts
 * measuredEach({ additive: { id: 'potassium-metabisulfite' }, dose_mg_L: 27, volume_L: 450 }, 2)?.each.count // => 2
 * ```
 */
export function measuredEach(
  portion: Portion,
  count: number,
): { readonly each: PerVessel; readonly rounded: Rounded } | undefined {
  const one = measured({ ...portion, volume_L: portion.volume_L / count });
  if (one === undefined) return undefined;
  const { amount, rounded, ...shown } = one;
  return { each: { count, ...amount, ...shown }, rounded };
}
