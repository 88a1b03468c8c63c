import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { Reading } from '../../reader/understood.ts';
import { parseKey } from '../buttons.ts';
import type { Here } from '../here.ts';
import { readingKey } from '../keys.ts';
import { line } from '../lines/line.ts';
import { rangeLines } from '../lines/range.ts';
import { namedWorking } from '../lines/working.ts';
import { mannerOf } from '../manner.ts';
import type { Remembered } from '../memory.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { rangeOf } from './range-of.ts';

/** `range`: how far the last dose may be off, or that of a vessel, with its working. */
export async function tellRange(vessel: string | undefined, here: Here, view: CellarView): Promise<Handled> {
  const reading = await lastDose(vessel, here, view);
  const found = reading && rangeOf(reading, here.settings);
  if (reading === undefined || found === undefined)
    return replying(here, { lines: [line('first', 'range-nothing')], keepsButtons: true });
  const manner = mannerOf(reading, here.memory.decimalMark ?? '.', here);
  const said = replying(here, {
    lines: [...rangeLines(reading, found.data, manner, 'first'), ...namedWorking(found.range.steps, manner)],
    keepsButtons: true,
  });
  return { ...said, answers: [{ range: found.data, steps: found.range.steps }] };
}

/** The reading of the dose that was reckoned last: what the buttons stand under, or what was planned for the vessel. */
async function lastDose(
  vessel: string | undefined,
  here: Here,
  view: CellarView,
): Promise<Reading | undefined> {
  const { chat } = here.message;
  const plan = vessel === undefined ? undefined : here.plans.get(vessel);
  const button = here.memory.lastButtons.map((key) => parseKey(key)).find((one) => one !== undefined);
  const ref = vessel === undefined ? button?.ref : plan?.chat === chat ? plan.ref : undefined;
  const kept = ref === undefined ? undefined : await view.kept(readingKey(chat, ref));
  const remembered = kept === undefined ? undefined : (JSON.parse(kept) as Remembered);
  return remembered?.reading.intent === 'dose' ? remembered.reading : undefined;
}
