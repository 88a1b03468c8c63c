import type { CellarView, Write } from '../../../../core/cellar/cellar-store.ts';
import type { Here } from '../../here.ts';
import { memoryKey } from '../../keys.ts';
import { line } from '../../lines/line.ts';
import type { Handled } from '../../ports.ts';

/** Takes a person's name off further sheets; what they noted stays, under a number. */
export async function forgetPerson(here: Here, view: CellarView): Promise<Handled> {
  const { message, settings, me } = here;
  const known = await view.person(message.person);
  const values = { number: String(me) };
  const writes: Write[] = [
    { kind: 'drop', key: memoryKey(message) },
    ...(known ? [{ kind: 'forget-person', number: me } as const] : []),
  ];
  return {
    writes,
    replies: [
      { language: settings.language, lines: [line('first', 'forgotten-person', values)], buttons: [] },
    ],
  };
}
