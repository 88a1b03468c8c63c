import { buttonsFor } from '../buttons.ts';
import { doseOf } from '../dose-of.ts';
import type { Here } from '../here.ts';
import { isCapped, limitValues } from '../lines/capped.ts';
import { line } from '../lines/line.ts';
import { mannerOf } from '../manner.ts';
import type { Remembered } from '../memory.ts';
import type { Handled } from '../ports.ts';
import { recall } from '../recall.ts';
import { replying } from '../replying.ts';

/** "Full dose" under a smaller one: it is asked once more, with the rule that it passes, and no figure of it shows yet. */
export function askFullDose({ reading: said, ref }: Remembered, here: Here): Handled {
  // What was told of the wine since may open another rule.
  const reading = recall(said, here);
  const answer = doseOf(reading, here.settings);
  if (reading.intent !== 'dose' || !isCapped(answer))
    return replying(here, { lines: [line('first', 'full-dose-none')] });
  const manner = mannerOf(reading, here.memory.decimalMark ?? '.', here);
  return replying(here, {
    lines: [
      line('first', 'full-dose-asks', limitValues(reading, answer, manner)),
      line('first', 'full-dose-care'),
    ],
    buttons: buttonsFor(ref, ['fy']),
  });
}

/** The rule that a dose passes, where somebody has said yes to it with the rule before their eyes. */
export function ruleAgreedTo({ reading }: Remembered, here: Here): string | undefined {
  return doseOf(recall(reading, here), here.settings).capped?.rule;
}
