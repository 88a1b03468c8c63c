import type { Order } from '../../../../core/cellar/entry.ts';
import { added } from '../../../../core/dose/added.ts';
import type { Reading } from '../../../reader/understood.ts';
import { assumedLines } from '../../lines/assumed.ts';
import { line } from '../../lines/line.ts';
import type { Outcome, Turn } from '../../outcome.ts';
import { prepare } from '../../prepare.ts';
import { notedOf } from '../../to-be-weighed.ts';
import { underLines } from '../../lines/warnings.ts';
import { addedRequestOf } from '../../added-request-of.ts';
import { additiveOf } from '../../to-requests.ts';
import { vesselsIn } from '../../vessels-named.ts';
import { finishReading } from '../../../reader/finish-reading.ts';
import { notedOrder } from '../noted-order.ts';
import { asking } from '../asking.ts';

/** An order: so much of an additive for a vessel, open until a hand confirms what went in. */
export function answerOrder(reading: Reading, turn: Turn): Outcome {
  const { here } = turn;
  const { assumed: _assumed, asks: _asks, command: _command, ...draft } = reading;
  const whole = prepare(finishReading({ ...draft, intent: 'added' }, here.settings), here);
  if (whole.asks.length > 0) {
    const { question } = asking(whole, turn, 'first');
    const first = question[0] ?? line('first', 'order-how');
    return { answer: null, inRound: [first], lines: [first, line('effect', 'order-how')], buttons: [] };
  }
  const additive = additiveOf(whole);
  const { steps: _steps, warnings, limit: _limit, total_after_mg_L: _after, ...amount } = added(addedRequestOf(whole, here)); // prettier-ignore
  const volume_L = whole.fields.volume_L;
  const happening: Order = {
    kind: 'order',
    vessels: vesselsIn(whole.fields),
    ...(additive && notedOf(additive)),
    ...amount,
    ...(volume_L !== undefined && { volume_L }),
    ...(reading.chemical_lot !== undefined && { chemical_lot: reading.chemical_lot }),
    ...(reading.remark !== undefined && { remark: reading.remark }),
  };
  const noted = notedOrder({ happening, at: here.message.at }, turn);
  return {
    ...noted,
    lines: [
      ...noted.lines.slice(0, 1),
      ...underLines(warnings, turn.manner),
      ...noted.lines.slice(1),
      ...assumedLines(whole, turn.manner),
    ],
  };
}
