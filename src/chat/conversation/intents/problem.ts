import type { Reading } from '../../reader/understood.ts';
import { doubtOf } from '../doubt.ts';
import { line } from '../lines/line.ts';
import { problemLines, shortened } from '../lines/problems.ts';
import { BURNING_SULFUR } from './chat.ts';
import { titrationFacts } from '../lines/titration.ts';
import { vesselText } from '../lines/vessel.ts';
import type { Outcome, Turn } from '../outcome.ts';

/** The words of a line that cannot be read, or what it goes by in its round; `none` where nothing is known of it. */
function wordsOf(about: string, reading: Reading): string {
  return about.trim() === '' ? vesselText(reading) : shortened(about);
}

/** A stock of powder whose strength no water takes. */
function isOfTooStrongStock({ marks, problems, fields }: Reading): boolean {
  const isOfPowder = fields.additive === undefined || fields.additive.includes('metabisulfite');
  return marks.solutionUse !== undefined && isOfPowder && problems[0]?.code === 'strength-out-of-range';
}

/** A message with something wrong in it: what, and what to send instead; never a figure beside it. */
export function answerProblem(reading: Reading, { manner }: Turn): Outcome {
  // A figure of a titration alone could be any of its volumes: it is sent whole.
  const doubt = reading.intent === 'titration' ? undefined : doubtOf(reading);
  const again = doubt === undefined ? 'whole' : 'correction';
  const lines = reading.marks.wick
    ? BURNING_SULFUR.map((key) => line('first', key))
    : problemLines(reading, vesselText(reading), manner.mark, again);
  if (isOfTooStrongStock(reading)) lines.splice(0, 1, line('first', 'solution-strengths'));
  const unread = reading.problems.find(({ code }) => code === 'not-understood');
  if (reading.titration) lines.push(...titrationFacts(reading.titration, manner, reading.fields.ph));
  const inRound = unread
    ? [line('first', 'round-not-understood', { about: wordsOf(unread.about, reading) })]
    : lines.slice(0, 1);
  return { answer: null, inRound, lines, buttons: [], ...(doubt && { doubt }) };
}
