import type { AsStock, MeasuredAmount, PerVessel } from './answer.ts';
import { measured, measuredEach } from './measured.ts';
import type { DoseRequest } from './request.ts';
import type { Rounded } from './rounding.ts';

/** What to weigh for a request's volume, and for each vessel; `rounded` is for the working. */
export interface Portioned {
  readonly shown: Partial<MeasuredAmount> & {
    readonly measure_gives_mg_L?: number;
    readonly stock?: AsStock;
    readonly per_vessel?: PerVessel;
  };
  readonly rounded: Rounded;
  readonly roundedEach?: Rounded;
}

/**
 * A dose as an amount of the request's additive in the request's volume. Nothing where volume or additive is unknown,
 * or where nothing goes in.
 *
 * @param dose_mg_L SO2 that goes in, mg/L, not negative
 * @param ceiling_mg_L most that may go in, mg/L
 *
 * @example
 * ```ts
 * portionOf({ volume_L: 225, additive: { id: 'potassium-metabisulfite' } }, 27)?.shown.measure // => { value: 10.5, unit: 'g' }
 * portionOf({ volume_L: 225 }, 27) // => undefined
 * ```
 */
export function portionOf(
  request: Pick<DoseRequest, 'volume_L' | 'vessels' | 'additive'>,
  dose_mg_L: number,
  ceiling_mg_L?: number,
): Portioned | undefined {
  const { volume_L, additive, vessels = 1 } = request;
  if (volume_L === undefined || additive === undefined || dose_mg_L === 0) return undefined;
  const portion = {
    additive,
    dose_mg_L,
    volume_L,
    ...(ceiling_mg_L === undefined ? {} : { ceiling_mg_L }),
  };
  const whole = measured(portion);
  if (whole === undefined) return undefined;
  const { amount, rounded, ...rest } = whole;
  if (vessels < 2) return { shown: { ...amount, ...rest }, rounded };
  const each = measuredEach(portion, vessels);
  if (each === undefined) return undefined;
  return { shown: { ...amount, ...rest, per_vessel: each.each }, rounded, roundedEach: each.rounded };
}
