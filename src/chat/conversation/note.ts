import type { Write } from '../../core/cellar/cellar-store.ts';
import type { Happening } from '../../core/cellar/entry.ts';
import type { Here } from './here.ts';
import { eventKey } from './keys.ts';

/** Something to note in the log. */
export interface Note {
  readonly happening: Happening;
  /** When it happened, in milliseconds since 1970. */
  readonly at: number;
  /** Names what caused it, where that is not the message itself but a button that many may press. */
  readonly key?: string;
}

/** The writes that note things in the log, in their order; what the same event has noted before is not noted again. */
export function noting(here: Here, notes: readonly Note[]): Write[] {
  const { message, me, done, event = eventKey(message) } = here;
  return notes.flatMap(({ happening, at, key = '' }, place): Write[] => {
    const own = key === '' ? `${event}${place}` : key;
    if (done.has(own)) return [];
    return [{ kind: 'entry', entry: { ...happening, key: own, at, noted_at: message.at, by: me } }];
  });
}

/** The write that makes a new person known, or the new name of one. */
export function greeting({ message, me, isNewPerson }: Here): Write[] {
  const { person, name } = message;
  return isNewPerson ? [{ kind: 'person', id: person, number: me, ...(name !== undefined && { name }) }] : [];
}
