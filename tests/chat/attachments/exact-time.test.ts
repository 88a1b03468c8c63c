import fc from 'fast-check';
import { expect, test } from 'vitest';
import { exactTime, readExactTime } from '../../../src/chat/attachments/exact-time.ts';

test.each([
  ['2026-11-12T08:30:00.000Z', 'Europe/Madrid', '2026-11-12T09:30:00+01:00'],
  ['2026-11-12T08:30:00.007Z', 'Europe/Madrid', '2026-11-12T09:30:00.007+01:00'],
  ['2026-07-01T00:00:00.000Z', 'Australia/Adelaide', '2026-07-01T09:30:00+09:30'],
  ['2026-07-01T00:00:00.000Z', 'America/Los_Angeles', '2026-06-30T17:00:00-07:00'],
])('%s in %s', (utc, zone, text) => {
  expect(exactTime(Date.parse(utc), zone)).toBe(text);
});

test('a moment comes out of its text as it was, in any zone, also in the hour that summer time gives twice', () => {
  const zone = fc.constantFrom('Europe/Madrid', 'America/Los_Angeles', 'Australia/Lord_Howe', 'UTC');
  const at = fc.integer({ min: Date.UTC(1970, 0, 2), max: Date.UTC(2100, 0, 1) });
  fc.assert(fc.property(at, zone, (one, where) => readExactTime(exactTime(one, where)) === one));
});

test.each(['', '2026-11-12', '12.11.2026 09:30', '2026-11-12T09:30', '2026-13-40T09:30:00Z', '46338.4', 'x'])(
  '“%s” is no moment that is surely known',
  (text) => {
    expect(readExactTime(text)).toBeUndefined();
  },
);
