import { added } from '../../../core/dose/added.ts';
import type { AddedAnswer } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { momentText } from '../../replies/moment-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselNames } from '../../replies/vessel-name.ts';
import { addedRequestOf } from '../added-request-of.ts';
import { additionOf } from '../addition-of.ts';
import { drawnBy, shelvesAfter } from '../drawn.ts';
import { buttonKey } from '../keys.ts';
import { entryRange } from '../lines/entry-range.ts';
import { line } from '../lines/line.ts';
import { besideAmount, notedAmount } from '../lines/noted-amount.ts';
import { underLines } from '../lines/warnings.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { tellingOf } from '../telling.ts';
import { whenOf } from '../when.ts';
import { notedAddition, type AdditionNote } from './noted-addition.ts';

/** So many odd things are told at once. */
const MOST_ODD = 5;

/** The same reading for one of its vessels alone, with its equal share; its volume is what is known where none was said. */
function shareOf(reading: Reading, vessel: string, { here }: Turn): Reading {
  const { vessels = [], volume_L, mass_g, additive_volume_mL, tablets, ...fields } = reading.fields;
  const count = vessels.length;
  const own_L = volume_L === undefined ? here.vessels.get(vessel)?.volume_L?.value : volume_L / count;
  return {
    ...reading,
    fields: {
      ...fields,
      vessel,
      ...(own_L !== undefined && { volume_L: own_L }),
      ...(mass_g !== undefined && { mass_g: mass_g / count }),
      ...(additive_volume_mL !== undefined && { additive_volume_mL: additive_volume_mL / count }),
      ...(tablets !== undefined && { tablets: tablets / count }),
    },
  };
}

/**
 * What went into several vessels is an entry for each, with its equal share: each knows what it got and how near it is to
 * a limit, and one of them can be struck alone. The first line says what that comes to in each.
 */
export function addedEach(
  reading: Reading,
  answer: AddedAnswer,
  below: readonly Line[],
  turn: Turn,
): Outcome {
  const { here, manner, ref } = turn;
  const { vessels = [] } = reading.fields;
  const { at } = whenOf(reading, here);
  const notes: AdditionNote[] = [];
  const odd: Line[] = [];
  let left: readonly Line[] = [];
  let { shelves } = here;
  for (const vessel of vessels) {
    const share = shareOf(reading, vessel, turn);
    const now = { ...here, shelves, nextEntry: here.nextEntry + notes.length };
    const own = added(addedRequestOf(share, here));
    const happening = additionOf(share, own, now);
    const beside = own.warnings.filter(({ values }) => values['rule'] !== happening.over_rule);
    const key = buttonKey('dose', here.message.chat, ref, vessel);
    const outcome = notedAddition({ happening, at, key }, { here: now, manner });
    const [note] = (outcome.notes ?? []) as readonly AdditionNote[];
    if (note === undefined) continue;
    // The next one finds what this one leaves.
    shelves = shelvesAfter(shelves, drawnBy(note, now));
    notes.push(note);
    // What is odd about all of them alike is told once.
    const strange = [...underLines(beside, manner), ...outcome.inRound.slice(1)];
    odd.push(...strange.filter((one) => !odd.some((told) => isSame(told, one))));
    left = outcome.lines.filter(({ key: said }) => said === 'stock-left');
  }
  const [first] = notes;
  const numbers = notes.map((_, place) => here.nextEntry + place);
  const entries = entryRange(numbers);
  const amount = first && notedAmount(first.happening, manner.mark);
  const head: Line = {
    ...line('first', 'round-noted-each', {
      entry: entries,
      vessel: vesselNames(vessels),
      when: momentText(at, tellingOf(here)),
    }),
    list: [...(amount ? [amount] : []), ...(first ? besideAmount(first.happening) : [])],
  };
  return {
    answer,
    notes,
    inRound: [head, ...odd.slice(0, MOST_ODD)],
    lines: [
      head,
      ...odd.slice(0, MOST_ODD),
      ...left,
      line('effect', 'measure-tomorrow'),
      line('effect', 'round-strike-one', { entry: String(numbers[1] ?? here.nextEntry) }),
      ...below,
    ],
    buttons: [{ key: `bu:${ref}`, mark: '1', label: 'button-round-undo', values: { entries } }],
  };
}

function isSame(one: Line, other: Line): boolean {
  return one.key === other.key && JSON.stringify(one.values) === JSON.stringify(other.values);
}
