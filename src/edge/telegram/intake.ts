import type { TelegramUpdate } from './update.ts';

/** Where updates are kept between their arrival and their answer. Asynchronous, for a database. */
export interface Intake {
  /**
   * Keeps a batch, each under its number, and gives back those that are new. The platform may only be told that
   * it was received when this has resolved.
   */
  offer(updates: readonly TelegramUpdate[]): Promise<readonly TelegramUpdate[]>;
  /** Says that an update has been answered, or needs no answer. */
  done(updateId: number): Promise<void>;
  /** The numbers of those that were offered and are not done, the lowest first. */
  unfinished(): Promise<readonly number[]>;
}

/** So many of the last numbers are remembered: a repeated update comes soon or not at all. */
const REMEMBERED = 10_000;

/** An intake that lasts as long as the process. */
export function createMemoryIntake(): Intake {
  // A Set keeps the order in which its members came.
  const seen = new Set<number>();
  const open = new Set<number>();
  return {
    offer: async (updates) => {
      const fresh = updates.filter(({ update_id }) => {
        if (seen.has(update_id)) return false;
        seen.add(update_id);
        open.add(update_id);
        return true;
      });
      for (const oldest of seen) {
        if (seen.size <= REMEMBERED) break;
        if (!open.has(oldest)) seen.delete(oldest);
        else break;
      }
      return fresh;
    },
    done: async (updateId) => {
      open.delete(updateId);
    },
    unfinished: async () => [...open].toSorted((a, b) => a - b),
  };
}
