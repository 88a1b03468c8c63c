import type { Order } from '../../../core/cellar/entry.ts';
import { vesselNames } from '../../replies/vessel-name.ts';
import { entryButtons } from '../buttons.ts';
import { numberOf } from '../lines/amount-text.ts';
import { line } from '../lines/line.ts';
import { notedAmount } from '../lines/noted-amount.ts';
import type { Note } from '../note.ts';
import type { Outcome, Turn } from '../outcome.ts';

/** An order is noted: it stays open until somebody confirms what really went in. */
export function notedOrder(
  note: Note & { readonly happening: Order },
  { here, manner }: Pick<Turn, 'here' | 'manner'>,
): Outcome {
  const { happening } = note;
  const amount = notedAmount(happening, manner.mark);
  const values = {
    entry: String(here.nextEntry),
    vessel: vesselNames(happening.vessels),
    number: numberOf(amount),
  };
  const first = { ...line('first', 'ordered', values), list: amount ? [amount] : [] };
  return {
    answer: null,
    notes: [note],
    inRound: [first],
    lines: [first, line('effect', 'ordered-open')],
    buttons: entryButtons(here.nextEntry, ['d', 'u']),
  };
}
