import type { Reading } from '../reader/understood.ts';

/** No barrel holds more: up to this a volume of several vessels is of each, in litres; common practice, no source. */
const MOST_OF_EACH_L = 700;

/** Whether a message gives the volume that several vessels lack, and does not count them itself. */
function givesVolume(waiting: Reading, { fields, containers }: Reading): boolean {
  return (
    waiting.fields.vessels !== undefined &&
    waiting.fields.volume_L === undefined &&
    fields.volume_L !== undefined &&
    fields.vessels === undefined &&
    containers === undefined
  );
}

/**
 * The answer to what several vessels hold, as the volume of all of them: "each", and up to 700 L without "total", is of
 * each. A larger one may be either, and gets the problem that asks for it.
 */
export function ofAllVessels(waiting: Reading, next: Reading): Reading {
  const { volume_L = 0 } = next.fields;
  const count = waiting.fields.vessels?.length ?? 1;
  if (!givesVolume(waiting, next) || next.marks.statedTotal) return next;
  const all: Reading = { ...next, fields: { ...next.fields, volume_L: volume_L * count } };
  if (next.marks.statedEach) return all;
  const text = next.where.volume_L?.text ?? `${Number(volume_L.toPrecision(6))} L`;
  const where = { ...next.where, volume_L: next.where.volume_L ?? { start: 0, end: text.length, text } };
  const notes = [...next.notes, { id: 'each-or-total' as const, text }];
  if (volume_L <= MOST_OF_EACH_L) return { ...all, notes };
  const problems = [...next.problems, { code: 'ambiguous-number' as const, about: text }];
  return { ...next, where, notes, problems, marks: { ...next.marks, eachOrTotal: true } };
}
