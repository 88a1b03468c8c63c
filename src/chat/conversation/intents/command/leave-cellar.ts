import type { CellarView } from '../../../../core/cellar/cellar-store.ts';
import { cellarPart } from '../../cellar/cellar-name.ts';
import { cellarsCalled } from '../../cellar/cellars-called.ts';
import { keepingRoster } from '../../cellar/keeping-roster.ts';
import { keepersOf } from '../../cellar/role-of.ts';
import { withoutChatsOf } from '../../cellar/without-chats-of.ts';
import type { Here } from '../../here.ts';
import { line } from '../../lines/line.ts';
import { nameText } from '../../people.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { goTo, notOne, placeHere } from './cellars.ts';
import { everybody } from './people.ts';

/**
 * Somebody is out of a cellar from now on, and so is their private chat; what they noted stays. The last keeper cannot go,
 * as then nobody could let anyone in again.
 */
export async function leaveCellar(said: string, here: Here, view: CellarView): Promise<Handled> {
  const { message, me, roster } = here;
  const { cellar } = message;
  const present = await placeHere(here, view);
  const found = cellarsCalled(said, message.cellars ?? [present]);
  const [only, another] = found;
  if (only === undefined || another !== undefined) return notOne(said, found, here);
  // The edge takes a message to the cellar that it names; where it did not, that is the first step.
  if (only.cellar !== cellar) return goTo(said, here, view);
  const people = await everybody(here, view);
  const keepers = keepersOf(roster, people);
  if (keepers.length === 1 && keepers[0]?.number === me) {
    const name = nameText(me, { people: new Map(people.map((one) => [one.number, one])) });
    return replying(here, { lines: [line('first', 'last-keeper', { name })] });
  }
  const lines = [{ ...line('first', 'cellar-left'), list: [cellarPart(present)] }];
  const { writes, ...saying } = replying(here, { lines });
  const roles = { ...roster.roles, [me]: 'none' as const };
  // A group stays where it is when one of its people goes.
  const isAlone = (message.addressed ?? 'direct') === 'direct';
  return {
    ...saying,
    writes: [keepingRoster({ ...withoutChatsOf(me, roster), roles }), ...writes],
    ...(isAlone && { place: { does: 'leave', cellar } as const }),
  };
}
