import type { Addition } from '../../../core/cellar/entry.ts';
import { DAY_ms } from '../../../core/time/durations.ts';
import { momentText } from '../../replies/moment-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselNames } from '../../replies/vessel-name.ts';
import { entryButtons } from '../buttons.ts';
import { withOnlyLot } from '../drawn.ts';
import { claimKey, ZONE_ASKED_KEY } from '../keys.ts';
import { line } from '../lines/line.ts';
import { besideAmount, notedAmount } from '../lines/noted-amount.ts';
import { ruleValues } from '../lines/rule.ts';
import { oddLines } from '../lines/odd.ts';
import { drawnLines } from '../lines/stock.ts';
import { numberOf } from '../lines/amount-text.ts';
import { perLitre } from '../manner.ts';
import type { Note } from '../note.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { tellingOf } from '../telling.ts';

/** An addition with its time, and the key of the button that noted it. */
export interface AdditionNote extends Note {
  readonly happening: Addition;
}

/** An addition is noted: what is said to it, with undo beside it, and when to measure. */
export function notedAddition(told: AdditionNote, turn: Pick<Turn, 'here' | 'manner'>): Outcome {
  const { here } = turn;
  const note = { ...told, happening: withOnlyLot(told, here) };
  const stock = drawnLines(note, here);
  const first = notedLine(note, turn);
  const odd = [...overLines(note, turn), ...oddLines(note, turn)];
  const isZoneAsked = here.settings.zone === undefined && !here.isZoneAsked;
  return {
    answer: null,
    notes: [note],
    // Who has done it is no longer about to do it.
    keeps: [
      ...note.happening.vessels.map((vessel) => ({ kind: 'drop', key: claimKey(vessel) }) as const),
      ...(isZoneAsked ? [{ kind: 'keep', key: ZONE_ASKED_KEY, text: 'true' } as const] : []),
    ],
    inRound: [first, ...odd, ...stock.odd],
    lines: [
      first,
      ...odd,
      ...stock.odd,
      ...stock.left,
      nextLine(note, turn),
      ...(isZoneAsked ? [line('question', 'ask-zone')] : []),
    ],
    buttons: entryButtons(here.nextEntry, ['u', 'r']),
  };
}

/** That it passes a limit: the entry keeps it. */
function overLines({ happening }: AdditionNote, { manner }: Pick<Turn, 'manner'>): Line[] {
  const { over_rule } = happening;
  return over_rule === undefined
    ? []
    : [line('first', 'over-rule-noted', ruleValues(over_rule, manner.mark))];
}

function notedLine({ happening, at }: AdditionNote, { here, manner }: Pick<Turn, 'here' | 'manner'>): Line {
  const amount = notedAmount(happening, manner.mark);
  const { added_mg_L, order } = happening;
  const values = {
    entry: String(here.nextEntry),
    vessel: vesselNames(happening.vessels),
    when: momentText(at, tellingOf(here)),
    added: added_mg_L === undefined ? 'none' : perLitre(added_mg_L, manner),
    number: numberOf(amount),
    order: order === undefined ? 'none' : String(order),
  };
  if (amount === undefined) return line('first', 'noted-bare', values);
  return { ...line('first', 'noted-addition', values), list: [amount, ...besideAmount(happening)] };
}

/** When to measure; the day may lie behind, where the addition is noted late. */
function nextLine({ happening, at }: AdditionNote, { here }: Pick<Turn, 'here'>): Line {
  const others = happening.vessels.flatMap((name) => here.vessels.get(name)?.additions.at(-1)?.at ?? []);
  const next = Math.max(at, ...others) + DAY_ms;
  const telling = tellingOf(here);
  return next > here.message.at
    ? line('effect', 'noted-measure', { when: momentText(next, telling) })
    : line('effect', 'noted-measure-now');
}
