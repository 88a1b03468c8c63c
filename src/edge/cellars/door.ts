import type { CellarStore } from '../../core/cellar/cellar-store.ts';
import { cellarLeftIn } from '../../chat/conversation/cellar/cellar-left-in.ts';
import { cellarsCalled } from '../../chat/conversation/cellar/cellars-called.ts';
import { placeOf } from '../../chat/conversation/cellar/cellar-name.ts';
import { codeIn, readCode } from '../../chat/conversation/cellar/code.ts';
import { roleIn } from '../../chat/conversation/cellar/role-of.ts';
import { readRoster } from '../../chat/conversation/cellar/roster.ts';
import { tellsOfDanger } from '../../chat/conversation/cellar/tells-of-danger.ts';
import { turnAway } from '../../chat/conversation/cellar/turn-away.ts';
import { inviteKey, ROSTER_KEY } from '../../chat/conversation/keys.ts';
import type { CellarPlace, Handle, IncomingMessage, PlaceChange } from '../../chat/conversation/ports.ts';
import { tooFastReply } from '../../chat/conversation/too-fast-reply.ts';
import { isListed, mayUse, type AllowRule } from './allow-rule.ts';
import type { Pace } from './rate-limit.ts';
import { CHATS, type CellarsOfChat, type Registry } from './registry.ts';

/** A message with its cellar, and what handles it there. */
export interface Admitted {
  readonly message: IncomingMessage;
  readonly handle: Handle;
}

/** The way of a message into its cellar. */
export interface Door {
  readonly admit: (message: IncomingMessage) => Promise<Admitted>;
  /** Resolves when the chat is where it is to be. */
  readonly move: (chat: string, change: PlaceChange) => Promise<void>;
  /** Where something is to be said unasked in a cellar: the chat’s name by now, and all its cellars if they are several. */
  readonly whereIs: (
    chat: string,
  ) => Promise<{ readonly chat: string; readonly cellars?: readonly CellarPlace[] }>;
}

/** Whether somebody was let in: who was not is answered outside of all cellars. */
export const isInside = ({ message }: Admitted): boolean => message.cellar !== CHATS;

/** What a door needs. */
export interface DoorOptions {
  readonly store: Pick<CellarStore, 'look'>;
  readonly registry: Registry;
  readonly rule: AllowRule;
  readonly paceOf: (message: IncomingMessage) => Pace;
  readonly handle: Handle;
}

const SILENCE: Handle = async () => ({ writes: [], replies: [] });

const TOO_FAST: Handle = async ({ language }) => ({ writes: [], replies: [tooFastReply(language)] });

const STRANGER: Handle = (message, view) => turnAway(message, 'stranger', view);

/**
 * Makes the door: who may use the bot at all, how fast, and in which cellar a message is handled. Danger is answered
 * whoever tells of it.
 */
export function makeDoor({ store, registry, rule, paceOf, handle }: DoorOptions): Door {
  const keepingNothing: Handle = async (...of) => ({ writes: [], replies: (await handle(...of)).replies });

  const placesOf = ({ cellars }: CellarsOfChat): Promise<readonly CellarPlace[]> =>
    Promise.all(
      cellars.map((cellar) =>
        store.look(cellar, async (view) => {
          const roster = readRoster(await view.kept(ROSTER_KEY));
          return placeOf(cellar, { roster, people: await view.people() });
        }),
      ),
    );

  const placed = async (
    message: IncomingMessage,
    of: CellarsOfChat,
    cellar: string,
  ): Promise<IncomingMessage> => ({
    ...message,
    cellar,
    ...(cellar !== message.chat && { isJoined: true }),
    ...(of.cellars.length > 1 && { cellars: await placesOf(of) }),
  });

  /** The cellar that a message wants to join, if there is such an invitation and the chat may go there. */
  const invitedTo = async (message: IncomingMessage, of: CellarsOfChat): Promise<string | undefined> => {
    const { content, addressed = 'direct' } = message;
    const code = content.kind === 'text' ? codeIn(content.text) : undefined;
    const read = code === undefined ? undefined : readCode(code);
    if (read === undefined) return undefined;
    const kept = await store.look(read.cellar, (view) => view.kept(inviteKey(read.secret)));
    if (kept === undefined) return undefined;
    if (addressed === 'direct' || of.present === read.cellar) return read.cellar;
    // Nobody takes a group away from its keepers.
    const isTheirs = await store.look(of.present, async (view) => {
      if ((await view.people()).length === 0) return true;
      const there = await placed(message, of, of.present);
      return (await roleIn(view, there)) === 'keeper';
    });
    return isTheirs ? read.cellar : undefined;
  };

  /** The cellar that a message wants to leave, where the chat has several: it is answered there. */
  const leftBy = async (message: IncomingMessage, of: CellarsOfChat): Promise<string | undefined> => {
    const said = of.cellars.length > 1 ? cellarLeftIn(message) : undefined;
    if (said === undefined) return undefined;
    const [only, another] = cellarsCalled(said, await placesOf(of));
    return another === undefined ? only?.cellar : undefined;
  };

  return {
    admit: async (message) => {
      if (message.trusted) return { message, handle };
      const { chat, addressed = 'direct' } = message;
      const isDanger = tellsOfDanger(message);
      const pace = isDanger ? 'fine' : paceOf(message);
      const inChats = { ...message, cellar: CHATS };
      if (pace !== 'fine') return { message: inChats, handle: pace === 'now' ? TOO_FAST : SILENCE };
      const of = await registry.cellarsOfChat(chat);
      const invited = await invitedTo(message, of);
      if (invited !== undefined) return { message: await placed(message, of, invited), handle };
      const left = await leftBy(message, of);
      if (!mayUse(rule, message, of))
        return { message: inChats, handle: isDanger ? keepingNothing : STRANGER };
      const isBegun = addressed !== 'direct' && !of.isKept && rule.is !== 'open' && isListed(rule, message);
      if (isBegun && addressed === 'called') await registry.joinCellar(chat, chat);
      return { message: await placed(message, of, left ?? of.present), handle };
    },
    move: async (chat, { does, cellar }) => {
      if (does === 'enter') await registry.joinCellar(chat, cellar);
      else if (does === 'leave') await registry.leave(chat, cellar);
      else await registry.switchTo(chat, cellar);
    },
    whereIs: async (chat) => {
      const now = await registry.chatNow(chat);
      const of = await registry.cellarsOfChat(now);
      return { chat: now, ...(of.cellars.length > 1 && { cellars: await placesOf(of) }) };
    },
  };
}
