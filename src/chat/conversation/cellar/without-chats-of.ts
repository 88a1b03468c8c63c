import type { Roster } from './roster.ts';

/** Nothing comes into the private chat of somebody who is out of the cellar. */
export function withoutChatsOf(number: number, roster: Roster): Roster {
  const others = ([chat]: readonly [string, unknown]): boolean => roster.owners[chat] !== number;
  return {
    ...roster,
    chats: Object.fromEntries(Object.entries(roster.chats).filter(others)),
    owners: Object.fromEntries(Object.entries(roster.owners).filter(others)),
  };
}
