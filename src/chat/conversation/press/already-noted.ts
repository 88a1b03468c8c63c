import type { LoggedEntry } from '../../../core/cellar/entry.ts';
import { momentText } from '../../replies/moment-text.ts';
import { vesselNames } from '../../replies/vessel-name.ts';
import type { Here } from '../here.ts';
import { line } from '../lines/line.ts';
import { whoText } from '../people.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { tellingOf } from '../telling.ts';

/** What is said where a button was pressed before. */
export function alreadyNoted(
  entry: LoggedEntry,
  here: Here,
  { keepsButtons = false }: { readonly keepsButtons?: boolean } = {},
): Handled {
  const values = {
    entry: String(entry.entry),
    vessel: vesselNames(entry.vessels),
    when: momentText(entry.noted_at, tellingOf(here)),
    who: whoText(entry.by, here),
  };
  return replying(here, { lines: [line('first', 'already-noted', values)], keepsButtons });
}
