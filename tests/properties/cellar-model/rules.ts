/**
 * The rules of the log and of the vessels, stated once more and as plainly as can be: a list of all that was ever said,
 * and everything else worked out from it each time. It shares nothing with the program.
 */

/** Something that was noted, as whoever said it would put it. Litres, grams, mg/L, milliseconds since 1970. */
export type Said =
  | { readonly is: 'addition'; readonly vessel: string; readonly mass_g: number; readonly order?: number }
  | {
      readonly is: 'reading';
      readonly vessel: string;
      readonly ph?: number;
      readonly free_mg_L?: number;
      readonly volume_L?: number;
      readonly stage?: 'over';
    }
  | { readonly is: 'order'; readonly vessel: string; readonly mass_g: number }
  | {
      readonly is: 'moved' | 'blended';
      readonly vessel: string;
      readonly to: string;
      readonly volume_L?: number;
    }
  | { readonly is: 'racked'; readonly vessel: string; readonly volume_L?: number }
  | { readonly is: 'told'; readonly vessel: string; readonly volume_L: number }
  | { readonly is: 'stage'; readonly vessel: string; readonly stage: 'malolactic' | 'over' }
  | { readonly is: 'topped' | 'acid' | 'emptied' | 'forgotten'; readonly vessel: string }
  | { readonly is: 'correction'; readonly vessel: string; readonly corrects: number };

/** The same with what the log adds: its number, when it happened, when and by whom it was noted. */
export type Noted = Said & {
  readonly entry: number;
  readonly at: number;
  readonly noted_at: number;
  readonly by: string;
};

/** A fact about a vessel: its value while it is known, `void` once an event has made it another. */
export type Fact = number | 'void' | undefined;

/** What is known of a vessel. */
export interface Standing {
  readonly isEmpty: boolean;
  readonly ph: Fact;
  readonly volume_L: Fact;
  readonly stage: 'malolactic' | 'over' | undefined;
  /** What went into its wine, and when. */
  readonly additions: readonly { readonly entry: number; readonly at: number }[];
  /** Those since the last measured free SO2. */
  readonly unlanded: readonly number[];
  readonly wasMeasured: boolean;
}

const UNHEARD: Standing = {
  isEmpty: false,
  ph: undefined,
  volume_L: undefined,
  stage: undefined,
  additions: [],
  unlanded: [],
  wasMeasured: false,
};

const MINUTE_ms = 60_000;
const UNDO_ms = 15 * MINUTE_ms;

/** Void only where it was known before. */
const voided = (fact: Fact): Fact => (fact === undefined ? undefined : 'void');

/** Whether a vessel is known to hold wine. */
export function holdsWine({ isEmpty, wasMeasured, volume_L, additions, stage }: Standing): boolean {
  if (isEmpty) return false;
  return wasMeasured || volume_L !== undefined || additions.length > 0 || stage !== undefined;
}

/** What takes each entry back. */
export function strikes(log: readonly Noted[]): ReadonlyMap<number, number> {
  return new Map(log.flatMap((one) => (one.is === 'correction' ? [[one.corrects, one.entry] as const] : [])));
}

/** What holds: corrections and what they take back do not. In the order in which it happened. */
export function holding(log: readonly Noted[]): Noted[] {
  const struck = strikes(log);
  return log
    .filter((one) => one.is !== 'correction' && !struck.has(one.entry))
    .toSorted((a, b) => a.at - b.at || a.entry - b.entry);
}

/** What is known of every vessel that was heard of and not forgotten since. */
export function standings(log: readonly Noted[]): ReadonlyMap<string, Standing> {
  const all = new Map<string, Standing>();
  for (const one of holding(log)) {
    const before = all.get(one.vessel) ?? UNHEARD;
    if (one.is === 'forgotten') all.delete(one.vessel);
    else if (one.is === 'moved' || one.is === 'blended') pour(one, all);
    else all.set(one.vessel, after(before, one));
  }
  return all;
}

function after(before: Standing, one: Noted): Standing {
  switch (one.is) {
    case 'addition':
      return {
        ...before,
        additions: [...before.additions, one],
        unlanded: [...before.unlanded, one.entry],
      };
    case 'reading': {
      const staged = one.stage === undefined ? before : withStage(before, one.stage);
      return {
        ...staged,
        isEmpty: false,
        wasMeasured: true,
        ph: one.ph ?? staged.ph,
        volume_L: one.volume_L ?? staged.volume_L,
        unlanded: one.free_mg_L === undefined ? staged.unlanded : [],
      };
    }
    case 'racked':
      if (one.volume_L === undefined) return { ...before, volume_L: voided(before.volume_L) };
      return { ...before, isEmpty: false, volume_L: one.volume_L };
    case 'told':
      return { ...before, isEmpty: false, volume_L: one.volume_L };
    case 'stage':
      return { ...withStage(before, one.stage), isEmpty: false };
    case 'topped':
      return { ...before, volume_L: voided(before.volume_L) };
    case 'acid':
      return { ...before, ph: voided(before.ph) };
    case 'emptied':
      return { ...UNHEARD, isEmpty: true };
    case 'order':
    case 'moved':
    case 'blended':
    case 'forgotten':
    case 'correction':
      return before;
  }
}

/** Into malolactic, or out of it, the pH is another. */
function withStage(before: Standing, stage: 'malolactic' | 'over'): Standing {
  const isOther = stage !== before.stage && (stage === 'malolactic' || before.stage === 'malolactic');
  return { ...before, stage, ph: isOther ? voided(before.ph) : before.ph };
}

/** Wine in an empty vessel is the same wine; wine in another wine is a new one that nobody has measured. */
function pour(one: Extract<Noted, { is: 'moved' | 'blended' }>, all: Map<string, Standing>): void {
  const from = all.get(one.vessel) ?? UNHEARD;
  const to = all.get(one.to) ?? UNHEARD;
  const isBlend = one.is === 'blended' || holdsWine(to);
  all.set(one.vessel, without(from, one.volume_L));
  if (!isBlend) {
    // What a whole vessel comes to in another is only known once it is measured there.
    all.set(one.to, { ...from, isEmpty: false, volume_L: one.volume_L ?? voided(from.volume_L) });
    return;
  }
  const came_L = one.volume_L ?? from.volume_L;
  const isKnown = typeof came_L === 'number' && typeof to.volume_L === 'number';
  all.set(one.to, {
    ...to,
    isEmpty: false,
    stage: to.stage === from.stage ? to.stage : undefined,
    ph: voided(to.ph),
    volume_L: isKnown ? Number(came_L) + Number(to.volume_L) : voided(to.volume_L),
    additions: [...to.additions, ...from.additions],
    unlanded: [],
  });
}

function without(from: Standing, volume_L: number | undefined): Standing {
  if (volume_L === undefined) return { ...UNHEARD, isEmpty: true };
  if (typeof from.volume_L !== 'number') return from;
  const rest_L = from.volume_L - volume_L;
  return { ...from, volume_L: rest_L > 0 ? rest_L : 'void' };
}

/** The orders of a vessel that nobody has carried out yet: whatever happens to its wine, until it is forgotten. */
export function openOrders(log: readonly Noted[], vessel: string): number[] {
  const holds = holding(log);
  const done = new Set(holds.flatMap((one) => (one.is === 'addition' ? [one.order] : [])));
  const forgotten = holds.findLastIndex((one) => one.is === 'forgotten' && one.vessel === vessel);
  return holds
    .slice(forgotten + 1)
    .flatMap((one) =>
      one.is === 'order' && one.vessel === vessel && !done.has(one.entry) ? [one.entry] : [],
    );
}

/** The entry that "undo" takes back: one's own last one, within a quarter of an hour. */
export function undoable(log: readonly Noted[], by: string, now: number): Noted | undefined {
  const struck = strikes(log);
  const last = log.findLast((one) => one.by === by && one.is !== 'correction' && !struck.has(one.entry));
  return last !== undefined && now - last.noted_at <= UNDO_ms ? last : undefined;
}

/** Whether an entry may be taken back: it is there, is no correction, and nobody has. */
export function mayBeStruck(log: readonly Noted[], entry: number): boolean {
  const one = log[entry - 1];
  return one !== undefined && one.is !== 'correction' && !strikes(log).has(entry);
}

/** The last addition to the wine in a vessel. */
export function lastAddition(
  log: readonly Noted[],
  vessel: string,
): { entry: number; at: number } | undefined {
  const { additions = [] } = standings(log).get(vessel) ?? {};
  return additions.toSorted((a, b) => a.at - b.at || a.entry - b.entry).at(-1);
}
