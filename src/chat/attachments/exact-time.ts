import { isoWithZone } from '../../core/time/iso-with-zone.ts';

/** A moment (`at` in milliseconds since 1970) as ISO 8601 by the clock of a zone, no part of a second lost. */
export function exactTime(at: number, zone: string): string {
  const text = isoWithZone(at, zone);
  const broken_ms = ((at % 1000) + 1000) % 1000;
  return broken_ms === 0
    ? text
    : `${text.slice(0, 19)}.${String(broken_ms).padStart(3, '0')}${text.slice(19)}`;
}

const EXACT = /^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d(?:\.\d{1,3})?(?:Z|[+-]\d\d:\d\d)$/;

/** The moment that such a text names, in milliseconds since 1970; undefined for anything else. */
export function readExactTime(text: string): number | undefined {
  const at = EXACT.test(text) ? Date.parse(text) : NaN;
  return Number.isNaN(at) ? undefined : at;
}
