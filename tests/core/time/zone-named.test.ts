import { expect, test } from 'vitest';
import { isZone } from '../../../src/core/time/is-zone.ts';
import { zoneNamed } from '../../../src/core/time/zone-named.ts';

// The names are those of the IANA time zone database; older spellings stand in its file `backward`.
test.each([
  ['Europe/Madrid', 'Europe/Madrid'],
  [' EUROPE/madrid ', 'Europe/Madrid'],
  ['madrid', 'Europe/Madrid'],
  ['Rome', 'Europe/Rome'],
  ['new york', 'America/New_York'],
  ['Asia/Kolkata', 'Asia/Kolkata'],
  ['asia/kolkata', 'Asia/Kolkata'],
  ['Kyiv', 'Europe/Kyiv'],
  ['Kiev', 'Europe/Kiev'],
  ['utc', 'UTC'],
  ['Portugal', 'Portugal'],
])('%j is the zone %s', (said, zone) => {
  expect(zoneNamed(said)).toBe(zone);
  expect(isZone(zone)).toBe(true);
});

test.each([
  'EST',
  'CET',
  '+02:00',
  'GMT+1',
  'Atlantis',
  '',
  ' ',
  'toString',
  '__proto__',
  '/',
  'Europe/',
  '12',
])('%j is the zone of nobody', (said) => {
  expect(zoneNamed(said)).toBeUndefined();
});
