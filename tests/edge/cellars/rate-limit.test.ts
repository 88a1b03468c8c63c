import { expect, test } from 'vitest';
import type { IncomingMessage } from '../../../src/chat/conversation/ports.ts';
import { createRateLimit, type Pace } from '../../../src/edge/cellars/rate-limit.ts';

const message = (id: number, at: number, more: Partial<IncomingMessage> = {}): IncomingMessage => ({
  cellar: '',
  chat: 'one',
  person: 'Ana',
  id: String(id),
  at,
  language: 'en',
  content: { kind: 'text', text: '' },
  ...more,
});

test('twenty at once are fine, the next is told, and the others are passed over for a minute', () => {
  const paceOf = createRateLimit();
  const paces = Array.from({ length: 23 }, (_, id) => paceOf(message(id, 0)));
  const fine = Array.from({ length: 20 }, (): Pace => 'fine');
  expect(paces).toEqual([...fine, 'now', 'still', 'still']);
  expect(paceOf(message(30, 59_999))).toBe('still');
  const later = Array.from({ length: 21 }, (_, id) => paceOf(message(40 + id, 60_000)));
  expect(later).toEqual([...fine, 'now']);
});

test('a message every three seconds is never too fast', () => {
  const paceOf = createRateLimit();
  const paces = Array.from({ length: 200 }, (_, id) => paceOf(message(id, id * 3000)));
  expect(new Set(paces)).toEqual(new Set(['fine']));
});

test('the same message again is no other', () => {
  const paceOf = createRateLimit(1);
  expect([1, 1, 1, 2, 2].map((id) => paceOf(message(id, 0)))).toEqual(['fine', 'fine', 'fine', 'now', 'now']);
});

test('others are not held up, nor what a person says to the bot by what they say among others', () => {
  const paceOf = createRateLimit(1);
  const overheard = { addressed: 'overheard' } as const;
  expect([1, 2].map((id) => paceOf(message(id, 0, overheard)))).toEqual(['fine', 'still']);
  expect(paceOf(message(3, 0))).toBe('fine');
  expect(paceOf(message(4, 0))).toBe('now');
  expect(paceOf(message(5, 0, { person: 'Ben' }))).toBe('fine');
});
