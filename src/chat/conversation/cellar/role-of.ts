import type { CellarView, Person } from '../../../core/cellar/cellar-store.ts';
import { ROSTER_KEY } from '../keys.ts';
import type { IncomingMessage } from '../ports.ts';
import { readRoster, type Role, type Roster } from './roster.ts';

/** What of a message decides about its role. */
type Writer = Pick<IncomingMessage, 'chat' | 'trusted' | 'isJoined'>;

/**
 * What a person may do where they write; undefined where they may do nothing. The first person of a cellar is its keeper,
 * everybody else who writes in a chat of it is a hand, unless told otherwise.
 *
 * @param me the number of the person
 */
export function roleOf(roster: Roster, me: number, { chat, trusted, isJoined }: Writer): Role | undefined {
  if (trusted) return 'keeper';
  const ofChat = isJoined ? roster.chats[chat] : (roster.chats[chat] ?? 'hand');
  if (ofChat === undefined) return undefined;
  return roleOfPerson(roster, me) ?? (roster.roles[me] === 'none' ? undefined : ofChat);
}

/** What a person may do by themselves, in whatever chat; undefined where that depends on the chat or is nothing. */
function roleOfPerson({ roles, firstKeeper }: Roster, person: number): Role | undefined {
  const told = roles[person];
  if (told !== undefined) return told === 'none' ? undefined : told;
  return person === firstKeeper ? 'keeper' : undefined;
}

/** What people may do, each with their role, without those who were removed. */
export function rolesOf(
  roster: Roster,
  people: readonly Person[],
): { readonly person: Person; readonly role: Role }[] {
  return people.flatMap((person) =>
    roster.roles[person.number] === 'none'
      ? []
      : [{ person, role: roleOfPerson(roster, person.number) ?? 'hand' }],
  );
}

/** The keepers of a cellar. */
export function keepersOf(roster: Roster, people: readonly Person[]): Person[] {
  return rolesOf(roster, people).flatMap(({ person, role }) => (role === 'keeper' ? [person] : []));
}

/** The role of somebody in a cellar that is only looked at; undefined for those who are new in it. */
export async function roleIn(
  view: CellarView,
  message: Writer & Pick<IncomingMessage, 'person'>,
): Promise<Role | undefined> {
  const known = await view.person(message.person);
  if (known === undefined) return undefined;
  return roleOf(readRoster(await view.kept(ROSTER_KEY)), known.number, message);
}
