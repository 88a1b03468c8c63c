import type { Reading } from '../../reader/understood.ts';
import { momentText } from '../../replies/moment-text.ts';
import { line } from '../lines/line.ts';
import { vesselText } from '../lines/vessel.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { tellingOf } from '../telling.ts';
import { whenOf } from '../when.ts';

/** What looks like an hour or a day of the calendar, and was none that can be. */
const LIKE_A_TIME = /^\d{1,2}[:h]\d{2}$|^\d{1,2}\.? ?\p{L}{3,9}\.?$/u;

/**
 * That nothing is noted, because it is not clear when it was: the hour is still to come, or there is no such one.
 * Undefined where the time may stand.
 */
export function whenIsUnclear(reading: Reading, { here }: Pick<Turn, 'here'>): Outcome | undefined {
  const when = whenOf(reading, here);
  const vessel = vesselText(reading);
  const { toCome } = reading.marks;
  const odd =
    reading.when === undefined ? reading.setAside.find((text) => LIKE_A_TIME.test(text)) : undefined;
  if (when.is === 'future' || (toCome !== undefined && reading.when === undefined)) {
    const moment = when.is === 'future' ? momentText(when.at, tellingOf(here)) : 'none';
    return asked('when-future', { vessel, text: reading.when?.text ?? toCome ?? '', when: moment });
  }
  if (when.is !== 'no-such-day' && odd === undefined) return undefined;
  return asked('when-no-such-day', { vessel, text: reading.when?.text ?? odd ?? '' });
}

function asked(key: 'when-future' | 'when-no-such-day', values: Record<string, string>): Outcome {
  const first = line('first', key, values);
  return { answer: null, inRound: [first], lines: [first], buttons: [] };
}
