import { labelWarnings } from './label-warnings.ts';
import type { Warning } from './answer.ts';
import { beforeOf, limitsIn, reachedAfter, type LimitReached, type RoomToLimit } from './room-to-limit.ts';

/** What is known beside the room: free SO2 after (mg/L), and where the total is from. */
export interface LimitWarningFacts {
  readonly free_after_mg_L?: number;
  readonly total_from?: 'measured' | 'running-sum';
}

/**
 * How an addition stands to the limits: over, near, unconfirmed, none on file; and that the total is unknown, with the
 * most that it may be today. The values name the rule.
 *
 * @param room how far the limits are, mg/L
 * @param dose_mg_L SO2 that goes in, mg/L, not negative
 *
 * @example
 * ```ts
 * limitWarnings({ found: { none: { region: 'oiv', product: 'mead', reason: 'not-on-file' }, notes: [] }, least_total_mg_L: 0, totalKnown: true, kept_mg_L: 15 }, 20) // => [{ code: 'no-limit-on-file', values: { none_for: 'mead', region: 'oiv', reason: 'not-on-file' } }]
 * ```
 */
export function limitWarnings(
  room: RoomToLimit,
  dose_mg_L: number,
  facts: LimitWarningFacts = {},
): readonly Warning[] {
  const { none, total } = room.found;
  const warnings: Warning[] = reachedAfter(room, dose_mg_L).flatMap((one) =>
    standingWarnings(one, room, facts),
  );
  // A limit is of the finished wine: that there is none of must is no gap of the file.
  if (none !== undefined && none.product !== 'must')
    warnings.push({
      code: 'no-limit-on-file',
      values: { none_for: none.product, region: none.region, reason: none.reason },
    });
  for (const { confidence, rule, region, of, limit_mg_L } of limitsIn(room))
    if (confidence === 'unconfirmed')
      warnings.push({ code: 'limit-unconfirmed', values: { rule, region, of, limit_mg_L } });
  if (!room.totalKnown) warnings.push(unknownTotal(room, dose_mg_L, facts));
  else if (dose_mg_L > 0) warnings.push(...labelWarnings(total?.region, room.least_total_mg_L + dose_mg_L));
  return warnings;
}

function standingWarnings(
  { limit, after_mg_L, standing }: LimitReached,
  room: RoomToLimit,
  { total_from }: LimitWarningFacts,
): readonly Warning[] {
  const { rule, region, limit_mg_L, operator, confidence } = limit;
  // What may go in now, with what is kept below the limit.
  const room_mg_L = Math.max(0, limit_mg_L - room.kept_mg_L - (beforeOf(limit, room) ?? 0));
  const shared = { rule, region, limit_mg_L, operator, confidence, room_mg_L };
  if (standing === 'within') return [];
  if (limit.of === 'free')
    return standing === 'over'
      ? [{ code: 'free-over-limit', values: { ...shared, free_after_mg_L: after_mg_L } }]
      : [];
  return [
    {
      code: standing === 'over' ? 'total-over-limit' : 'total-near-limit',
      values: {
        ...shared,
        total_after_mg_L: after_mg_L,
        total: room.totalKnown ? 'known' : 'at-least',
        ...(total_from === undefined ? {} : { total_from }),
      },
    },
  ];
}

function unknownTotal(room: RoomToLimit, dose_mg_L: number, facts: LimitWarningFacts): Warning {
  const { total } = room.found;
  return {
    code: 'total-unknown',
    values: {
      ...(facts.free_after_mg_L === undefined ? {} : { free_after_mg_L: facts.free_after_mg_L }),
      ...(total === undefined
        ? {}
        : {
            rule: total.rule,
            limit_mg_L: total.limit_mg_L,
            room_mg_L: Math.max(0, total.limit_mg_L - room.kept_mg_L - (beforeOf(total, room) ?? 0)),
            most_total_mg_L: Math.max(0, total.limit_mg_L - dose_mg_L),
          }),
    },
  };
}
