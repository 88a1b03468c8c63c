import type { Due } from '../../../core/cellar/cellar-store.ts';
import type { Entry, LoggedEntry } from '../../../core/cellar/entry.ts';
import { touches } from '../../../core/cellar/touches.ts';
import { comparePoints, type Point } from '../projection/point.ts';

/** An entry as it is kept: its text, and what it is found by. */
export interface Noted extends Point {
  readonly by: number;
  readonly key: string;
  readonly corrects: number | undefined;
  readonly text: string;
}

/** Something to be said, with its lease. */
export interface DueKept {
  readonly due: Due;
  readonly leased_until: number;
  readonly said: boolean;
}

/**
 * A cellar in the memory of the process. What is kept is text, so that a later change of an object that was handed in
 * or out changes nothing here.
 */
export interface MemoryCellar {
  /** By number, from 1. */
  readonly log: Noted[];
  readonly byKey: Map<string, Noted>;
  readonly byVessel: Map<string, Noted[]>;
  /** The correction of an entry, by the number of the entry. */
  readonly corrections: Map<number, Noted>;
  /** How vessels stand, as JSON. */
  readonly standings: Map<string, string>;
  /** Waypoints as JSON, by their place as JSON. */
  readonly waypoints: Map<string, string>;
  /** Shelves of the chemical store as JSON, by name. */
  readonly shelves: Map<string, string>;
  readonly kept: Map<string, { readonly text: string; readonly until: number | undefined }>;
  /** By number. */
  readonly people: Map<number, { readonly id: string | undefined; readonly name: string | undefined }>;
  readonly due: Map<string, DueKept>;
}

/** A cellar that nobody has written to. */
export const emptyCellar = (): MemoryCellar => ({
  log: [],
  byKey: new Map(),
  byVessel: new Map(),
  corrections: new Map(),
  standings: new Map(),
  waypoints: new Map(),
  shelves: new Map(),
  kept: new Map(),
  people: new Map(),
  due: new Map(),
});

/** An entry to keep. */
export function noted(entry: Entry): Noted {
  const { at, entry: number, by, key } = entry;
  const corrects = entry.kind === 'correction' ? entry.corrects : undefined;
  return { at, entry: number, by, key, corrects, text: JSON.stringify(entry) };
}

/** The entry out of its text. */
export const entryOf = ({ text }: Noted): Entry => JSON.parse(text) as Entry;

/** The entry with the correction that takes it back. */
export function loggedOf(cellar: MemoryCellar, one: Noted): LoggedEntry {
  const correction = cellar.corrections.get(one.entry);
  if (correction === undefined) return entryOf(one);
  const { reason } = entryOf(correction) as { reason: string };
  return { ...entryOf(one), struck: { entry: correction.entry, reason } };
}

/** Whether an entry counts: it is no correction, and none takes it back. */
export const counts = (cellar: MemoryCellar, one: Noted): boolean =>
  one.corrects === undefined && !cellar.corrections.has(one.entry);

/** Entries in the order of their time. */
export const inOrder = (entries: readonly Noted[]): readonly Noted[] => entries.toSorted(comparePoints);

/** The vessels under which an entry is found. */
export const vesselsOf = (entry: Entry): readonly string[] => [...new Set(touches(entry))];
