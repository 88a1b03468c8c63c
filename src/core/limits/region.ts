/**
 * The markets whose law is on file, or was looked for and not found: `oiv` the international code, `eu` and so on;
 * `ca-qc` is Quebec, `eaeu` the Eurasian union. `eu` is what holds where the wine is sold there.
 *
 * @example
 * ```ts
 * REGIONS.includes('eu') // => true
 * ```
 */
export const REGIONS = [
  'oiv',
  'eu',
  'uk',
  'us',
  'ca',
  'ca-qc',
  'au',
  'nz',
  'za',
  'ar',
  'cl',
  'br',
  'jp',
  'kr',
  'cn',
  'codex',
  'ch',
  'ge',
  'hk',
  'eaeu',
  'uy',
  'in',
  'md',
  'mercosur',
] as const;

/** A market by its code. */
export type Region = (typeof REGIONS)[number];

/**
 * Whether a text is the code of a market on file.
 *
 * @example
 * ```ts
 * isRegion('eu') // => true
 * isRegion('atlantis') // => false
 * ```
 */
export function isRegion(text: string): text is Region {
  return REGIONS.some((region) => region === text);
}
