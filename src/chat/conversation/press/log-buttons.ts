import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { Addition, Order } from '../../../core/cellar/entry.ts';
import { added } from '../../../core/dose/added.ts';
import { emptyReading } from '../../reader/empty-reading.ts';
import type { Reading } from '../../reader/understood.ts';
import { momentText } from '../../replies/moment-text.ts';
import { vesselNames } from '../../replies/vessel-name.ts';
import { additionOf } from '../addition-of.ts';
import { doseOf } from '../dose-of.ts';
import type { Here } from '../here.ts';
import { notedAddition, type AdditionNote } from '../intents/noted-addition.ts';
import { notedOrder } from '../intents/noted-order.ts';
import { buttonKey, claimKey } from '../keys.ts';
import { line } from '../lines/line.ts';
import { mannerOf } from '../manner.ts';
import type { Remembered } from '../memory.ts';
import { noting } from '../note.ts';
import { alreadyNoted } from './already-noted.ts';
import { noteEach } from './note-tapped.ts';
import { notedBy } from './noted-by.ts';
import type { Outcome } from '../outcome.ts';
import { nameText } from '../people.ts';
import { CLAIM_ms, type Claim } from '../plan.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { tellingOf } from '../telling.ts';
import { toBeWeighed } from '../to-be-weighed.ts';
import { vesselsIn } from '../vessels-named.ts';
import { whenOf } from '../when.ts';
import { addedRequestOf } from '../added-request-of.ts';
import { withShelves } from '../with-shelves.ts';

/** "I added it" under a dose: one entry for each vessel, however often and by however many it is pressed. */
export async function noteDose(found: Remembered, here: Here, view: CellarView): Promise<Handled> {
  if (vesselsIn(found.reading.fields).length > 1) return noteEach(found, here, view);
  const addition = doseAsAddition(found, here);
  if (addition === undefined) return replying(here, { lines: [line('first', 'old-button')] });
  return noteOnce(
    { happening: addition, at: here.message.at },
    buttonKey('dose', found.chat, found.ref),
    here,
    view,
  );
}

/** "Note it" under an addition whose amount was worked out. */
export async function noteWorkedOut(found: Remembered, here: Here, view: CellarView): Promise<Handled> {
  const { reading } = found;
  const happening = additionOf(reading, added(addedRequestOf(reading, here)), here);
  const { at } = whenOf(reading, here);
  return noteOnce({ happening, at }, buttonKey('note', found.chat, found.ref), here, view);
}

/** Notes what a button stands for, unless it was noted and still holds. */
export async function noteOnce(
  note: AdditionNote,
  key: string,
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const { standing, next } = await notedBy(key, view);
  if (standing) return alreadyNoted(standing, here);
  const keyed = { ...note, key: next };
  const manner = mannerOf(NO_READING, here.memory.decimalMark ?? '.', here);
  const near = await withShelves(here, view);
  return noted(notedAddition(keyed, { here: near, manner }), here);
}

const NO_READING: Reading = emptyReading('added');

function noted({ lines, buttons, notes = [], keeps = [] }: Outcome, here: Here): Handled {
  const { writes, ...said } = replying(here, { lines, buttons });
  return { ...said, writes: [...noting(here, notes), ...keeps, ...writes] };
}

/** The dose of a reading as an addition; reckoned again, which always comes out alike. */
function doseAsAddition({ reading }: Remembered, here: Here): Addition | undefined {
  const vessels = vesselsIn(reading.fields);
  if (vessels.length === 0 || reading.intent !== 'dose') return undefined;
  const weighed = toBeWeighed(reading, doseOf(reading, here.settings));
  if (weighed === undefined) return undefined;
  const [order] = vessels.length === 1 ? (here.vessels.get(vessels[0] ?? '')?.orders ?? []) : [];
  return {
    kind: 'addition',
    vessels,
    ...weighed,
    ...(reading.over_rule !== undefined && { over_rule: reading.over_rule }),
    ...(order && order.additive === weighed.additive && { order: order.entry }),
  };
}

/** "I do this one": others who ask for the vessel see by whom and since when, for four hours. */
export function claimDose({ reading }: Remembered, here: Here): Handled {
  const vessels = vesselsIn(reading.fields);
  const telling = tellingOf(here);
  const { at } = here.message;
  const taken = vessels.flatMap((vessel) => here.claims.get(vessel) ?? []).find(({ by }) => by !== here.me);
  const vessel = vesselNames(vessels);
  if (taken) {
    const values = { vessel, who: nameText(taken.by, here), when: momentText(taken.at, telling) };
    return replying(here, { lines: [line('first', 'claim-taken', values)] });
  }
  const claim: Claim = { by: here.me, at };
  const until = at + CLAIM_ms;
  const { writes, ...said } = replying(here, {
    lines: [line('first', 'claimed', { vessel, until: momentText(until, telling) })],
    keepsButtons: true,
  });
  const keeps = vessels.map(
    (name) => ({ kind: 'keep', key: claimKey(name), text: JSON.stringify(claim), until }) as const,
  );
  return { ...said, writes: [...keeps, ...writes] };
}

/** "Order it" under a dose: it stays open until a hand confirms what really went in. */
export async function orderDose(found: Remembered, here: Here, view: CellarView): Promise<Handled> {
  const addition = doseAsAddition(found, here);
  if (addition === undefined) return replying(here, { lines: [line('first', 'old-button')] });
  const key = buttonKey('order', found.chat, found.ref);
  const { standing, next } = await notedBy(key, view);
  if (standing) return alreadyNoted(standing, here);
  const {
    kind: _kind,
    planned_mg_L: _mg,
    planned_free_mg_L: _free,
    order: _order,
    over_rule: _rule,
    ...amount
  } = addition;
  const order: Order = { kind: 'order', ...amount };
  const manner = mannerOf(NO_READING, here.memory.decimalMark ?? '.', here);
  return noted(notedOrder({ happening: order, at: here.message.at, key: next }, { here, manner }), here);
}
