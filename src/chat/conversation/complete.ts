import { finishReading } from '../reader/finish-reading.ts';
import type { Fields, FieldName, Intent, Reading } from '../reader/understood.ts';
import { ofAllVessels } from './each-vessel.ts';
import type { Waiting } from './memory.ts';
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
function completes(waiting: Reading, next: Reading): boolean {
  const isYield = next.marks.yield_L_per_100_kg !== undefined && waiting.marks.fruitByWeight === true;
  return (Object.keys(next.fields).length > 0 || isYield) && belongs(waiting, next);
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
      ...(next.when && { when: next.when }),
      ...(next.chemical_lot !== undefined && { chemical_lot: next.chemical_lot }),
      ...(next.remark !== undefined && { remark: next.remark }),
    },
    settings,
  );
}

/** While a target is asked, a level of free SO2 alone is the target and no measured figure (`30 free`). */
export function asAnswered(waiting: Waiting, next: Reading): Reading {
  const { free_mg_L, ...others } = next.fields;
  if (waiting.field !== 'target' || waiting.doubt !== undefined) return next;
  if (next.intent !== 'dose' || free_mg_L === undefined || Object.keys(others).length > 0) return next;
  const notes = next.notes.filter(({ id }) => id !== 'free-unlabelled');
  return { ...next, fields: { target: { free_mg_L } }, where: {}, notes };
}

/** The waiting reading without what its doubt may change: that contradicts nothing. */
function beyondDoubt({ doubt, reading }: Waiting): Reading {
  if (doubt === undefined) return reading;
  const kept = Object.entries(reading.fields).filter(
    ([name]) => !doubt.settledBy.includes(name as FieldName),
  );
  return { ...reading, fields: Object.fromEntries(kept) };
}

/** Whether a message is the answer that is waited for, or a part of it. */
export function answers(waiting: Waiting, next: Reading): boolean {
  return completes(beyondDoubt(waiting), next);
}

/** Whether a message says what was in doubt: one of its fields, and of a volume of several whether it is of each. */
function settles({ doubt, reading }: Waiting, next: Reading): boolean {
  if (doubt === undefined) return true;
  if (!doubt.settledBy.some((name: FieldName) => next.fields[name] !== undefined)) return false;
  const { statedEach, statedTotal } = next.marks;
  const whole =
    statedEach || statedTotal || next.containers !== undefined || next.fields.vessels !== undefined;
  return !reading.marks.eachOrTotal || whole === true;
}

/** Beside a problem nothing is asked. */
function withProblems(reading: Reading, { problems }: Reading): Reading {
  return problems.length === 0 ? reading : { ...reading, problems, asks: [] };
}

/** What a message says of a vessel that it names is kept, also where the same was said before. */
function notedAnew(waiting: Reading, { fields }: Reading): Reading {
  if (waiting.noted === undefined || (fields.vessel ?? fields.vessels) === undefined) return waiting;
  return { ...waiting, noted: waiting.noted.filter((name) => fields[name] === undefined) };
}

/** The reading that waits with its answer; while the answer leaves in doubt what was, the problem stands. */
export function completeWaiting(waiting: Waiting, next: Reading, settings: Settings): Reading {
  const { doubt } = waiting;
  const reading = notedAnew(waiting.reading, next);
  const whole = ofAllVessels(reading, next);
  if (doubt === undefined) return withProblems(complete(reading, whole, settings), whole);
  if (!settles(waiting, next))
    return { ...complete(reading, next, settings), problems: doubt.problems, asks: [] };
  const { eachOrTotal: _asked, ...marks } = reading.marks;
  const notes = reading.notes.filter(({ id }) => id !== 'each-or-total');
  return withProblems(complete({ ...reading, marks, notes }, whole, settings), whole);
}
