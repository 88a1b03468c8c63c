import type { Addition } from '../../core/cellar/entry.ts';
import type { AddedAnswer } from '../../core/dose/answer.ts';
import type { Reading } from '../reader/understood.ts';
import type { Here } from './here.ts';
import { notedOf } from './to-be-weighed.ts';
import { additiveOf } from './to-requests.ts';
import { vesselsIn } from './vessels-named.ts';
import { whenOf } from './when.ts';

/** An addition as the log keeps it: what was said, what follows from it, what was planned, and the order it carries out. */
export function additionOf(reading: Reading, answer: AddedAnswer, here: Here): Addition {
  const vessels = vesselsIn(reading.fields);
  const additive = additiveOf(reading);
  const volume_L = reading.fields.volume_L ?? reading.assumed.volume_L;
  const { steps: _steps, warnings, limit: _limit, total_after_mg_L: _after, ...amount } = answer;
  const passed = warnings.find(
    ({ code, values }) => code === 'total-over-limit' && values['confidence'] === 'read',
  );
  const over_rule = passed?.values['rule'];
  const plan = vessels.length === 1 ? here.plans.get(vessels[0] ?? '') : undefined;
  const { at } = whenOf(reading, here);
  const ordered = vessels.length === 1 ? (here.vessels.get(vessels[0] ?? '')?.orders ?? []) : [];
  // What went in before it was ordered carries out nothing.
  const orders = ordered.filter((one) => one.at <= at);
  const [order] = orders;
  const isOrdered = order !== undefined && orders.length === 1 && order.additive === additive?.id;
  const { chemical_lot, remark } = reading;
  return {
    kind: 'addition',
    vessels,
    ...(additive && notedOf(additive)),
    ...amount,
    ...(volume_L !== undefined && { volume_L }),
    ...(plan && { planned_mg_L: plan.planned_mg_L }),
    ...(plan?.planned_free_mg_L !== undefined && { planned_free_mg_L: plan.planned_free_mg_L }),
    ...(typeof over_rule === 'string' && { over_rule }),
    ...(isOrdered && { order: order.entry }),
    ...(chemical_lot !== undefined && { chemical_lot }),
    ...(remark !== undefined && { remark }),
  };
}
