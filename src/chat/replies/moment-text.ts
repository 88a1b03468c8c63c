import { localTimeOf } from '../../core/time/local-time-of.ts';
import type { Language } from '../reader/understood.ts';

/** English days stand before their month, as in all the other languages. */
const TAG: Readonly<Record<Language, string>> = {
  en: 'en-GB',
  es: 'es',
  fr: 'fr',
  it: 'it',
  de: 'de',
  pt: 'pt',
};

/** How a moment is told: in which zone and language, and seen from when (milliseconds since 1970). */
export interface Telling {
  readonly zone: string;
  readonly language: Language;
  readonly now: number;
}

const formats = new Map<string, Intl.DateTimeFormat>();

/** Made once: it is slow to make and quick to use. */
function formatOf({ zone, language }: Telling, withYear: boolean): Intl.DateTimeFormat {
  const key = `${language} ${zone} ${withYear}`;
  const known = formats.get(key);
  if (known) return known;
  const made = new Intl.DateTimeFormat(TAG[language], {
    day: 'numeric',
    month: 'short',
    ...(withYear && { year: 'numeric' as const }),
    timeZone: zone,
  });
  formats.set(key, made);
  return made;
}

/**
 * The hour and minute of a moment, on a clock of 24 hours.
 *
 * @example
 * ```ts
 * clockText(Date.UTC(2026, 10, 12, 8, 5), { zone: 'Europe/Madrid', language: 'en', now: 0 }) // => "9:05"
 * ```
 */
export function clockText(at: number, { zone }: Telling): string {
  const { hour, minute } = localTimeOf(at, zone);
  return `${hour}:${String(minute).padStart(2, '0')}`;
}

/**
 * The day of a moment; with its year where that is not the present one.
 *
 * @example
 * ```ts
 * dayText(Date.UTC(2026, 10, 12, 8), { zone: 'UTC', language: 'en', now: Date.UTC(2026, 11, 1) }) // => "12 Nov"
 * dayText(Date.UTC(2025, 10, 12, 8), { zone: 'UTC', language: 'en', now: Date.UTC(2026, 11, 1) }) // => "12 Nov 2025"
 * ```
 */
export function dayText(at: number, telling: Telling): string {
  const { zone, now } = telling;
  const isOtherYear = localTimeOf(at, zone).year !== localTimeOf(now, zone).year;
  return formatOf(telling, isOtherYear).format(at);
}

/**
 * A moment as short as it can be told: the clock alone on the present day, else with the day.
 *
 * @example
 * ```ts
 * const telling = { zone: 'UTC', language: 'en', now: Date.UTC(2026, 10, 12, 10) };
 * momentText(Date.UTC(2026, 10, 12, 8, 5), telling) // => "8:05"
 * momentText(Date.UTC(2026, 10, 11, 8, 5), telling) // => "11 Nov 8:05"
 * ```
 */
export function momentText(at: number, telling: Telling): string {
  const { zone, now } = telling;
  const [day, today] = [localTimeOf(at, zone), localTimeOf(now, zone)];
  const isToday = day.day === today.day && day.month === today.month && day.year === today.year;
  return isToday ? clockText(at, telling) : `${dayText(at, telling)} ${clockText(at, telling)}`;
}
