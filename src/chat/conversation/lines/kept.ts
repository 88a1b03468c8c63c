import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import type { Here } from '../here.ts';
import type { Note } from '../note.ts';
import { vesselText } from './vessel.ts';

/** The lines of a reply in which what was read is also said to be kept, and that a vessel is new, where it is. */
export function withKept(
  lines: readonly Line[],
  reading: Reading,
  here: Here,
  notes: readonly Note[],
): Line[] {
  const { vessel } = reading.fields;
  if (notes.length === 0) return [...lines];
  const isNew = vessel !== undefined && !here.vessels.has(vessel);
  const values = { vessel: vesselText(reading), new: isNew ? 'new' : 'known' };
  return lines.map((one) => (one.key === 'read' ? { ...one, key: 'read-kept', values } : one));
}
