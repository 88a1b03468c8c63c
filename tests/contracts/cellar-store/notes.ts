import type { CellarStore, Write } from '../../../src/core/cellar/cellar-store.ts';
import type { Entry, Happening, LoggedEntry, NewEntry, Noting } from '../../../src/core/cellar/entry.ts';

/** Makes a store that nothing else uses; `now` is its clock. */
export type CreateStore = (now: () => number) => Promise<CellarStore>;

/** Something to note; what is not said is a reading of tank 4 by person 1, its key made of its time. */
export function note(at: number, said: Partial<Noting> & Partial<Happening> = {}): NewEntry {
  const noting = { key: `key ${at}`, at, noted_at: at, by: 1 };
  return { ...noting, kind: 'reading', vessels: ['tank 4'], ph: 3.5, ...said } as NewEntry;
}

/** Something to note that takes an entry back. */
export const strike = (at: number, corrects: number, said: Partial<Noting> = {}): NewEntry =>
  note(at, { kind: 'correction', corrects, reason: 'typo', ph: undefined, ...said } as Partial<NewEntry>);

/** The write of an entry. */
export const writeOf = (entry: NewEntry): Write => ({ kind: 'entry', entry });

/** Writes in a turn of their own. */
export const write = (store: CellarStore, ...writes: readonly Write[]): Promise<void> =>
  store.turn('cellar 1', async () => ({ writes, result: undefined }));

/** Notes in a turn of its own. */
export const noteIn = (store: CellarStore, ...entries: readonly NewEntry[]): Promise<void> =>
  write(store, ...entries.map(writeOf));

/** All entries of the cellar. */
export const allEntries = (store: CellarStore): Promise<readonly LoggedEntry[]> =>
  store.look('cellar 1', (view) => view.entries({}));

/** The numbers of entries. */
export const numbersOf = (entries: readonly Entry[]): number[] => entries.map(({ entry }) => entry);
