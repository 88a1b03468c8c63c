import type { DoseAnswer } from '../../core/dose/answer.ts';
import { dose } from '../../core/dose/dose.ts';
import type { Reading } from '../reader/understood.ts';
import type { Settings } from './settings.ts';
import { toDoseRequest } from './to-requests.ts';

/**
 * The answer to a reading's question for a dose; reckoned again it always comes out alike. Where the dose that passes a
 * rule was asked for all the same, with the rule named, it is the full one and no smaller one stands beside it.
 */
export function doseOf(
  reading: Reading,
  settings: Pick<Settings, 'basis' | 'region' | 'targets'>,
): DoseAnswer {
  const answer = dose(toDoseRequest(reading, settings));
  const { capped, ...full } = answer;
  return capped !== undefined && capped.rule === reading.over_rule ? full : answer;
}
