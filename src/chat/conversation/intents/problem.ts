import type { Reading } from '../../reader/understood.ts';
import { doubtOf } from '../doubt.ts';
import { line } from '../lines/line.ts';
import { problemLines, shortened } from '../lines/problems.ts';
import { vesselText } from '../lines/vessel.ts';
import type { Outcome, Turn } from '../outcome.ts';

/** The words of a line that cannot be read, or what it goes by in its round; `none` where nothing is known of it. */
function wordsOf(about: string, reading: Reading): string {
  return about.trim() === '' ? vesselText(reading) : shortened(about);
}

/** A message with something wrong in it: what, and what to send instead; never a figure beside it. */
export function answerProblem(reading: Reading, { manner }: Turn): Outcome {
  const doubt = doubtOf(reading);
  const again = doubt === undefined ? 'whole' : 'correction';
  const lines = problemLines(reading, vesselText(reading), manner.mark, again);
  const unread = reading.problems.find(({ code }) => code === 'not-understood');
  const inRound = unread
    ? [line('first', 'round-not-understood', { about: wordsOf(unread.about, reading) })]
    : lines.slice(0, 1);
  return { answer: null, inRound, lines, buttons: [], ...(doubt && { doubt }) };
}
