/**
 * A vessel by the shortest name that people write for it, and that reads back as the same: numbered tanks as `T4`.
 *
 * @example
 * ```ts
 * vesselName('tank 4') // => "T4"
 * vesselName('barrel 17') // => "barrel 17"
 * vesselName('FV3') // => "FV3"
 * ```
 */
export function vesselName(vessel: string): string {
  const tank = /^tank (\d+[a-z]?)$/i.exec(vessel);
  return tank?.[1] === undefined ? vessel : `T${tank[1].toUpperCase()}`;
}

/**
 * Several vessels in one name: the first and the last of a row of them, all of a few.
 *
 * @example
 * ```ts
 * vesselNames(['B1', 'B2', 'B3', 'B4']) // => "B1–B4"
 * vesselNames(['tank 4', 'tank 9']) // => "T4, T9"
 * vesselNames(['barrel 12', 'barrel 13', 'barrel 14']) // => "barrel 12–14"
 * ```
 */
export function vesselNames(vessels: readonly string[]): string {
  const names = vessels.map(vesselName);
  const [first, last] = [names[0] ?? '', names.at(-1) ?? ''];
  if (names.length <= 2) return names.join(', ');
  const word = /^\D+ (?=\d)/.exec(first)?.[0] ?? '';
  return `${first}–${last.startsWith(word) ? last.slice(word.length) : last}`;
}
