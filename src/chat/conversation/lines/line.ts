import type { Line, Room } from '../../replies/reply.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';

/** A line of a room: a sentence's key and its values as finished text. */
export function line(room: Room, key: SentenceKey, values: Line['values'] = {}): Line {
  return { room, key, values };
}

/** A part of a list: a key and its values, without a room of its own. */
export function part(key: SentenceKey, values: Line['values'] = {}): Omit<Line, 'room'> {
  return { key, values };
}

/** A line that names several things; no line at all where there is nothing to name. */
export function listLine(room: Room, key: SentenceKey, list: readonly Omit<Line, 'room'>[]): Line[] {
  return list.length === 0 ? [] : [{ room, key, values: {}, list }];
}
