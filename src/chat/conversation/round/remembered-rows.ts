import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { RoundRow } from '../../attachments/round/round-sheet.ts';
import { withVessels, type Here } from '../here.ts';
import { readingKey } from '../keys.ts';
import type { Remembered } from '../memory.ts';
import { doseAdditions, type KeyedAddition } from '../press/dose-additions.ts';

/** A row of a round with the additions that its dose comes to. */
export interface RowToNote {
  readonly row: RoundRow;
  readonly additions: readonly KeyedAddition[];
}

/** The rows of a round that may be noted, with their additions, and what is known of their vessels. */
export async function rowsToNote(
  rows: readonly RoundRow[],
  here: Here,
  view: CellarView,
): Promise<{ readonly rows: readonly RowToNote[]; readonly near: Here }> {
  const wanted = rows.filter(({ mayBeNoted }) => mayBeNoted);
  const { chat } = here.message;
  const kept = await view.keptOf(wanted.map(({ ref }) => readingKey(chat, ref)));
  const near = await withVessels(
    here,
    view,
    wanted.flatMap(({ vessels }) => vessels),
  );
  const found = wanted.flatMap((row) => {
    const text = kept.get(readingKey(chat, row.ref));
    if (text === undefined) return [];
    return [{ row, additions: doseAdditions(JSON.parse(text) as Remembered, near) }];
  });
  return { rows: found, near };
}
