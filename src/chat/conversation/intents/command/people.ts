import type { CellarView, Person } from '../../../../core/cellar/cellar-store.ts';
import type { SaidRole } from '../../../reader/command.ts';
import type { Line } from '../../../replies/reply.ts';
import { keepingRoster } from '../../cellar/keeping-roster.ts';
import { peopleCalled } from '../../cellar/people-called.ts';
import { keepersOf, rolesOf } from '../../cellar/role-of.ts';
import { withoutChatsOf } from '../../cellar/without-chats-of.ts';
import type { Here } from '../../here.ts';
import { line, part } from '../../lines/line.ts';
import { nameText } from '../../people.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';

/** So many people stand in one message; the others are counted. */
const MOST_LINES = 40;

/** Everybody in the cellar, who writes included, with what they may do. */
export async function everybody(here: Here, view: CellarView): Promise<readonly Person[]> {
  const people = await view.people();
  const { name } = here.message;
  const me = { number: here.me, ...(name !== undefined && { name }) };
  return people.some(({ number }) => number === here.me) ? people : [...people, me];
}

/** The people of the cellar and what each may do. */
export async function listPeople(here: Here, view: CellarView): Promise<Handled> {
  const rows = rolesOf(here.roster, await everybody(here, view)).map(({ person, role }): Line => {
    const name = nameText(person.number, { people: new Map([[person.number, person]]) });
    return line('first', 'people-line', { name, role, me: person.number === here.me ? 'me' : 'other' });
  });
  const more = rows.length > MOST_LINES ? [line('first', 'list-more', countOf(rows.length))] : [];
  return replying(here, {
    lines: [
      line('first', 'people-head'),
      ...rows.slice(0, MOST_LINES),
      ...more,
      line('effect', 'people-how'),
    ],
  });
}

function countOf(count: number): Record<'count', string> {
  return { count: String(count - MOST_LINES) };
}

/** Gives somebody a role, or takes every role from them; a cellar never loses its last keeper. */
export async function changeRole(
  who: string,
  to: SaidRole | 'none',
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const { roster } = here;
  const people = await everybody(here, view);
  const known = rolesOf(roster, people);
  // Somebody who was removed can be given a role again.
  const among = to === 'none' ? known.map(({ person }) => person) : people;
  const found = peopleCalled(who, among);
  const [person, another] = found;
  if (person === undefined)
    return unknown(
      who,
      known.map(({ person: one }) => one),
      here,
    );
  if (another !== undefined) return which(who, found, here);
  const name = nameText(person.number, { people: new Map([[person.number, person]]) });
  const isKeeper = keepersOf(roster, people).some(({ number }) => number === person.number);
  if (isKeeper && to !== 'keeper' && keepersOf(roster, people).length === 1)
    return replying(here, { lines: [line('first', 'last-keeper', { name })] });
  const role = known.find(({ person: { number } }) => number === person.number)?.role;
  const values = { name, role: to };
  if (role === to) return replying(here, { lines: [line('first', 'role-same', values)] });
  const { writes, ...said } = replying(here, { lines: [line('first', 'role-changed', values)] });
  const roles = { ...roster.roles, [person.number]: to };
  const next = to === 'none' ? withoutChatsOf(person.number, roster) : roster;
  return { ...said, writes: [keepingRoster({ ...next, roles }), ...writes] };
}

/** Without a capital it may be no name at all: then it was talk. */
function unknown(who: string, people: readonly Person[], here: Here): Handled {
  if (!/^(\p{Lu}|person \d)/u.test(who)) return replying(here, { lines: [line('first', 'chat-other')] });
  const list = people.slice(0, MOST_LINES).map(({ number, name }) => called(number, name));
  return replying(here, { lines: [{ ...line('first', 'person-unknown', { text: who }), list }] });
}

function which(who: string, people: readonly Person[], here: Here): Handled {
  const list = people.map(({ number }) => called(number, undefined));
  return replying(here, { lines: [{ ...line('first', 'person-which', { text: who }), list }] });
}

function called(number: number, name: string | undefined): Omit<Line, 'room'> {
  return part('person-called', { name: name ?? 'none', number: String(number) });
}
