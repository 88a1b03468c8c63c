import { landingOf } from '../../../core/cellar/landing-of.ts';
import type { AdditionKept, Vessel } from '../../../core/cellar/vessel.ts';
import { DAY_ms } from '../../../core/time/durations.ts';
import { momentText } from '../../replies/moment-text.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { buttonsFor } from '../buttons.ts';
import { factLines } from '../lines/facts.ts';
import { landedLines } from '../lines/landed.ts';
import { line } from '../lines/line.ts';
import { notedAmount } from '../lines/noted-amount.ts';
import { volumeDiffersLines } from '../lines/volume-differs.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { whoText } from '../people.ts';
import { saidFields } from '../recall.ts';
import { tellingOf } from '../telling.ts';
import { vesselsIn } from '../vessels-named.ts';
import { whenOf } from '../when.ts';

interface Dosed {
  readonly vessel: Vessel;
  readonly addition: AdditionKept;
}

/**
 * Nobody doses twice: where something went into the vessel after the sample, or within a day, the reply opens with that
 * and gives no dose until it is settled which of the two came first. Undefined where a dose may be given.
 */
export function dosedAlready(reading: Reading, turn: Turn): Outcome | undefined {
  const { here } = turn;
  const sample = whenOf(reading, here);
  if (reading.sampled === 'dose') return dosedSince(reading, turn, sample.at);
  // One whole day after it, it counts no more.
  const dosed = lastDosed(reading, turn, Math.min(sample.at, here.message.at - DAY_ms));
  if (dosed === undefined) return undefined;
  const { free_mg_L } = saidFields(reading);
  if (free_mg_L === undefined) return asked(reading, dosed, 'dosed-add-more', ['gd'], turn);
  // What went in after it was said is surely later than the sample.
  const isOlder = reading.said_at !== undefined && reading.said_at < dosed.addition.at;
  const isTold = sample.is === 'told' || reading.sampled !== undefined || isOlder;
  if (isTold && (sample.at < dosed.addition.at || reading.sampled === 'before'))
    return asked(reading, dosed, 'dosed-sampled-before', [], turn);
  if (isTold) return landedToday(reading, dosed, free_mg_L, turn);
  return asked(reading, dosed, 'dosed-which-first', ['gb', 'ga'], turn);
}

/** A dose was wanted all the same; what went in after that was said, nobody knew of. */
function dosedSince(reading: Reading, turn: Turn, sampled_at: number): Outcome | undefined {
  const dosed = lastDosed(reading, turn, Math.max(sampled_at, reading.said_at ?? sampled_at));
  return dosed && asked(reading, dosed, 'dosed-sampled-before', [], turn);
}

/** The last addition to one of the vessels after a moment. */
function lastDosed(reading: Reading, { here }: Turn, since: number): Dosed | undefined {
  const all = vesselsIn(reading.fields).flatMap((name): Dosed[] => {
    const vessel = here.vessels.get(name);
    const addition = vessel?.additions.at(-1);
    return vessel && addition && addition.at > since ? [{ vessel, addition }] : [];
  });
  return all.toSorted((a, b) => a.addition.at - b.addition.at).at(-1);
}

function asked(
  reading: Reading,
  dosed: Dosed,
  key: 'dosed-which-first' | 'dosed-add-more' | 'dosed-sampled-before',
  does: readonly ('gb' | 'ga' | 'gd')[],
  turn: Turn,
): Outcome {
  const first = [dosedLine(dosed, key, turn)];
  return {
    answer: null,
    inRound: [dosedLine(dosed, 'dosed-in-round', turn)],
    lines: [...first, ...volumeDiffersLines(reading, turn.manner), ...factLines(reading, turn.manner)],
    buttons: buttonsFor(turn.ref, does),
  };
}

function dosedLine(
  { vessel, addition }: Dosed,
  key: 'dosed-which-first' | 'dosed-add-more' | 'dosed-sampled-before' | 'dosed-in-round' | 'dosed-landed',
  { here, manner }: Turn,
): Line {
  const telling = tellingOf(here);
  const amount = notedAmount(addition, manner.mark);
  const values = {
    vessel: vesselName(vessel.vessel),
    who: whoText(addition.by, here),
    when: momentText(addition.at, telling),
    next: momentText(addition.at + DAY_ms, telling),
    known: amount === undefined ? 'none' : 'some',
  };
  return { ...line('first', key, values), list: amount === undefined ? [] : [amount] };
}

/** The first reading after an addition, on the same day: where it landed, and why no further one is urged yet. */
function landedToday(reading: Reading, dosed: Dosed, free_mg_L: number, turn: Turn): Outcome {
  const { here, manner } = turn;
  const sample = { entry: here.nextEntry, at: whenOf(reading, here).at, free_mg_L };
  // The reading was noted with its message: then it is the last that landed.
  const isNoted = reading.noted?.includes('free_mg_L') === true;
  const landing = isNoted ? dosed.vessel.landings.at(-1) : landingOf(dosed.vessel, sample);
  const lines = [
    ...(landing ? landedLines(dosed.vessel.vessel, landing, turn) : []),
    dosedLine(dosed, 'dosed-landed', turn),
  ];
  return {
    answer: null,
    inRound: lines.slice(0, 1),
    lines: [...lines, ...volumeDiffersLines(reading, manner), ...factLines(reading, manner)],
    buttons: buttonsFor(turn.ref, ['gd']),
    ...(landing && { isLanding: true as const }),
  };
}
