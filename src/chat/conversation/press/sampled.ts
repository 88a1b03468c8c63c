import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { Reading } from '../../reader/understood.ts';
import { answerSingle } from '../answer-single.ts';
import type { Here } from '../here.ts';
import { buttonKey } from '../keys.ts';
import type { Remembered } from '../memory.ts';
import { noting, type Note } from '../note.ts';
import { lastAdditionAt } from '../notes-of-reading.ts';
import type { Handled } from '../ports.ts';
import { vesselsIn } from '../vessels-named.ts';
import { whenOf } from '../when.ts';

/** What each button says of the sample. */
const SAYS = { gb: 'before', ga: 'after', gd: 'dose' } as const;

/**
 * Whether the sample was taken before or after the last addition, or that a dose is wanted all the same. A sample from
 * before has been noted at the wrong time: that entry is taken back and noted anew.
 */
export async function answerSampled(
  found: Remembered,
  does: keyof typeof SAYS,
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const { memory, settings } = here;
  const reading: Reading = { ...found.reading, sampled: SAYS[does] };
  const moved = does === 'gb' ? await notedEarlier(found, reading, here, view) : [];
  const later = { ...here, nextEntry: here.nextEntry + moved.length };
  const { writes, replies } = answerSingle(
    { readings: [reading], shared: {}, language: settings.language, decimalMark: memory.decimalMark ?? '.' },
    later,
  );
  return { writes: [...noting(here, moved), ...writes], replies };
}

/** The reading that was noted with the message, taken back, and noted at the time it is of. */
async function notedEarlier(
  { ref, chat }: Remembered,
  reading: Reading,
  here: Here,
  view: CellarView,
): Promise<Note[]> {
  const { event } = reading;
  const entries = event === undefined ? [] : await view.entriesOfKeys(event);
  const entry = entries.find(({ kind, struck }) => kind === 'reading' && struck === undefined);
  const last = lastAdditionAt(vesselsIn(reading.fields), here);
  if (entry?.kind !== 'reading' || last === undefined || entry.at < last) return [];
  const {
    entry: corrects,
    key: _key,
    at: _at,
    noted_at: _noted,
    by: _by,
    struck: _struck,
    ...happening
  } = entry;
  const { at } = here.message;
  return [
    {
      happening: { kind: 'correction', vessels: entry.vessels, corrects, reason: 'sampled-before' },
      at,
      key: `strike ${corrects}`,
    },
    { happening, at: whenOf(reading, here, last).at, key: buttonKey('sampled', chat, ref) },
  ];
}
