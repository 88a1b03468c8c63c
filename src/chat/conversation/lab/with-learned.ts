import { doseFor } from '../../../core/binding/allowance.ts';
import { FREE_LOW_mg_L } from '../../../core/binding/free-expected.ts';
import { learnedOf } from '../../../core/cellar/learned-of.ts';
import type { DoseAnswer } from '../../../core/dose/answer.ts';
import { amountFor } from '../../../core/additives/amount-for.ts';
import { BOUNDS } from '../../../core/bounds.ts';
import { KEPT_FOR_METHOD_mg_L } from '../../../core/limits/check-limit.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText, massText } from '../../replies/quantity-text.ts';
import { additiveVolumeText } from '../lines/amount-text.ts';
import { learnedLine } from '../lines/learned.ts';
import { line } from '../lines/line.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { toDoseRequest } from '../to-requests.ts';

/**
 * The answer to a dose with what this wine has bound so far, and the amount by that, beside the rule of thumb: it is
 * offered and never taken instead. Nothing where a share or an allowance was said, or the dose is made smaller by a limit;
 * no amount where the additions differ so widely that all may bind, or where so little is free that it may.
 */
export function withLearned(reading: Reading, outcome: Outcome, { here, settings, manner }: Turn): Outcome {
  const { vessel: name, binding_share, binding_allowance_percent } = reading.fields;
  const vessel = name === undefined ? undefined : here.vessels.get(name);
  if (vessel === undefined || vessel.landings.length + (vessel.bound_before?.cases ?? 0) < 2) return outcome;
  const answer = outcome.answer as DoseAnswer | null;
  const isStated = binding_share !== undefined || binding_allowance_percent !== undefined;
  if (answer === null || isStated || !((answer.add_mg_L ?? 0) > 0)) return outcome;
  const learned = learnedOf(vessel);
  if (learned === undefined || learned.share > BOUNDS.binding_share.max || answer.capped || answer.choices)
    return outcome;
  const { mark, unit } = manner;
  const { free_mg_L = FREE_LOW_mg_L } = reading.fields;
  const mayBindWhole = learned.share + learned.spread >= 1 || free_mg_L < FREE_LOW_mg_L;
  const request = toDoseRequest(reading, settings);
  const dose_mg_L = doseFor(answer.add_mg_L ?? 0, { binding_share: learned.share });
  const passes = passesLimit(answer, dose_mg_L, reading.fields.reserve_mg_L);
  const amount =
    passes || request.additive === undefined || request.volume_L === undefined
      ? undefined
      : amountFor((dose_mg_L * request.volume_L) / 1000, request.additive);
  const offered = mayBindWhole
    ? learnedLine(learned, mark)
    : line('effect', 'learned-offer', {
        share: numberText(100 * learned.share, 0, mark),
        spread: numberText(Math.max(1, 100 * learned.spread), 0, mark),
        count: String(learned.cases),
        dose: concentrationText(dose_mg_L, mark),
        unit,
        limit: passes ? 'passes' : 'within',
        amount:
          amount?.mass_g !== undefined
            ? massText(amount.mass_g, mark)
            : amount?.additive_volume_mL !== undefined
              ? additiveVolumeText(amount.additive_volume_mL, mark)
              : 'none',
      });
  const last = outcome.lines.findLastIndex(({ room }) => ['first', 'condition', 'effect'].includes(room)) + 1;
  return {
    ...outcome,
    answer: { ...answer, binding: learned },
    lines: [...outcome.lines.slice(0, last), offered, ...outcome.lines.slice(last)],
  };
}

/** Whether the larger dose would pass the limit that holds, or come nearer to it than any dose does. */
function passesLimit(
  { limit, total_after_mg_L, dose_mg_L = 0 }: DoseAnswer,
  by_mg_L: number,
  reserve_mg_L = 0,
): boolean {
  if (limit === undefined || total_after_mg_L === undefined) return false;
  return total_after_mg_L - dose_mg_L + by_mg_L > limit.limit_mg_L - KEPT_FOR_METHOD_mg_L - reserve_mg_L;
}
