import type { CellarView, Write } from '../../../../core/cellar/cellar-store.ts';
import type { Here } from '../../here.ts';
import { keepingRoster } from '../../cellar/keeping-roster.ts';
import { keepersOf, rolesOf } from '../../cellar/role-of.ts';
import { memoryKey } from '../../keys.ts';
import { line } from '../../lines/line.ts';
import type { Handled } from '../../ports.ts';
import { nameText } from '../../people.ts';
import { replying } from '../../replying.ts';

/** Takes a person's name off further sheets; what they noted stays, under a number. */
export async function forgetPerson(here: Here, view: CellarView): Promise<Handled> {
  const { message, settings, me, roster } = here;
  const known = await view.person(message.person);
  const people = await view.people();
  const keepers = keepersOf(roster, people);
  const isLast = keepers.length === 1 && keepers[0]?.number === me;
  const others = rolesOf(roster, people).filter(
    ({ person }) => person.number !== me && person.name !== undefined,
  );
  if (isLast && others.length > 0)
    return replying(here, {
      lines: [
        line('first', 'last-keeper', {
          name: nameText(me, { people: new Map(people.map((one) => [one.number, one])) }),
        }),
      ],
    });
  // Whoever writes next is the first person of the cellar again.
  const next = Math.max(me, ...people.map(({ number }) => number)) + 1;
  const role = {
    ...roster,
    roles: { ...roster.roles, [me]: 'none' as const },
    ...(isLast && { firstKeeper: next }),
  };
  const values = { number: String(me) };
  // Nobody becomes more than a guest by coming again as somebody new; guests have noted nothing.
  const forgetting: Write[] =
    here.role === 'guest'
      ? [{ kind: 'person', id: message.person, number: me }]
      : [{ kind: 'forget-person', number: me }, keepingRoster(role)];
  const writes: Write[] = [{ kind: 'drop', key: memoryKey(message) }, ...(known ? forgetting : [])];
  return {
    writes,
    replies: [
      { language: settings.language, lines: [line('first', 'forgotten-person', values)], buttons: [] },
    ],
  };
}
