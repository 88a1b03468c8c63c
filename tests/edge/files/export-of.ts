import { makeSay } from '../../../src/chat/replies/say.ts';
import type { Person } from '../../../src/core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../../src/core/cellar/entry.ts';
import { sayExportWords } from '../../../src/edge/files/say-export-words.ts';
import { writeGiven } from '../../../src/edge/files/write-given.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { PEOPLE } from '../../chat/attachments/any-log.ts';

/** The sentences as the program says them. */
export const say = makeSay(loadLocales());

/** How an export is wanted, where it is not the usual. */
export interface Wanted {
  readonly format?: 'csv' | 'xlsx';
  readonly decimalMark?: '.' | ',';
  readonly people?: readonly Person[];
  readonly of?: 'stock';
}

/** The bytes of an export of some entries, made here and not in a thread of its own. */
export function exportOf(
  entries: readonly LoggedEntry[],
  { format = 'csv', decimalMark = '.', people = PEOPLE, of }: Wanted = {},
): Promise<Uint8Array> {
  const words = sayExportWords(
    say,
    'en',
    entries.map(({ by }) => by),
  );
  const wanted = of === undefined ? {} : { of };
  const source = { entries, wanted, people, zone: 'Europe/Madrid', words };
  return writeGiven({ source, format, decimalMark });
}
