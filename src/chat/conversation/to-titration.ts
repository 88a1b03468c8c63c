import { titrate, type Titration, type TitrationAnswer } from '../../core/laboratory/titration.ts';
import type { SaidTitration } from '../reader/titration/said-titration.ts';

/** What of a titration is missing, in the order in which it is asked. */
export type TitrationGap = 'method' | 'sample' | 'titrant' | 'strength' | 'unit';

/** The first thing that is missing before a titration can be reckoned; undefined where nothing is. */
export function gapOf({ method, sample_mL, titrant_mL, titrant }: SaidTitration): TitrationGap | undefined {
  if (method === undefined) return 'method';
  if (sample_mL === undefined) return 'sample';
  if (titrant_mL === undefined) return 'titrant';
  if (titrant === undefined || ('iodate_mg' in titrant && method === 'aeration')) return 'strength';
  // Of sodium hydroxide one mole is one equivalent; of iodine it is two.
  return method === 'iodine' && 'strength' in titrant && titrant.unit === undefined ? 'unit' : undefined;
}

/** The titration that was told, ready to be reckoned; undefined while something is missing. */
export function toTitration(said: SaidTitration): Titration | undefined {
  const { method, of = 'free', sample_mL, titrant_mL, blank_mL, titrant, ascorbic_mg_L } = said;
  if (gapOf(said) !== undefined || method === undefined || titrant === undefined) return undefined;
  if (sample_mL === undefined || titrant_mL === undefined) return undefined;
  return {
    method,
    of,
    sample_mL,
    titrant_mL,
    titrant: 'strength' in titrant ? { strength: titrant.strength, unit: titrant.unit ?? 'N' } : titrant,
    ...(blank_mL !== undefined && { blank_mL }),
    ...(ascorbic_mg_L !== undefined && { ascorbic_mg_L }),
  };
}

/** The result of a titration as it is kept and shown: burettes tell no more than a decimal. */
export function resultOf({ free_mg_L, total_mg_L }: TitrationAnswer): number {
  return Math.round((free_mg_L ?? total_mg_L ?? 0) * 10) / 10;
}

/** More SO2 than any wine holds, mg/L (own thresholds): a volume or a strength was misread. */
const MOST_mg_L = { free: 200, total: 500 } as const;

/** Whether a result is more than any wine holds: it is told, and never kept. */
export function isTooMuch(answer: TitrationAnswer): boolean {
  return resultOf(answer) > (answer.free_mg_L === undefined ? MOST_mg_L.total : MOST_mg_L.free);
}

/** The answer to a titration that was told; undefined while something is missing. */
export function titrationOf(said: SaidTitration): TitrationAnswer | undefined {
  const titration = toTitration(said);
  return titration && titrate(titration);
}
