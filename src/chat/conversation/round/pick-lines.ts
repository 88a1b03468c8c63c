import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { RoundSheet } from '../../attachments/round/round-sheet.ts';
import type { Button, Line } from '../../replies/reply.ts';
import type { Here } from '../here.ts';
import { line } from '../lines/line.ts';
import type { Handled } from '../ports.ts';
import { notedBy } from '../press/noted-by.ts';
import { replying } from '../replying.ts';
import { rowsToNote } from './remembered-rows.ts';
import { rowButton } from './round-buttons.ts';

/** So many lines have their buttons in one message: more would be no list to tap on a phone. */
const A_PAGE = 8;

/** The lines of a round some at a time, each with a button; what was noted before is told and has none. */
export async function pickLines(
  sheet: RoundSheet,
  place: number,
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const { rows } = await rowsToNote(sheet.rows, here, view);
  const pages = Math.max(1, Math.ceil(rows.length / A_PAGE));
  const from = (place % pages) * A_PAGE;
  const lines: Line[] = [];
  const buttons: Omit<Button, 'mark'>[] = [];
  for (const { row, additions } of rows.slice(from, from + A_PAGE)) {
    const entries: number[] = [];
    for (const { key } of additions) {
      const { standing } = await notedBy(key, view);
      if (standing) entries.push(standing.entry);
    }
    const [entry] = entries;
    if (entry === undefined || entries.length < additions.length) buttons.push(rowButton(row, sheet.mark));
    else lines.push(line('first', 'round-pick-noted', { vessel: row.name, entry: String(entry) }));
  }
  const all = String(rows.length);
  const to = String(Math.min(rows.length, from + A_PAGE));
  const next = { key: `rl:${sheet.ref}:${(place + 1) % pages}`, label: 'button-round-next', values: {} };
  return replying(here, {
    lines: [line('first', 'round-pick', { from: String(from + 1), to, all }), ...lines],
    buttons: [...buttons, ...(pages > 1 ? [next] : [])].map((one, at) => ({ ...one, mark: String(at + 1) })),
  });
}
