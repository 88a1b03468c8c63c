import type { Write } from '../../../core/cellar/cellar-store.ts';
import { noteEntries } from '../projection/note-entries.ts';
import type { MemoryCellar } from './memory-cellar.ts';
import { createMemoryLedger } from './memory-ledger.ts';
import { writeMail, type MemoryMail } from './memory-mail.ts';
import { makeUndoable, type Undoable } from './undoable.ts';

/** Writes what a turn writes; where one of it cannot be kept, none is. `now` is milliseconds since 1970. */
export async function writeToMemory(
  cellar: MemoryCellar,
  writes: readonly Write[],
  { mail, now }: { readonly mail: MemoryMail; readonly now: number },
): Promise<void> {
  const change = makeUndoable();
  try {
    const entries = writes.flatMap((write) => (write.kind === 'entry' ? [write.entry] : []));
    await noteEntries(createMemoryLedger(cellar, change), entries);
    for (const write of writes)
      if (write.kind === 'post' || write.kind === 'handled') writeMail(mail, write, { change, now });
      else writeOne(cellar, write, change);
  } catch (error) {
    change.undo();
    throw error;
  }
}

function writeOne(
  cellar: MemoryCellar,
  write: Exclude<Write, { kind: 'post' | 'handled' }>,
  change: Undoable,
): void {
  switch (write.kind) {
    case 'entry':
      return;
    case 'keep':
      return change.set(cellar.kept, write.key, { text: write.text, until: write.until });
    case 'drop':
      return change.remove(cellar.kept, write.key);
    case 'person': {
      const known = [...cellar.people].find(([, { id }]) => id === write.id);
      if (known !== undefined && known[0] !== write.number)
        throw new RangeError(`person ${write.number} is number ${known[0]} already`);
      return change.set(cellar.people, write.number, { id: write.id, name: write.name });
    }
    case 'forget-person':
      return change.set(cellar.people, write.number, { id: undefined, name: undefined });
    case 'due': {
      const { id, chat, at, about } = write.due;
      const { leased_until = 0, said = false } = cellar.due.get(id) ?? {};
      if (said) return;
      return change.set(cellar.due, id, { due: { id, chat, at, about }, leased_until, said });
    }
    case 'said': {
      const found = cellar.due.get(write.id);
      if (found !== undefined) change.set(cellar.due, write.id, { ...found, said: true });
    }
  }
}
