import type { DueVessel } from '../../../core/cellar/due-vessels.ts';
import { dayText, momentText } from '../../replies/moment-text.ts';
import { numberText } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import type { Here } from '../here.ts';
import { tellingOf } from '../telling.ts';
import { line } from './line.ts';

/** One vessel that is to be measured: why, since when, and what it had last. */
export function dueLine(
  { vessel, check, overdue_days }: DueVessel,
  here: Pick<Here, 'settings' | 'message' | 'memory'>,
): Line {
  const telling = tellingOf(here);
  const { free_mg_L } = vessel;
  const last = vessel.additions.at(-1);
  return line('first', `due-${check.why}`, {
    vessel: vesselName(vessel.vessel),
    free: free_mg_L === undefined ? 'none' : numberText(free_mg_L.value, 1, here.memory.decimalMark ?? '.'),
    day: free_mg_L === undefined ? '' : dayText(free_mg_L.at, telling),
    added: last === undefined ? '' : momentText(last.at, telling),
    days: String(overdue_days),
    overdue: overdue_days === 0 ? 'no' : 'yes',
    low: check.is_low ? 'low' : 'none',
    stage: check.urges_dose ? 'none' : (vessel.traits.stage?.value ?? 'none'),
  });
}
