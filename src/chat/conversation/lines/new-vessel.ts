import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import type { Here } from '../here.ts';
import type { Note } from '../note.ts';
import { line } from './line.ts';
import { vesselText } from './vessel.ts';

/** That a vessel was never heard of before, where something is noted of it now. */
export function newVesselLines(reading: Reading, here: Here, notes: readonly Note[]): Line[] {
  const { vessel } = reading.fields;
  if (vessel === undefined || notes.length === 0 || here.vessels.has(vessel)) return [];
  return [line('assumed', 'vessel-new', { vessel: vesselText(reading) })];
}
