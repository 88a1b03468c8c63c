import { isZone } from './is-zone.ts';

/** The abbreviations that are the same all year round. */
const ALL_YEAR = ['utc', 'gmt'];
const ABBREVIATION = /^[a-z]{1,4}$/;

/**
 * The zone that somebody means: its name in the IANA database, or its city alone. Undefined where there is none or
 * more than one, and for an abbreviation, as `EST` does not tell when the clocks are changed.
 *
 * @example
 * ```ts
 * zoneNamed('europe/madrid') // => 'Europe/Madrid'
 * zoneNamed('new york') // => 'America/New_York'
 * zoneNamed('Atlantis') // => undefined
 * zoneNamed('EST') // => undefined
 * ```
 */
export function zoneNamed(said: string): string | undefined {
  const typed = said.trim().replace(/\s+/g, '_');
  const name = typed.toLowerCase();
  if (ALL_YEAR.includes(name)) return name.toUpperCase();
  if (!/^[a-z][a-z0-9_/+-]+$/.test(name)) return undefined;
  const zones = Intl.supportedValuesOf('timeZone');
  const listed = zones.find((zone) => zone.toLowerCase() === name);
  if (listed !== undefined) return listed;
  // The list has only one spelling of a zone, an older or a newer one: `Asia/Kolkata` is known and not in it.
  if (!ABBREVIATION.test(name) && isZone(typed)) return typed === name ? withCapitals(name) : typed;
  const ofCity = zones.filter((zone) => zone.toLowerCase().endsWith(`/${name}`));
  const regions = new Set(zones.map((zone) => zone.split('/', 1)[0] ?? zone));
  const unlisted = [...regions].map((region) => `${region}/${withCapitals(name)}`).filter(isZone);
  const found = ofCity.length > 0 ? ofCity : unlisted;
  return found.length === 1 ? found[0] : undefined;
}

const withCapitals = (name: string): string =>
  name.replace(/(^|[/_-])[a-z]/g, (letter) => letter.toUpperCase());
