import { READ_BEFORE_WITHIN_days } from '../../../core/binding/learned.ts';
import type { Landing } from '../../../core/cellar/vessel.ts';
import { DAY_ms } from '../../../core/time/durations.ts';
import { dayText } from '../../replies/moment-text.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import type { Turn } from '../outcome.ts';
import { tellingOf } from '../telling.ts';
import { line } from './line.ts';

/**
 * Where additions landed: against the plan, and what share of them bound; figures that cannot be are said to be so. Where
 * the reading before is of long before, what was lost meanwhile would be told as bound: no share is told.
 */
export function landedLines(
  vessel: string,
  landing: Landing,
  { manner, here }: Pick<Turn, 'manner' | 'here'>,
): Line[] {
  const { after_mg_L, before_mg_L, added_mg_L, bound_share, planned_free_mg_L } = landing;
  const { mark, unit } = manner;
  const values = {
    vessel: vesselName(vessel),
    after: numberText(after_mg_L, 1, mark),
    before: numberText(before_mg_L, 1, mark),
    added: concentrationText(added_mg_L, mark),
    rise: numberText(after_mg_L - before_mg_L, 1, mark),
    unit,
    percent: numberText(bound_share * 100, 0, mark),
    planned: planned_free_mg_L === undefined ? 'none' : concentrationText(planned_free_mg_L, mark),
  };
  if (bound_share < 0) return [line('first', 'landed-too-high', values)];
  if (landing.added_at - landing.before_at > READ_BEFORE_WITHIN_days * DAY_ms)
    return [line('first', 'landed-loose', { ...values, day: dayText(landing.before_at, tellingOf(here)) })];
  return [line('first', bound_share > 1 ? 'landed-fell' : 'landed', values)];
}
