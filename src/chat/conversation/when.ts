import { MINUTE_ms } from '../../core/time/durations.ts';
import { momentOf } from '../../core/time/moment-of.ts';
import { resolveWhen } from '../../core/time/resolve-when.ts';
import type { Reading } from '../reader/understood.ts';
import type { Here } from './here.ts';
import { zoneOf } from './zone.ts';

/** When something happened, in milliseconds since 1970, or why that cannot be told. */
export type When =
  | { readonly is: 'now'; readonly at: number }
  | { readonly is: 'told'; readonly at: number }
  /** A day without an hour: noon stands for it, which is said. */
  | { readonly is: 'noon'; readonly at: number }
  | { readonly is: 'future' | 'no-such-day'; readonly at: number };

/**
 * When a reading was sampled, or an addition made: as it was said, else when it was said. A button that is pressed later
 * makes no sample younger.
 */
export function whenOf({ when, sampled, said_at }: Reading, here: Here, lastAddedAt?: number): When {
  const at = said_at ?? here.message.at;
  if (sampled === 'before' && lastAddedAt !== undefined && when?.hour === undefined)
    return { is: 'told', at: lastAddedAt - MINUTE_ms };
  if (when === undefined) return { is: 'now', at };
  const zone = zoneOf(here.settings);
  const resolved = resolveWhen(when, { at, zone });
  switch (resolved.is) {
    case 'moment':
      return { is: 'told', at: resolved.at };
    case 'day':
      if (when.day?.is === 'today') return { is: 'now', at };
      return { is: 'noon', at: momentOf({ ...resolved.date, hour: 12, minute: 0 }, zone) };
    case 'future':
      return { is: 'future', at: resolved.at };
    case 'no-such-day':
      return { is: 'no-such-day', at };
  }
}
