import type { Entry, LoggedEntry } from '../../../core/cellar/entry.ts';
import type { Ledger } from './ledger.ts';

const LONGEST_KEY = 200;

/**
 * The last guard of the log; the conversation has looked before. An event never makes two entries, and only an entry
 * that stands can be taken back.
 *
 * @throws RangeError or TypeError
 */
export async function checkEntries(ledger: Ledger, entries: readonly Entry[]): Promise<void> {
  const keys = new Set<string>();
  for (const { key, at, noted_at } of entries) {
    if (key === '' || key.length > LONGEST_KEY) throw new RangeError(`no key of an entry: ${key}`);
    if (!key.isWellFormed()) throw new TypeError(`a key that is no text: ${JSON.stringify(key)}`);
    if (!Number.isSafeInteger(at) || !Number.isSafeInteger(noted_at))
      throw new RangeError(`no time of an entry: ${at}, ${noted_at}`);
    if (keys.has(key)) throw new RangeError(`two entries of one key: ${key}`);
    keys.add(key);
  }
  const [taken] = await ledger.keysTaken([...keys]);
  if (taken !== undefined) throw new RangeError(`the key has an entry already: ${taken}`);
  await checkCorrections(ledger, entries);
}

async function checkCorrections(ledger: Ledger, entries: readonly Entry[]): Promise<void> {
  const struck = new Set<number>();
  for (const entry of entries) {
    if (entry.kind !== 'correction') continue;
    const { corrects } = entry;
    const named: LoggedEntry | undefined =
      entries.find((one) => one.entry === corrects && one.entry < entry.entry) ??
      (await ledger.entry(corrects));
    if (named === undefined) throw new RangeError(`no entry ${corrects} to take back`);
    if (named.kind === 'correction') throw new RangeError(`entry ${corrects} is a correction itself`);
    if (named.struck !== undefined || struck.has(corrects))
      throw new RangeError(`entry ${corrects} is taken back already`);
    struck.add(corrects);
  }
}
