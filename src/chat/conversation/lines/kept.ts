import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import type { Here } from '../here.ts';
import type { Note } from '../note.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import { line } from './line.ts';
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
  const named = [
    vessel,
    ...notes.map(({ happening }) => (happening.kind === 'vessel' ? happening.to : undefined)),
  ];
  const fresh = named.filter((name) => name !== undefined && !here.vessels.has(name));
  const isNew = vessel !== undefined && fresh.includes(vessel);
  const values = { vessel: vesselText(reading), new: isNew ? 'new' : 'known' };
  const kept = lines.map((one) => (one.key === 'read' ? { ...one, key: 'read-kept', values } : one));
  const unsaid = fresh.filter((name) => !(name === vessel && kept.some(({ key }) => key === 'read-kept')));
  return [
    ...kept,
    ...unsaid.map((name) => line('assumed', 'vessel-new', { vessel: vesselName(name ?? '') })),
  ];
}
