import type { Region } from '../limits/region.ts';
import type { SourceKey } from '../sources.ts';

/** What the text on file says of hydrogen peroxide in wine; `left_most_mg_L` is what may be left of it, mg/L. */
export interface PeroxideLaw {
  readonly regions: readonly Region[];
  readonly says: 'listed' | 'not-listed' | 'old-text';
  readonly left_most_mg_L?: number;
  readonly source: SourceKey;
}

/**
 * Hydrogen peroxide by market, as far as a text is on file; all of it may have changed, and none of it is an amount.
 *
 * Source: AWRI Technical Note TN06 (read); an older table of 27 CFR wine treatments (read; now 24.246 and 24.247, to be
 * checked), with 3 mg/L at most and none left.
 *
 * @example
 * ```ts
 * peroxideLawOf('eu')?.says // => 'not-listed'
 * peroxideLawOf('za') // => undefined
 * ```
 */
export function peroxideLawOf(region: Region): PeroxideLaw | undefined {
  return PEROXIDE_LAWS.find(({ regions }) => regions.includes(region));
}

const PEROXIDE_LAWS: readonly PeroxideLaw[] = [
  { regions: ['au'], says: 'listed', left_most_mg_L: 1, source: 'awri-tn06' },
  { regions: ['eu'], says: 'not-listed', source: 'awri-tn06' },
  { regions: ['us'], says: 'old-text', source: 'cfr-24-old-table' },
];
