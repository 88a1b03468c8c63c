import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { Line } from '../../replies/reply.ts';
import { momentText } from '../../replies/moment-text.ts';
import { vesselNames } from '../../replies/vessel-name.ts';
import { withVessels, type Here } from '../here.ts';
import { buttonKey, readingKey } from '../keys.ts';
import { entryRange } from '../lines/entry-range.ts';
import { line } from '../lines/line.ts';
import { besideAmount, notedAmount } from '../lines/noted-amount.ts';
import type { Remembered } from '../memory.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { tellingOf } from '../telling.ts';
import { vesselsIn } from '../vessels-named.ts';
import { alreadyNoted } from './already-noted.ts';
import { doseAdditions } from './dose-additions.ts';
import { noteMany } from './note-many.ts';
import { notedBy } from './noted-by.ts';
import { undoMany } from './undo-many.ts';

/** A tap on one line of a round: the buttons of its list go on, so that the next can be tapped or its number typed. */
export async function noteTapped(ref: string, here: Here, view: CellarView): Promise<Handled> {
  const found = await rememberedHere(ref, here, view);
  if (found === undefined)
    return replying(here, { lines: [line('first', 'old-button')], keepsButtons: true });
  const near = await withVessels(here, view, vesselsIn(found.reading.fields));
  return noteEach(found, near, view, { inRound: true });
}

/**
 * The dose of a reading noted, an entry for each of its vessels, with a way to take all of them back; or, of one line among
 * many, without.
 */
export async function noteEach(
  found: Remembered,
  here: Here,
  view: CellarView,
  { inRound = false }: { readonly inRound?: boolean } = {},
): Promise<Handled> {
  const additions = doseAdditions(found, here);
  // Until a dose of several vessels came to an entry each, it came to one for all of them.
  const { standing: forAll } = await notedBy(buttonKey('dose', found.chat, found.ref), view);
  if (forAll && additions.length > 1) return alreadyNoted(forAll, here, { keepsButtons: inRound });
  const { notes, writes, odd, before } = await noteMany(additions, here, view);
  const [first] = notes;
  const [standing] = before;
  if (first === undefined) {
    if (before.length === 1 && standing) return alreadyNoted(standing, here, { keepsButtons: inRound });
    const values = { entries: entryRange(before.map(({ entry }) => entry)) };
    const said =
      standing === undefined ? line('first', 'old-button') : line('first', 'round-noted-none', values);
    return replying(here, { lines: [said], keepsButtons: inRound });
  }
  const numbers = notes.map((_, at) => here.nextEntry + at);
  const entries = entryRange(numbers);
  const amount = notedAmount(first.happening, here.memory.decimalMark ?? '.');
  const head: Line = {
    ...line('first', additions.length === 1 ? 'round-noted-line' : 'round-noted-each', {
      entry: entries,
      vessel: vesselNames(notes.flatMap(({ happening }) => happening.vessels)),
      when: momentText(here.message.at, tellingOf(here)),
    }),
    list: [...(amount ? [amount] : []), ...besideAmount(first.happening)],
  };
  const { writes: kept, ...said } = replying(here, {
    lines: [
      head,
      ...odd.slice(0, MOST_ODD),
      ...(inRound ? [] : [line('effect', 'measure-tomorrow')]),
      ...(inRound || notes.length < 2
        ? []
        : [line('effect', 'round-strike-one', { entry: String(numbers[1] ?? 0) })]),
    ],
    ...(inRound
      ? { keepsButtons: true }
      : {
          buttons: [{ key: `bu:${found.ref}`, mark: '1', label: 'button-round-undo', values: { entries } }],
        }),
  });
  return { ...said, writes: [...writes, ...kept] };
}

/** So many odd things are told at once. */
const MOST_ODD = 5;

/** What was noted for several equal vessels with one tap, taken back with one. */
export async function undoBarrels(ref: string, here: Here, view: CellarView): Promise<Handled> {
  const found = await rememberedHere(ref, here, view);
  if (found === undefined) return replying(here, { lines: [line('first', 'old-button')] });
  const vessels = vesselsIn(found.reading.fields);
  const near = await withVessels(here, view, vessels);
  // What somebody told was noted under the same keys as what a button notes.
  const keys =
    found.reading.intent === 'added'
      ? vessels.map((vessel) => buttonKey('dose', found.chat, found.ref, vessel))
      : doseAdditions(found, near).map(({ key }) => key);
  return undoMany(keys, near, view);
}

async function rememberedHere(ref: string, here: Here, view: CellarView): Promise<Remembered | undefined> {
  const kept = await view.kept(readingKey(here.message.chat, ref));
  return kept === undefined ? undefined : (JSON.parse(kept) as Remembered);
}
