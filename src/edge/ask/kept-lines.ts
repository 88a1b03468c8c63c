import type { CellarStore, CellarView } from '../../core/cellar/cellar-store.ts';
import { SETTINGS_KEY } from '../../chat/conversation/keys.ts';
import { DEFAULT_SETTINGS, mergeSettings } from '../../chat/conversation/settings.ts';
import { zoneOf } from '../../chat/conversation/zone.ts';
import { tellEntry, tellVessel, type KeptTelling } from './tell-kept.ts';

/** Which part of what is kept is wanted. */
export type KeptPart = 'log' | 'vessels';

/** All entries, or all vessels, of the cellars of a file, the entries as they were noted one after the other. */
export async function* keptLines(
  reader: Pick<CellarStore, 'look' | 'cellars'>,
  part: KeptPart,
): AsyncGenerator<object> {
  const cellars = await reader.cellars();
  for (const cellar of cellars) {
    const naming = cellars.length > 1 ? { cellar } : {};
    const telling = { ...(await reader.look(cellar, tellingOf)), ...naming };
    yield* part === 'log' ? entriesOf(cellar, telling, reader) : vesselsOf(cellar, telling, reader);
  }
}

async function tellingOf(view: CellarView): Promise<KeptTelling> {
  const settings = mergeSettings(DEFAULT_SETTINGS, await view.kept(SETTINGS_KEY));
  const people = new Map((await view.people()).map((person) => [person.number, person]));
  return { zone: zoneOf(settings), people };
}

/** One by one, as a log may be longer than the memory. What is noted meanwhile comes too, or comes the next time. */
async function* entriesOf(
  cellar: string,
  telling: KeptTelling,
  reader: Pick<CellarStore, 'look'>,
): AsyncGenerator<object> {
  const end = await reader.look(cellar, (view) => view.nextEntry());
  for (let number = 1; number < end; number += 1) {
    const entry = await reader.look(cellar, (view) => view.entry(number));
    if (entry) yield tellEntry(entry, telling);
  }
}

async function* vesselsOf(
  cellar: string,
  telling: KeptTelling,
  reader: Pick<CellarStore, 'look'>,
): AsyncGenerator<object> {
  for (const vessel of await reader.look(cellar, (view) => view.vessels())) yield tellVessel(vessel, telling);
}
