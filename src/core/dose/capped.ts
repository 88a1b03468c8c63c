import { SO2ContentOf } from '../additives/so2-content.ts';
import { pKOf, type Dissociation } from '../chemistry/dissociation.ts';
import type { Limit } from '../limits/limit.ts';
import { shown } from '../units/shown.ts';
import { minus, type Step } from '../working.ts';
import type { CappedDose } from './answer.ts';
import { doseSteps } from './dose-steps.ts';
import { landing } from './landing.ts';
import { line } from './line.ts';
import { portionOf } from './portion.ts';
import type { DoseRequest } from './request.ts';
import { beforeOf, limitsIn, passesLimit, type RoomToLimit } from './room-to-limit.ts';
import { KEPT_FOR_METHOD_mg_L } from '../limits/check-limit.ts';

/** The full dose that is to be capped: what goes in, and the rise that is wanted of it, mg/L. */
export interface FullDose {
  readonly dose_mg_L: number;
  readonly add_mg_L: number;
}

/**
 * The smaller dose in place of one that passes a limit that was read, or that leaves no room for what is planned at
 * bottling: it stays 15 mg/L and the planned addition under the limit, and is rounded down. It is 0 where the wine has
 * no such room, and where the total is unknown and would pass even at its least. `undefined` where the dose may go in.
 *
 * @param request volume, additive and readings, mg/L
 * @param full the dose in full, mg/L
 * @param room how far the limits are
 * @param pK from `dissociation`
 *
 * Source: the rows of `limits`; the 15 mg/L: own threshold.
 *
 * @example
 * ```ts
 * capped(
 *   { free_mg_L: 10, total_mg_L: 130, stage: 'finished', stageStated: true, targetStated: true, basis: 'pk-1.81' },
 *   { dose_mg_L: 30, add_mg_L: 30 },
 *   { found: { total: { rule: 'oiv-red-dry', region: 'oiv', of: 'total', operator: '<=', limit_mg_L: 150, confidence: 'read', as_written: { value: 150, unit: 'mg/L' } }, notes: [] }, least_total_mg_L: 130, totalKnown: true, kept_mg_L: 15 },
 *   1.81,
 * )?.dose_mg_L // => 5
 * ```
 */
export function capped(
  request: DoseRequest,
  full: FullDose,
  room: RoomToLimit,
  pK: number,
): CappedDose | undefined {
  const reserve_mg_L = room.kept_mg_L - KEPT_FOR_METHOD_mg_L;
  if (full.dose_mg_L === 0 || !passesLimit(room, full.dose_mg_L + reserve_mg_L)) return undefined;
  const limit = tightest(room);
  if (limit === undefined) return undefined;
  const kept = { rule: limit.rule, kept_mg_L: room.kept_mg_L };
  const isUnknowable = limit.of === 'total' && !room.totalKnown;
  const dose_mg_L = isUnknowable ? 0 : Math.max(0, roomUnder(limit, room));
  if (dose_mg_L === 0) return { dose_mg_L, ...kept, steps: [] };
  const add_mg_L = dose_mg_L * (full.add_mg_L / full.dose_mg_L);
  const portioned = portionOf(request, dose_mg_L, dose_mg_L);
  return {
    dose_mg_L,
    ...kept,
    ...portioned?.shown,
    ...landing(request, add_mg_L, dose_mg_L, pK),
    steps: [roomStep(limit, room), ...stepsOf(request, dose_mg_L, portioned)],
  };
}

/** Digits of the room: all that hundredths have. */
const ROOM_DIGITS = 9;

/** A hundredth of a mg/L, that way which makes the room smaller: so the working is short and never too kind. */
const downToHundredth = (mg_L: number): number => Math.floor(mg_L * 100 + 1e-6) / 100;
const upToHundredth = (mg_L: number): number => Math.ceil(mg_L * 100 - 1e-6) / 100;

/** What a limit leaves, to the hundredth: the limit and the SO2 that counts for it, mg/L. */
function sidesOf(
  limit: Limit,
  room: RoomToLimit,
): { readonly limit_mg_L: number; readonly before_mg_L: number } {
  return {
    limit_mg_L: downToHundredth(limit.limit_mg_L),
    before_mg_L: upToHundredth(beforeOf(limit, room) ?? 0),
  };
}

/** What may go in under a limit, with what is kept below it, mg/L. */
function roomUnder(limit: Limit, room: RoomToLimit): number {
  const { limit_mg_L, before_mg_L } = sidesOf(limit, room);
  return Number((limit_mg_L - upToHundredth(room.kept_mg_L) - before_mg_L).toFixed(2));
}

/** Of the limits that were read, the one that leaves the least room. */
function tightest(room: RoomToLimit): Limit | undefined {
  return limitsIn(room)
    .filter(({ confidence }) => confidence === 'read')
    .toSorted((a, b) => roomUnder(a, room) - roomUnder(b, room))[0];
}

function roomStep(limit: Limit, room: RoomToLimit): Step {
  const { limit_mg_L, before_mg_L } = sidesOf(limit, room);
  const left = minus(shown(limit_mg_L, 'mg/L'), shown(upToHundredth(room.kept_mg_L), 'mg/L'));
  return line('room-to-limit', minus(left, shown(before_mg_L, 'mg/L')), 'mg/L', ROOM_DIGITS).step;
}

/** From the room to the amount; no share and no allowance, as the room is what goes in. */
function stepsOf(
  request: DoseRequest,
  dose_mg_L: number,
  portioned: ReturnType<typeof portionOf>,
): readonly Step[] {
  if (request.additive === undefined || portioned === undefined) return [];
  const { volume_L, volume_display, vessels, additive } = request;
  const content = SO2ContentOf(additive);
  const dissociation: Dissociation = pKOf('pk-1.81');
  return doseSteps({
    request: {
      target: { add_mg_L: dose_mg_L },
      targetStated: true,
      additive,
      ...(volume_L === undefined ? {} : { volume_L }),
      ...(volume_display === undefined ? {} : { volume_display }),
      ...(vessels === undefined ? {} : { vessels }),
      stage: 'finished',
      stageStated: false,
      basis: 'pk-1.81',
    },
    dissociation,
    aim: { add_mg_L: dose_mg_L, dose_mg_L },
    ...(content === undefined ? {} : { content }),
    rounded: portioned.rounded,
    ...(portioned.roundedEach === undefined ? {} : { roundedEach: portioned.roundedEach }),
  });
}
