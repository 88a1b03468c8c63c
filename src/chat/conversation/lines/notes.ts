import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import { ADDITIVES } from '../../../core/additives/additives.ts';
import type { ReadNote, Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import type { Manner } from '../manner.ts';
import { part } from './line.ts';

/** The notes that say how something was read; the others have a place of their own in the reply. */
const AMONG_THE_ASSUMED = [
  'free-unlabelled',
  'ph-unlabelled',
  'volume-sum',
  'strength-as-salt',
  'strength-as-SO2',
  'mass-beside-readings',
  'each-or-total',
  'unread-words',
] as const satisfies readonly ReadNote['id'][];

/** How many times as much SO2 the strength would be, were it of SO2 and not of the salt. */
export function saltFactor(additive: AdditiveId | undefined, { mark }: Manner): string {
  return additive === undefined ? '1' : numberText(1 / ADDITIVES[additive].SO2_share, 2, mark);
}

/** How something was read that could be read otherwise, as parts of the list of assumptions. */
export function noteParts(reading: Reading, manner: Manner): Omit<Line, 'room'>[] {
  const told = AMONG_THE_ASSUMED.filter(
    (id) => !(id === 'each-or-total' && reading.asks.includes('volume_L')),
  );
  return told
    .flatMap((id) => reading.notes.flatMap((note) => (note.id === id ? [{ id, text: note.text }] : [])))
    .map(({ id, text }) =>
      part(
        `note-${id}`,
        id === 'strength-as-salt' ? { factor: saltFactor(reading.fields.additive, manner) } : { text },
      ),
    );
}

/** The person's words of a note, where the reading has it. */
export function noteText(reading: Reading, id: ReadNote['id']): string | undefined {
  return reading.notes.find((note) => note.id === id)?.text;
}
