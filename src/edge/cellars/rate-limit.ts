import type { IncomingMessage } from '../../chat/conversation/ports.ts';

/** `fine`; `now` where a person has just gone beyond the limit, and is told so; `still` where nothing more is said. */
export type Pace = 'fine' | 'now' | 'still';

/** What is known of a person's pace. Times in milliseconds since 1970. */
interface Bucket {
  readonly tokens: number;
  readonly at: number;
  /** Nothing is taken before. */
  readonly shut_until: number;
  /** What was said of the last message, so that the same one again is no other. */
  readonly last: { readonly id: string; readonly pace: Pace };
}

/** How many messages a person may send; own choice. */
const A_MINUTE = 20;
const MINUTE_ms = 60_000;

/** So many people are remembered; whoever was silent longest is forgotten first. */
const MOST_KNOWN = 10_000;

/**
 * Makes the limit of each person, by the times at which their messages were sent: what waited while the bot was away is
 * not taken for a flood. What is said among others counts by itself, and nobody is told of it.
 */
export function createRateLimit(a_minute: number = A_MINUTE): (message: IncomingMessage) => Pace {
  const buckets = new Map<string, Bucket>();
  return ({ person, chat, id, at, addressed }) => {
    const isOverheard = addressed === 'overheard';
    const key = JSON.stringify([person, isOverheard]);
    const name = JSON.stringify([chat, id]);
    const before = buckets.get(key) ?? {
      tokens: a_minute,
      at,
      shut_until: 0,
      last: { id: '', pace: 'fine' },
    };
    if (before.last.id === name) return before.last.pace;
    const passed_ms = Math.max(0, at - before.at);
    const isOver = before.shut_until !== 0 && at >= before.shut_until;
    const filled = isOver ? a_minute : Math.min(a_minute, before.tokens + (passed_ms / MINUTE_ms) * a_minute);
    const isShut = at < before.shut_until;
    const isEmpty = !isShut && filled < 1;
    const pace: Pace = isShut || (isEmpty && isOverheard) ? 'still' : isEmpty ? 'now' : 'fine';
    buckets.delete(key);
    buckets.set(key, {
      tokens: pace === 'fine' ? filled - 1 : filled,
      at: Math.max(at, before.at),
      shut_until: isEmpty ? at + MINUTE_ms : isOver ? 0 : before.shut_until,
      last: { id: name, pace },
    });
    const [oldest] = buckets.keys();
    if (buckets.size > MOST_KNOWN && oldest !== undefined) buckets.delete(oldest);
    return pace;
  };
}
