import { applyEntry } from '../../../core/cellar/apply-entry.ts';
import type { LoggedEntry } from '../../../core/cellar/entry.ts';
import { holdsWine } from '../../../core/cellar/pour.ts';
import { touches } from '../../../core/cellar/touches.ts';
import type { Vessel } from '../../../core/cellar/vessel.ts';
import type { CameFrom, ChartAddition, ChartData, ChartReading, NeededStep } from './chart-data.ts';
import { neededOf } from './needed-of.ts';
import type { NeededBy } from './needed-of.ts';

/** Which vessel, what its need is reckoned by, and the legal limit of total SO2 in mg/L where one holds. */
export interface ChartOptions extends NeededBy {
  readonly vessel: string;
  readonly limit_mg_L?: number;
}

/** What is collected of one wine. */
interface WineSoFar {
  readonly readings: ChartReading[];
  readonly additions: ChartAddition[];
  readonly needed: NeededStep[];
  readonly blended: number[];
  readonly came_from?: CameFrom;
}

const newWine = (came_from?: CameFrom): WineSoFar => ({
  readings: [],
  additions: [],
  needed: [],
  blended: [],
  ...(came_from && { came_from }),
});

/**
 * What a picture of a vessel shows: the wine that is in it, since it came in; of an empty one the wine that was. Undefined
 * where no SO2 of that wine was measured. The entries are those of the vessel at least; with those of the vessels that
 * its wine came from, the pH that it brought is known too.
 */
export function chartOf(
  entries: readonly LoggedEntry[],
  { vessel: name, limit_mg_L, ...by }: ChartOptions,
): ChartData | undefined {
  const vessels = new Map<string, Vessel>();
  let [wine, isHeld] = [newWine(), false];
  for (const entry of inOrder(entries)) {
    note(vessels, entry);
    if (!touches(entry).includes(name)) continue;
    const vessel = vessels.get(name);
    const isPoured = entry.kind === 'vessel' && entry.to === name;
    if (vessel === undefined) wine = newWine();
    if (vessel === undefined || vessel.empty !== undefined) isHeld = false;
    else if (isPoured || holdsWine(vessel)) {
      if (!isHeld) wine = newWine(cameFrom(entry, name));
      if (isPoured && wine.came_from?.at !== entry.at) wine.blended.push(entry.at);
      isHeld = true;
      collect(wine, entry, neededOf(vessel, entry.at, by));
    }
  }
  const [first, ...others] = wine.readings;
  if (first === undefined) return undefined;
  const empty = vessels.get(name)?.empty;
  return {
    ...wine,
    vessel: name,
    readings: [first, ...others],
    ...(empty !== undefined && { empty }),
    ...(limit_mg_L !== undefined && { limit_mg_L }),
  };
}

/** Keeps what the vessels are after an entry. */
function note(vessels: Map<string, Vessel>, entry: LoggedEntry): void {
  const touched = touches(entry).flatMap((one): [string, Vessel][] => {
    const known = vessels.get(one);
    return known === undefined ? [] : [[one, known]];
  });
  for (const [one, vessel] of applyEntry(new Map(touched), entry)) {
    if (vessel === undefined) vessels.delete(one);
    else vessels.set(one, vessel);
  }
}

function inOrder(entries: readonly LoggedEntry[]): LoggedEntry[] {
  return entries
    .filter((entry) => entry.struck === undefined && entry.kind !== 'correction')
    .toSorted((a, b) => a.at - b.at || a.entry - b.entry);
}

/** Where wine came from that was moved into the vessel; `undefined` for whatever else begins what is known of it. */
function cameFrom(entry: LoggedEntry, name: string): CameFrom | undefined {
  const isMoved = entry.kind === 'vessel' && entry.event === 'moved' && entry.to === name;
  return isMoved ? { at: entry.at, vessels: entry.vessels } : undefined;
}

function collect({ readings, additions, needed }: WineSoFar, entry: LoggedEntry, step: NeededStep): void {
  const { at } = entry;
  if (entry.kind === 'reading') {
    const { free_mg_L, total_mg_L } = entry;
    const measured = {
      ...(free_mg_L !== undefined && { free_mg_L }),
      ...(total_mg_L !== undefined && { total_mg_L }),
    };
    if (Object.keys(measured).length > 0) readings.push({ at, ...measured });
  } else if (entry.kind === 'addition') {
    const { added_mg_L } = entry;
    additions.push({ at, ...(added_mg_L !== undefined && { added_mg_L }) });
  }
  const last = needed.at(-1);
  if (last === undefined || !isSame(last, step)) needed.push(step);
}

function isSame(one: NeededStep, other: NeededStep): boolean {
  if ('nothing' in one || 'nothing' in other)
    return 'nothing' in one && 'nothing' in other && one.nothing === other.nothing;
  return one.needed_mg_L === other.needed_mg_L && one.ph_at === other.ph_at;
}
