import type { Kysely } from 'kysely';
import type { Write } from '../../../core/cellar/cellar-store.ts';
import { noteEntries } from '../projection/note-entries.ts';
import { keepDue, markSaid } from './due-things.ts';
import { dropLapsedTexts, dropText, keepText } from './kept-texts.ts';
import { markHandled } from './arrived-things.ts';
import { keepPerson } from './people.ts';
import { keepPost } from './posts.ts';
import { readyQuery } from './ready-query.ts';
import { createSqlLedger } from './sql-ledger.ts';
import type { Tables } from './tables.ts';

const begin = readyQuery((db, { cellar }: { readonly cellar: string }) =>
  db
    .insertInto('cellar')
    .values({ cellar })
    .onConflict((on) => on.doNothing()),
);

/** Writes what a turn writes; whoever calls it sees to it that all of it is kept or none. `now`: ms since 1970. */
export async function writeSet(
  db: Kysely<Tables>,
  writes: readonly Write[],
  { cellar, now }: { readonly cellar: string; readonly now: number },
): Promise<void> {
  await begin(db, { cellar });
  const entries = writes.flatMap((write) => (write.kind === 'entry' ? [write.entry] : []));
  await noteEntries(createSqlLedger(db, cellar), entries);
  for (const write of writes) {
    switch (write.kind) {
      case 'entry':
        break;
      case 'keep':
        await keepText(db, cellar, write);
        break;
      case 'drop':
        await dropText(db, cellar, write.key);
        break;
      case 'person':
        await keepPerson(db, cellar, write);
        break;
      case 'forget-person':
        await keepPerson(db, cellar, { number: write.number, id: null });
        break;
      case 'due':
        await keepDue(db, cellar, write.due);
        break;
      case 'said':
        await markSaid(db, cellar, write.id);
        break;
      case 'post':
        await keepPost(db, write.post);
        break;
      case 'handled':
        await markHandled(db, write, now);
        break;
    }
  }
  // Where something is kept that lapses, what has lapsed goes.
  if (writes.some((write) => write.kind === 'keep' && write.until !== undefined))
    await dropLapsedTexts(db, cellar, now);
}
