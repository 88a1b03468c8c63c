import { aimAt } from './aim.ts';
import type { Measure, Warning } from './answer.ts';
import { portionOf } from './portion.ts';
import type { DoseRequest } from './request.ts';
import { decidingLimit, passesLimit, type RoomToLimit } from './room-to-limit.ts';
import { RED_TARGET_MOLECULAR_mg_L, STYLE_MATTERS_ABOVE_PH } from './thresholds.ts';

const measureValues = (measure: Measure | undefined, prefix = ''): Record<string, number | string> =>
  measure === undefined
    ? {}
    : { [`${prefix}measure_value`]: measure.value, [`${prefix}measure_unit`]: measure.unit };

/** What the cellar aims at in a red, or what is usual; mg/L molecular. */
const redTargetOf = ({ red_target_mg_L = RED_TARGET_MOLECULAR_mg_L }: DoseRequest): number => red_target_mg_L;

const isColourOpen = (request: DoseRequest): boolean => {
  const { style, category, product, targetStated, target, ph } = request;
  return (
    style === undefined &&
    category === undefined &&
    product === undefined &&
    !targetStated &&
    target !== undefined &&
    'molecular_mg_L' in target &&
    target.molecular_mg_L > redTargetOf(request) &&
    ph !== undefined &&
    ph > STYLE_MATTERS_ABOVE_PH
  );
};

/**
 * Above pH 3.5 a colour that nobody named makes a difference: what the same wine needs as a red (0.6 mg/L molecular).
 * The values are figures for a line of the reply, in full precision; `measure_…` what the instrument shows.
 *
 * @param pK from `dissociation`
 * @param room how far the limit is
 *
 * @example
 * ```ts
 * redAmountWarnings(
 *   { ph: 3.4, stage: 'finished', stageStated: true, target: { molecular_mg_L: 0.8 }, targetStated: false, basis: 'pk-1.81' },
 *   1.81,
 *   { found: { notes: [] }, least_total_mg_L: 0, totalKnown: false, kept_mg_L: 15 },
 * ) // => []
 * ```
 */
export function redAmountWarnings(request: DoseRequest, pK: number, room: RoomToLimit): readonly Warning[] {
  if (!isColourOpen(request)) return [];
  const aim = aimAt({ molecular_mg_L: redTargetOf(request) }, request, pK);
  const values: Record<string, number | string> = { style: 'red', ...aim };
  const dose_mg_L = aim.dose_mg_L ?? 0;
  if (dose_mg_L > 0 && passesLimit(room, dose_mg_L)) {
    Object.assign(values, { over_limit: 'yes', limit_mg_L: decidingLimit(room, dose_mg_L)?.limit_mg_L });
  }
  if (dose_mg_L > 0) {
    const shown = portionOf(request, dose_mg_L, room.ceiling_mg_L)?.shown;
    const { SO2_g, mass_g, additive_volume_mL, tablets, measure, stock, per_vessel } = shown ?? {};
    for (const [key, value] of Object.entries({ SO2_g, mass_g, additive_volume_mL, tablets })) {
      if (value !== undefined) values[key] = value;
    }
    Object.assign(
      values,
      measureValues(measure),
      measureValues(stock?.measure, 'stock_'),
      measureValues(per_vessel?.measure, 'each_'),
    );
  }
  return [{ code: 'style-unknown', values }];
}
