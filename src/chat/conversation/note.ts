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

/** The writes that note things in the log, in their order; and the person who notes them, if they are new. */
export function noting(here: Here, notes: readonly Note[]): Write[] {
  const { message, me } = here;
  const event = eventKey(message);
  return [
    ...(here.isNewPerson ? [personOf(here)] : []),
    ...notes.map(({ happening, at, key }, place): Write => ({
      kind: 'entry',
      entry: { ...happening, key: key ?? `${event}${place}`, at, noted_at: message.at, by: me },
    })),
  ];
}

function personOf({ message, me }: Here): Write {
  const { person, name } = message;
  return { kind: 'person', id: person, number: me, ...(name !== undefined && { name }) };
}
