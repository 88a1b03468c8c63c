import { finishReading } from '../reader/finish-reading.ts';
import type { Fields, Intent, Reading } from '../reader/understood.ts';
import type { Settings } from './settings.ts';

/** Whether two values of one field say the same. */
function same(a: unknown, b: unknown): boolean {
  return a === b || JSON.stringify(a) === JSON.stringify(b);
}

function contradicts(waiting: Fields, next: Fields): boolean {
  return Object.entries(next).some(([name, value]) => {
    const before = waiting[name as keyof Fields];
    return before !== undefined && !same(before, value);
  });
}

function namesAnotherVessel(waiting: Fields, next: Fields): boolean {
  const before = waiting.vessel ?? waiting.vessels;
  const now = next.vessel ?? next.vessels;
  return before !== undefined && now !== undefined && !same(before, now);
}

/** A few figures alone read as a `dose` (a mass and a volume as an `effect`); they fit what was asked before. */
function fits(waiting: Intent, next: Intent): boolean {
  return next === waiting || next === 'dose' || (next === 'effect' && waiting !== 'dose');
}

/** Whether a message can belong to the reading that waits: it contradicts nothing in it and names no other vessel. */
export function belongs(waiting: Reading, next: Reading): boolean {
  return (
    fits(waiting.intent, next.intent) &&
    !namesAnotherVessel(waiting.fields, next.fields) &&
    !contradicts(waiting.fields, next.fields)
  );
}

/**
 * Whether a message completes the reading that waits: it has fields of its own, contradicts nothing in it and names
 * no other vessel. Otherwise it starts a new one.
 */
export function completes(waiting: Reading, next: Reading): boolean {
  return Object.keys(next.fields).length > 0 && belongs(waiting, next);
}

/** The waiting reading with the fields of its answer; what is assumed and what is still missing is worked out anew. */
export function complete(waiting: Reading, next: Partial<Reading>, settings: Settings): Reading {
  const fields: Fields = { ...waiting.fields, ...next.fields };
  const { assumed: _assumed, asks: _asks, ...draft } = waiting;
  return finishReading(
    {
      ...draft,
      fields,
      setAside: [...waiting.setAside, ...(next.setAside ?? [])],
      notes: [...waiting.notes, ...(next.notes ?? [])],
      marks: { ...waiting.marks, ...next.marks },
      where: { ...waiting.where, ...next.where },
      ...(next.strength_of && { strength_of: next.strength_of }),
      ...(next.volumeUnit && { volumeUnit: next.volumeUnit }),
      ...(next.containers !== undefined && { containers: next.containers }),
      ...(next.concentrationUnit && { concentrationUnit: next.concentrationUnit }),
    },
    settings,
  );
}
