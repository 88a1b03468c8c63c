import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { Here } from '../here.ts';
import { inviteKey } from '../keys.ts';
import { line } from '../lines/line.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import type { Handled, PlaceChange } from '../ports.ts';
import { cellarPart, placeOf } from './cellar-name.ts';
import { readCode } from './code.ts';
import type { Invitation } from './invitation.ts';
import { keepingRoster } from './keeping-roster.ts';
import { refused } from './refused.ts';
import { higherRole, type Role, type Roster } from './roster.ts';

/**
 * A code is used: the person and the chat are in the cellar from now on, once. The same message again finds what it has
 * done; nobody loses what they might do before.
 */
export async function join(code: string, here: Here, view: CellarView): Promise<Handled> {
  const { message, me, roster } = here;
  const { chat, person, cellar } = message;
  const read = readCode(code);
  const key = inviteKey(read?.secret ?? '');
  // The edge takes a group nowhere else but for its keepers.
  const isGroup = (message.addressed ?? 'direct') !== 'direct';
  if (read?.cellar !== cellar && isGroup && here.role !== 'keeper') return refused('keeper', here, view);
  const kept = read?.cellar === cellar ? await view.kept(key) : undefined;
  if (kept === undefined) return turnedAway('join-unknown', here);
  const invitation = JSON.parse(kept) as Invitation;
  const place: PlaceChange = { does: 'enter', cellar };
  if (invitation.usedBy !== undefined) {
    const isMine = invitation.usedBy === person && invitation.usedIn === chat;
    return isMine && here.role !== undefined
      ? { ...(await welcome('joined', here.role, here, view)), place }
      : turnedAway('join-used', here);
  }
  const role = higherRole(roleBefore(here), invitation.role);
  if (role === here.role) return { ...(await welcome('joined-before', role, here, view)), place };
  const isPrivate = message.isJoined && !isGroup;
  const next: Roster = {
    ...roster,
    roles: { ...roster.roles, [me]: role },
    owners: isPrivate ? { ...roster.owners, [chat]: me } : roster.owners,
    chats: message.isJoined
      ? { ...roster.chats, [chat]: higherRole(roster.chats[chat], invitation.role) }
      : roster.chats,
  };
  const used: Invitation = { ...invitation, usedBy: person, usedIn: chat };
  const said = await welcome('joined', role, here, view);
  return {
    ...said,
    place,
    writes: [
      keepingRoster(next),
      { kind: 'keep', key, text: JSON.stringify(used), until: invitation.until },
      ...said.writes,
    ],
  };
}

/** What the person might do in this cellar before, in a chat of it or by themselves. */
function roleBefore({ roster, me, role, message }: Here): Role | undefined {
  const told = roster.roles[me];
  if (told === 'none') return undefined;
  return told ?? (me === roster.firstKeeper ? 'keeper' : message.isJoined ? undefined : role);
}

async function welcome(
  key: 'joined' | 'joined-before',
  role: Role,
  { settings, roster, message }: Here,
  view: CellarView,
): Promise<Handled> {
  const { cellar, title, isJoined } = message;
  const people = await view.people();
  const place = placeOf(cellar, { roster, people, title: isJoined ? undefined : title });
  const lines = [
    { ...line('first', key, { role }), list: [cellarPart(place)] },
    line('effect', 'joined-how', { role }),
  ];
  return { writes: [], replies: [{ language: settings.language, lines, buttons: [] }] };
}

/** Nothing is kept of somebody who comes with a code that is none. */
function turnedAway(key: SentenceKey, { settings, role, message }: Here): Handled {
  const lines = [line('first', key)];
  const isStranded = role === undefined && message.isJoined;
  return {
    writes: [],
    replies: [{ language: settings.language, lines, buttons: [] }],
    ...(isStranded && { place: { does: 'leave', cellar: message.cellar } as const }),
  };
}
