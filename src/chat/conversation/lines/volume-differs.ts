import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { volumeText } from '../../replies/volume-text.ts';
import type { Manner } from '../manner.ts';
import { line } from './line.ts';
import { vesselText } from './vessel.ts';

/** That a volume does not fit what is known, where nothing hangs on it now: it is not kept until it is told plainly. */
export function volumeDiffersLines(reading: Reading, { volumeUnit, mark }: Manner): Line[] {
  const [said_L, known_L] = reading.marks.volumeChoices ?? [];
  if (said_L === undefined) return [];
  const text = (volume_L: number): string => volumeText(volume_L, volumeUnit, mark);
  return [
    line('question', 'volume-differs', {
      vessel: vesselText(reading),
      said: text(said_L),
      known: known_L === undefined ? 'none' : text(known_L),
      written: reading.where.volume_L?.text ?? text(said_L),
    }),
  ];
}
