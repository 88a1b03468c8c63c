import type { CellarStore, CellarView, Write } from '../../core/cellar/cellar-store.ts';
import { keepingRoster } from '../../chat/conversation/cellar/keeping-roster.ts';
import { readRoster } from '../../chat/conversation/cellar/roster.ts';
import { ROSTER_KEY } from '../../chat/conversation/keys.ts';

/** The cellar in which it is kept which chat belongs to which cellar. */
export const CHATS = 'chats';

/** So many chats are known without a look into the store. */
const MOST_KNOWN = 10_000;

/** The cellars of a chat, as they are kept. */
interface Kept {
  readonly cellars: readonly string[];
  readonly present: string;
}

/** The cellars of a chat. */
export interface CellarsOfChat extends Kept {
  /** Whether anything was kept of the chat; a chat of which nothing was is a cellar of its own. */
  readonly isKept: boolean;
}

/** Which chat belongs to which cellar. Every change resolves when it is durable, and does nothing a second time. */
export interface Registry {
  readonly cellarsOfChat: (chat: string) => Promise<CellarsOfChat>;
  /** The cellar is one of the chat’s from now on, and its present one. */
  readonly joinCellar: (chat: string, cellar: string) => Promise<void>;
  readonly leave: (chat: string, cellar: string) => Promise<void>;
  /** Another of the chat’s cellars is its present one; one that is none of them changes nothing. */
  readonly switchTo: (chat: string, cellar: string) => Promise<void>;
  /** A chat goes by another name: it keeps its cellars. */
  readonly migrateChat: (from: string, to: string) => Promise<void>;
  /** The name that a chat goes by now. */
  readonly chatNow: (chat: string) => Promise<string>;
}

const chatKey = (chat: string): string => `chat ${chat}`;
const movedKey = (chat: string): string => `moved ${chat}`;

/** Makes a registry that is kept in a store. No other process may write to it. */
export function createRegistry(store: Pick<CellarStore, 'turn' | 'look'>): Registry {
  const known = new Map<string, Kept | undefined>();
  const know = (chat: string, kept: Kept | undefined): void => {
    known.delete(chat);
    known.set(chat, kept);
    const [oldest] = known.keys();
    if (known.size > MOST_KNOWN && oldest !== undefined) known.delete(oldest);
  };

  const keptOf = async (chat: string): Promise<Kept | undefined> => {
    if (!known.has(chat)) know(chat, await store.look(CHATS, (view) => readKept(view, chat)));
    return known.get(chat);
  };

  /** The chat’s own cellar counts as one of several where something is in it. */
  const ownOf = async (chat: string): Promise<readonly string[]> =>
    (await store.look(chat, (view) => view.nextEntry())) > 1 ? [chat] : [];

  const change = async (
    chat: string,
    make: (before: Kept | undefined) => Kept | undefined,
    also: readonly Write[] = [],
  ): Promise<void> => {
    const next = await store.turn(CHATS, async (view) => {
      const before = await readKept(view, chat);
      const result = make(before);
      const isSame = JSON.stringify(result) === JSON.stringify(before);
      return { writes: [...(isSame ? [] : [writeOf(chat, result)]), ...also], result };
    });
    know(chat, next);
  };

  const chatNow: Registry['chatNow'] = async (chat) =>
    (await store.look(CHATS, (view) => view.kept(movedKey(chat)))) ?? chat;

  return {
    cellarsOfChat: async (chat) => {
      const kept = await keptOf(chat);
      return { ...(kept ?? { cellars: [chat], present: chat }), isKept: kept !== undefined };
    },
    joinCellar: async (chat, cellar) => {
      const own = await ownOf(chat);
      await change(chat, (before) => ({
        cellars: [...new Set([...(before?.cellars ?? own), cellar])],
        present: cellar,
      }));
    },
    leave: (chat, cellar) =>
      change(chat, (before) => {
        const cellars = (before?.cellars ?? []).filter((one) => one !== cellar);
        const [first] = cellars;
        if (before === undefined || first === undefined) return undefined;
        return { cellars, present: before.present === cellar ? first : before.present };
      }),
    switchTo: (chat, cellar) =>
      change(chat, (before) => (before?.cellars.includes(cellar) ? { ...before, present: cellar } : before)),
    migrateChat: async (from, to) => {
      if (from === to || (await chatNow(from)) === to) return;
      const { cellars, present } = (await keptOf(from)) ?? { cellars: [from], present: from };
      for (const cellar of cellars) await letIn(store, { cellar, from, to });
      const own = await ownOf(to);
      const moved: Write = { kind: 'keep', key: movedKey(from), text: to };
      await change(
        to,
        (before) => ({ cellars: [...new Set([...cellars, ...(before?.cellars ?? own)])], present }),
        [moved],
      );
      await change(from, () => undefined);
    },
    chatNow,
  };
}

async function readKept(view: CellarView, chat: string): Promise<Kept | undefined> {
  const text = await view.kept(chatKey(chat));
  return text === undefined ? undefined : (JSON.parse(text) as Kept);
}

function writeOf(chat: string, kept: Kept | undefined): Write {
  return kept === undefined
    ? { kind: 'drop', key: chatKey(chat) }
    : { kind: 'keep', key: chatKey(chat), text: JSON.stringify(kept) };
}

/** A cellar has its own list of the chats that may be in it. */
async function letIn(
  store: Pick<CellarStore, 'turn'>,
  { cellar, from, to }: { readonly cellar: string; readonly from: string; readonly to: string },
): Promise<void> {
  await store.turn(cellar, async (view) => {
    const roster = readRoster(await view.kept(ROSTER_KEY));
    const { [from]: before = 'hand', ...others } = roster.chats;
    // A chat that was shut out stays so under its new name.
    const isIn = from === cellar || roster.chats[from] !== undefined;
    const writes = isIn ? [keepingRoster({ ...roster, chats: { ...others, [to]: before } })] : [];
    return { writes, result: undefined };
  });
}
