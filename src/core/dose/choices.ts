import { doseFor } from '../binding/allowance.ts';
import { molecularSO2 } from '../chemistry/molecular-so2.ts';
import type { Target } from '../wine.ts';
import { aimAt } from './aim.ts';
import type { DoseChoice } from './answer.ts';
import { portionOf } from './portion.ts';
import type { DoseRequest } from './request.ts';
import { passesLimit, reachedAfter, type RoomToLimit } from './room-to-limit.ts';
import { CHOICES_APART_mg_L, FREE_NEED_HIGH_mg_L } from './thresholds.ts';

/**
 * The ways out where the need is high and nobody stated the target: leave it, go to 60 mg/L free, the full target.
 * 60 falls away where it is less than 5 mg/L from one of the others. One whose free or predicted total SO2 passes the
 * limit on file carries no amount; where all do, the most that keeps below the limit stands before them, from 5 mg/L on.
 *
 * @param request with pH and free SO2 (mg/L, not negative)
 * @param full the target in full, mg/L
 * @param pK from `dissociation`
 * @param room how far the limit is
 *
 * @example
 * ```ts
 * choicesFor(
 *   { ph: 4.1, free_mg_L: 45, stage: 'finished', stageStated: true, targetStated: false, basis: 'pk-1.81' },
 *   { molecular_mg_L: 0.6 },
 *   1.81,
 *   { found: { notes: [] }, least_total_mg_L: 45, totalKnown: false, kept_mg_L: 15 },
 * ).map((choice) => choice.add_mg_L) // => [0, 15, 72.6]
 * ```
 */
export function choicesFor(
  request: DoseRequest,
  full: Target,
  pK: number,
  room: RoomToLimit,
): readonly DoseChoice[] {
  const { ph, free_mg_L } = request;
  if (ph === undefined || free_mg_L === undefined) return [];
  const choice = (target?: Target, ceiling_mg_L = room.ceiling_mg_L): DoseChoice => {
    const aim = target === undefined ? undefined : aimAt(target, request, pK);
    const add_mg_L = aim?.add_mg_L ?? 0;
    const dose_mg_L = aim?.dose_mg_L ?? 0;
    const over = dose_mg_L > 0 && passesLimit(room, dose_mg_L);
    return {
      ...(target === undefined ? {} : { target }),
      molecular_mg_L: molecularSO2(free_mg_L + add_mg_L, ph, pK),
      free_mg_L: free_mg_L + add_mg_L,
      add_mg_L,
      dose_mg_L,
      ...(over ? { over_limit: true } : portionOf(request, dose_mg_L, ceiling_mg_L)?.shown),
    };
  };
  const [leave, to60, all] = [choice(), choice({ free_mg_L: FREE_NEED_HIGH_mg_L }), choice(full)];
  const isApart = ({ free_mg_L: other }: DoseChoice): boolean =>
    Math.abs(other - FREE_NEED_HIGH_mg_L) >= CHOICES_APART_mg_L;
  const between = free_mg_L < FREE_NEED_HIGH_mg_L && isApart(leave) && isApart(all);
  const ways = between ? [leave, to60, all] : [leave, all];
  const most_mg_L = mostBelowLimit(room);
  const isOver = ways.slice(1).every(({ over_limit }) => over_limit);
  // What is added to allow for binding goes in as well.
  const rise_mg_L = Math.floor((most_mg_L / doseFor(1, request)) * 10) / 10;
  return isOver && most_mg_L >= CHOICES_APART_mg_L
    ? ways.toSpliced(1, 0, choice({ add_mg_L: rise_mg_L }, most_mg_L))
    : ways;
}

/** What may go in with all that is kept below the limits that were read, mg/L; 0 where none was, or the total is unknown. */
function mostBelowLimit(room: RoomToLimit): number {
  const rooms_mg_L = reachedAfter(room, 0)
    .filter(({ limit }) => limit.confidence === 'read')
    .map(({ limit, after_mg_L }) => limit.limit_mg_L - room.kept_mg_L - after_mg_L);
  return room.totalKnown && rooms_mg_L.length > 0 ? Math.max(0, Math.min(...rooms_mg_L)) : 0;
}
