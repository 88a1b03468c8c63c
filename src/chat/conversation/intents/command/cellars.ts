import type { CellarView } from '../../../../core/cellar/cellar-store.ts';
import { cellarPart, placeOf } from '../../cellar/cellar-name.ts';
import { cellarsCalled } from '../../cellar/cellars-called.ts';
import { keepingRoster } from '../../cellar/keeping-roster.ts';
import type { Here } from '../../here.ts';
import { line } from '../../lines/line.ts';
import type { CellarPlace, Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';

/** Goes to another of the chat's cellars; without a name, says in which it is and which others there are. */
export async function goTo(said: string | undefined, here: Here, view: CellarView): Promise<Handled> {
  const { cellar, cellars = [] } = here.message;
  if (said === undefined) return listCellars(cellars, here, view);
  const found = cellarsCalled(said, cellars);
  const [only, another] = found;
  if (only !== undefined && another === undefined) {
    const key = only.cellar === cellar ? 'at-already' : 'at-now';
    const lines = [{ ...line('first', key), list: [cellarPart(only)] }];
    const place = { does: 'switch', cellar: only.cellar } as const;
    return { ...replying(here, { lines }), place };
  }
  return notOne(said, found, here);
}

/** No cellar goes by a name, or several do. */
export function notOne(said: string, found: readonly CellarPlace[], here: Here): Handled {
  const { cellars = [] } = here.message;
  // Without a capital, and where there is but one cellar, it may be no name at all.
  if (cellars.length < 2 || (found.length === 0 && !/^\p{Lu}/u.test(said)))
    return replying(here, { lines: [line('first', 'chat-other')] });
  const key = found.length === 0 ? 'at-unknown' : 'at-which';
  const list = (found.length === 0 ? cellars : found).map(cellarPart);
  return replying(here, { lines: [{ ...line('first', key, { text: said }), list }] });
}

async function listCellars(cellars: readonly CellarPlace[], here: Here, view: CellarView): Promise<Handled> {
  const { cellar } = here.message;
  const place = await placeHere(here, view);
  const present = { ...line('first', 'at-here'), list: [cellarPart(place)] };
  const others = cellars.filter((one) => one.cellar !== cellar).map(cellarPart);
  if (others.length === 0) return replying(here, { lines: [present, line('effect', 'at-only')] });
  return replying(here, { lines: [present, { ...line('first', 'at-others'), list: others }] });
}

/** The cellar in which something was said. */
export async function placeHere({ message, roster }: Here, view: CellarView): Promise<CellarPlace> {
  const { cellar, cellars = [], title, isJoined } = message;
  const own = { roster, people: await view.people(), title: isJoined ? undefined : title };
  return cellars.find((one) => one.cellar === cellar) ?? placeOf(cellar, own);
}

/** Names the cellar. */
export function nameCellar(name: string, here: Here): Handled {
  const { writes, ...said } = replying(here, { lines: [line('first', 'cellar-named', { name })] });
  return { ...said, writes: [keepingRoster({ ...here.roster, name }), ...writes] };
}

/** Whether readings are answered in a group that were not said to the bot. */
export function readAlong(on: boolean, here: Here): Handled {
  const values = { on: on ? 'on' : 'off' };
  const { writes, ...said } = replying(here, { lines: [line('first', 'reads-along', values)] });
  return { ...said, writes: [keepingRoster({ ...here.roster, readsAlong: on }), ...writes] };
}
