import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { Here } from '../here.ts';
import { line, part } from '../lines/line.ts';
import { nameText } from '../people.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { keepersOf } from './role-of.ts';
import type { Role } from './roster.ts';

/** What somebody gets who may not do a thing: who may, by name. */
export async function refused(needed: Role, here: Here, view: CellarView): Promise<Handled> {
  const people = await view.people();
  const byNumber = new Map(people.map((person) => [person.number, person]));
  const list = keepersOf(here.roster, people).map(({ number }) =>
    part('keeper-called', { name: nameText(number, { people: byNumber }) }),
  );
  const values = { role: needed, keepers: list.length === 0 ? 'none' : 'some' };
  return replying(here, { lines: [{ ...line('first', 'not-allowed', values), list }], keepsButtons: true });
}
