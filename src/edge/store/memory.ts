import { FRESH_MEMORY, type Memory } from '../../chat/conversation/memory.ts';
import type { StatePort, Who } from '../../chat/conversation/ports.ts';

const keyOf = ({ cellar, chat, person }: Who): string => JSON.stringify([cellar, chat, person]);

/** Keeps the state of conversations for as long as the process lives. */
export function createMemoryStore(): StatePort {
  const kept = new Map<string, string>();
  return {
    load: async (who) => {
      const text = kept.get(keyOf(who));
      return text === undefined ? FRESH_MEMORY : (JSON.parse(text) as Memory);
    },
    // As text, so that a later change of an object that was handed in changes nothing here; all of it is made
    // before any of it is kept.
    commit: async (writes) => {
      const made = writes.map(({ who, memory }) => [keyOf(who), JSON.stringify(memory)] as const);
      for (const [key, text] of made) kept.set(key, text);
    },
  };
}
