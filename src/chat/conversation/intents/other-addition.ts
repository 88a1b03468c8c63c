import type { OtherAddition, VesselChange } from '../../../core/cellar/entry.ts';
import type { Reading } from '../../reader/understood.ts';
import { momentText } from '../../replies/moment-text.ts';
import { vesselNames } from '../../replies/vessel-name.ts';
import { entryButtons } from '../buttons.ts';
import { line } from '../lines/line.ts';
import { noteText } from '../lines/notes.ts';
import { shortened } from '../lines/problems.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { tellingOf } from '../telling.ts';
import { vesselsIn } from '../vessels-named.ts';
import { whenOf } from '../when.ts';

/**
 * Anything else that went in is noted as it was written, and nothing is computed from it. Undefined where the word may be
 * a slip for an additive that is known, and where no amount is told.
 */
export function answerOtherAddition(reading: Reading, { here }: Turn): Outcome | undefined {
  const { intent, problems, fields, where, remark } = reading;
  const [problem, another] = problems;
  const vessels = vesselsIn(fields);
  const amount = where.mass_g ?? where.additive_volume_mL;
  if (intent !== 'added' || problem?.code !== 'unknown-additive' || another || vessels.length === 0)
    return undefined;
  const when = whenOf(reading, here);
  const isSlip = noteText(reading, 'did-you-mean') !== undefined;
  if (isSlip || amount === undefined || when.is === 'future' || when.is === 'no-such-day') return undefined;
  const text = shortened(`${amount.text} ${problem.about}`);
  const { mass_g, additive_volume_mL } = fields;
  const happening: OtherAddition = {
    kind: 'other',
    vessels,
    remark: remark === undefined ? text : `${text} (${remark})`,
    ...(mass_g !== undefined && { mass_g }),
    ...(additive_volume_mL !== undefined && { additive_volume_mL }),
  };
  const values = {
    entry: String(here.nextEntry),
    vessel: vesselNames(vessels),
    text,
    when: momentText(when.at, tellingOf(here)),
  };
  const isAcid = reading.marks.acid === true;
  const first = line('first', 'noted-something-else', { ...values, voids: isAcid ? 'ph' : 'none' });
  const acid: VesselChange = { kind: 'vessel', event: 'acid', vessels };
  return {
    answer: null,
    // An acid, or what takes some away, leaves another pH.
    notes: [{ happening, at: when.at }, ...(isAcid ? [{ happening: acid, at: when.at }] : [])],
    inRound: [first],
    lines: [first],
    buttons: entryButtons(here.nextEntry, ['u']),
  };
}
