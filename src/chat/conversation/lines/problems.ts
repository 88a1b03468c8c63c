import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { line } from './line.ts';
import { noteText } from './notes.ts';

/** Each problem in a sentence with what to send instead; beside one no figure is given. */
export function problemLines(reading: Reading, vessel: string): Line[] {
  const lines = reading.problems.map(({ code, about }) => {
    const suggested = code === 'unknown-additive' && noteText(reading, 'did-you-mean') !== undefined;
    const key = suggested ? 'problem-did-you-mean' : `problem-${code}`;
    return line('first', key, { vessel, about: shortened(about) });
  });
  const only = reading.problems.every(({ code }) => code === 'not-understood' || code === 'too-long');
  return only ? lines : [...lines, line('question', 'problem-no-number')];
}

/** The person's own words, cut where they would fill the screen. */
export function shortened(about: string): string {
  const oneLine = about.replace(/[\p{C}\s]+/gu, ' ').trim();
  return oneLine.length > 40 ? `${oneLine.slice(0, 39)}…` : oneLine === '' ? '…' : oneLine;
}
