import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { volumeText } from '../../replies/volume-text.ts';
import type { Manner } from '../manner.ts';
import { line } from './line.ts';
import { vesselText } from './vessel.ts';

/** What a line of a round lacks; a volume that does not fit is to be settled in a message of its own. */
export function missingInRound(reading: Reading, { mark, volumeUnit }: Manner): Line {
  const vessel = vesselText(reading);
  const [said_L] = reading.marks.volumeChoices ?? [];
  if (said_L !== undefined)
    return line('first', 'round-volume-which', { vessel, said: volumeText(said_L, volumeUnit, mark) });
  return line('first', 'round-missing', { vessel, field: reading.asks[0] ?? 'none' });
}
