import type { CellarStore, Write } from '../../core/cellar/cellar-store.ts';
import { dailyKey } from '../../chat/conversation/keys.ts';
import type { PlaceOf } from './place.ts';

/** The cellar of a file, as the terminal has it. */
const CELLAR = 'cellar';

/** What is kept for those who come back to a chat. */
const OF_A_CHAT = ['memory ', 'reading '] as const;

/**
 * The places of a run on a file: all lines are in its one cellar, each in its chat. `run` names the run, so that the
 * chat of a line without one is no other line's, in no other run either.
 */
export function placeInFile(store: CellarStore, run: string): PlaceOf {
  let count = 0;
  return (chat) => {
    if (chat !== undefined) return { store, cellar: CELLAR, chat };
    count += 1;
    const own = `${run} ${count}`;
    return { store: forgettingChat(store, own), cellar: CELLAR, chat: own };
  };
}

/** A store that keeps the log and what is known of the cellar, and nothing for a chat that nobody comes back to. */
function forgettingChat(store: CellarStore, chat: string): CellarStore {
  const stays = (write: Write): boolean => {
    if (write.kind === 'due') return write.due.chat !== chat;
    if (write.kind !== 'keep') return true;
    return write.key !== dailyKey(chat) && !OF_A_CHAT.some((begin) => write.key.startsWith(begin));
  };
  return {
    ...store,
    turn: (cellar, work) =>
      store.turn(cellar, async (view) => {
        const done = await work(view);
        return { ...done, writes: done.writes.filter(stays) };
      }),
  };
}
