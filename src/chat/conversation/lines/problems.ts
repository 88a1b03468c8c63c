import type { ProblemCode } from '../../../core/problem.ts';
import type { Reading } from '../../reader/understood.ts';
import type { DecimalMark } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import { line } from './line.ts';
import { noteText } from './notes.ts';
import { hintFor, withoutSO2 } from './problem-hint.ts';

/**
 * Each problem in a sentence with what to send instead; beside one no figure is given.
 *
 * @param again what has to be sent: the correction alone, or the whole line once more
 */
export function problemLines(
  reading: Reading,
  vessel: string,
  mark: DecimalMark,
  again: 'correction' | 'whole',
): Line[] {
  const lines = reading.problems.map(({ code, about }) =>
    line('first', keyOf(code, about, reading), {
      vessel,
      about: shortened(about),
      ...(code === 'total-below-free' ? swapped(about) : hintFor(reading, about, mark)),
    }),
  );
  const only = reading.problems.every(({ code }) => code === 'not-understood' || code === 'too-long');
  return only ? lines : [...lines, line('question', 'problem-no-number', { again })];
}

/** The sentence for a problem; some have one that knows more of the matter. */
function keyOf(code: ProblemCode, about: string, reading: Reading): SentenceKey {
  if (code === 'unknown-additive' && noteText(reading, 'did-you-mean') !== undefined)
    return 'problem-did-you-mean';
  const isVolume = about === reading.where.volume_L?.text;
  if (code === 'ambiguous-number' && isVolume && noteText(reading, 'each-or-total') !== undefined)
    return 'problem-each-or-total';
  // A share is written as a fraction; what no cellar has is another matter.
  if (code === 'value-out-of-range' && /\d\s*\/\s*\d/.test(about)) return 'problem-share';
  return `problem-${code}`;
}

/** The two figures of a total below the free, the other way round: so they are right. */
function swapped(about: string): Line['values'] {
  const figures = withoutSO2(about).match(/\d+(?:[.,]\d+)?/g) ?? [];
  const order = figures.toSorted((a, b) => Number(a.replace(',', '.')) - Number(b.replace(',', '.')));
  return { one: order[0] ?? '', two: order.at(-1) ?? '' };
}

/** The person's own words, cut where they would fill the screen. */
export function shortened(about: string): string {
  const oneLine = about.replace(/[\p{C}\s]+/gu, ' ').trim();
  return oneLine.length > 40 ? `${oneLine.slice(0, 39)}…` : oneLine === '' ? '…' : oneLine;
}
