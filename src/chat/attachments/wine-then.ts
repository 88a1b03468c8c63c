import { applyEntry } from '../../core/cellar/apply-entry.ts';
import type { LoggedEntry } from '../../core/cellar/entry.ts';
import { touches } from '../../core/cellar/touches.ts';
import type { Vessel } from '../../core/cellar/vessel.ts';

/** What was known of the wine that an entry is about, when it happened; of several vessels each told once. */
export interface WineThen {
  readonly lot?: string;
  /** Colour, sweetness or sparkle, product: by the names that entries have for them. */
  readonly wine?: string;
}

/**
 * What was known of the wine at each entry, by the entry's number. It follows from the entries alone, so they must
 * begin where the cellar's log does; what was taken back tells nothing of other entries.
 */
export function wineThen(entries: readonly LoggedEntry[]): ReadonlyMap<number, WineThen> {
  const vessels = new Map<string, Vessel>();
  const then = new Map<number, WineThen>();
  for (const entry of entries.toSorted((a, b) => a.at - b.at || a.entry - b.entry)) {
    const before = entry.vessels.map((name) => vessels.get(name));
    if (entry.struck === undefined && entry.kind !== 'correction') {
      const names = touches(entry);
      const touched = new Map(names.flatMap((name) => vesselOf(vessels, name)));
      for (const [name, vessel] of applyEntry(touched, entry)) {
        if (vessel === undefined) vessels.delete(name);
        else vessels.set(name, vessel);
      }
    }
    const after = entry.vessels.map((name) => vessels.get(name));
    then.set(entry.entry, {
      ...once('lot', after, before, lotOf),
      ...once('wine', after, before, wineOf),
    });
  }
  return then;
}

const vesselOf = (vessels: ReadonlyMap<string, Vessel>, name: string): [string, Vessel][] => {
  const vessel = vessels.get(name);
  return vessel === undefined ? [] : [[name, vessel]];
};

/** What the wine is called after the entry; before it where the wine went away by it. */
function once<K extends keyof WineThen>(
  key: K,
  after: readonly (Vessel | undefined)[],
  before: readonly (Vessel | undefined)[],
  tell: (vessel: Vessel) => string | undefined,
): WineThen {
  const told = after.flatMap((vessel, i) => {
    const was = before[i];
    return (vessel && tell(vessel)) ?? (was && tell(was)) ?? [];
  });
  return told.length === 0 ? {} : { [key]: [...new Set(told)].join(' / ') };
}

const lotOf = (vessel: Vessel): string | undefined => vessel.lot?.value;

function wineOf({ traits }: Vessel): string | undefined {
  const words = [traits.style, traits.category, traits.product].flatMap((known) => known?.value ?? []);
  return words.length === 0 ? undefined : words.join(', ');
}
