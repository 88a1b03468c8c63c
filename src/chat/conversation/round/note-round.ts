import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import { totalsToFetch } from '../../../core/dose/totals-to-fetch.ts';
import type { RoundSheet } from '../../attachments/round/round-sheet.ts';
import { momentText } from '../../replies/moment-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import type { Here } from '../here.ts';
import { entryRange } from '../lines/entry-range.ts';
import { line, listLine, part } from '../lines/line.ts';
import { totalPart } from '../lines/round-body.ts';
import type { Handled } from '../ports.ts';
import { noteMany } from '../press/note-many.ts';
import { replying } from '../replying.ts';
import { tellingOf } from '../telling.ts';
import { rowsToNote } from './remembered-rows.ts';

/** So many vessels are named one by one, and so many odd things told; the log has the rest. */
const MOST_NAMES = 8;
const MOST_ODD = 5;

/** "All went in": every line with an amount becomes an entry, those that were noted before are left. */
export async function noteRound(sheet: RoundSheet, here: Here, view: CellarView): Promise<Handled> {
  const { rows, near } = await rowsToNote(sheet.rows, here, view);
  const additions = rows.flatMap((one) => one.additions);
  const { notes, writes, odd, before } = await noteMany(additions, near, view);
  const numbers = notes.map((_, at) => here.nextEntry + at);
  if (notes.length === 0) {
    const entries = entryRange(before.map(({ entry }) => entry).toSorted((a, b) => a - b));
    const gone =
      before.length === 0 ? line('first', 'round-gone') : line('first', 'round-noted-none', { entries });
    return replying(here, { lines: [gone], keepsButtons: true });
  }
  const entries = entryRange(numbers);
  const isDone = new Set(rows.map(({ row }) => row.ref));
  const left = sheet.rows.filter(({ is, ref }) => is === 'amount' && !isDone.has(ref));
  const head: Line = {
    ...line('first', 'round-noted', {
      entries,
      count: notes.length === 1 ? 'one' : String(notes.length),
      when: momentText(here.message.at, tellingOf(here)),
    }),
    list: notedTotals(sheet, rows, before.length === 0),
  };
  const { writes: kept, ...said } = replying(here, {
    lines: [
      head,
      ...named(
        'round-noted-before',
        before.flatMap(({ vessels }) => vessels.map(vesselName)),
      ),
      ...named(
        'round-not-noted',
        left.map(({ name }) => name),
      ),
      ...odd.slice(0, MOST_ODD),
      line('effect', 'measure-tomorrow'),
      ...(notes.length > 1 ? [line('effect', 'round-strike-one', { entry: String(numbers[1] ?? 0) })] : []),
    ],
    buttons: [{ key: `ru:${sheet.ref}`, mark: '1', label: 'button-round-undo', values: { entries } }],
  });
  return { ...said, writes: [...writes, ...kept] };
}

/** What went in of each additive; where a part had been noted before, the lines tell. */
function notedTotals(
  { mark }: RoundSheet,
  rows: Awaited<ReturnType<typeof rowsToNote>>['rows'],
  isWhole: boolean,
): Omit<Line, 'room'>[] {
  if (!isWhole) return [part('round-noted-rest')];
  return totalsToFetch(rows.flatMap(({ row }) => row.weighed)).map((total) => totalPart(total, mark));
}

function named(key: 'round-noted-before' | 'round-not-noted', names: readonly string[]): Line[] {
  const rest = names.length - MOST_NAMES;
  return listLine('first', key, [
    ...names.slice(0, MOST_NAMES).map((name) => part('round-name', { name })),
    ...(rest > 0 ? [part('round-and-more', { count: String(rest) })] : []),
  ]);
}
