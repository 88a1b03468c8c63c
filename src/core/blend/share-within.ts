import { assertBetween } from '../bounds.ts';
import { freeToMolecular } from '../chemistry/free-to-molecular.ts';
import { phBetween, type BlendPart } from './blend.ts';

/** What a blend should keep to; SO2 in mg/L. Molecular SO2 is held at whichever pH of the two is the worse. */
export interface BlendBounds {
  readonly free_most_mg_L?: number;
  readonly total_most_mg_L?: number;
  readonly molecular_least_mg_L?: number;
  readonly molecular_most_mg_L?: number;
}

/** Shares of the other wine in the blend, 0 to 1; or which bound no share keeps together with the others. */
export type ShareFound =
  | {
      /** Share of the other wine, 0 to 1 … */
      readonly least: number;
      readonly most: number;
      readonly fails?: never;
    }
  | { readonly fails: 'free' | 'total' | 'molecular' | 'unmeasured'; readonly least?: never };

/**
 * Which shares of another wine bring a wine within bounds: free and total SO2 go by volume, and the molecular SO2 is
 * held at the higher pH of the two for the least and at the lower for the most, as the pH of a blend is not reckoned.
 * Shares from 0 to 1, SO2 in mg/L.
 *
 * @param pK from `dissociation`
 * @throws RangeError outside `BOUNDS`
 *
 * Source: mass balance (general); OIV-MA-AS323-04C 2.1 (read).
 *
 * @example
 * ```ts
 * const [high, low] = [{ free_mg_L: 60, total_mg_L: 180, ph: 3.4 }, { free_mg_L: 20, total_mg_L: 80, ph: 3.4 }];
 * shareWithin([high, low], { total_most_mg_L: 150 }, 1.81) // => { least: 0.3, most: 1 }
 * shareWithin([high, low], { total_most_mg_L: 70 }, 1.81) // => { fails: 'total' }
 * shareWithin([high, {}], { total_most_mg_L: 70 }, 1.81) // => { fails: 'unmeasured' }
 * ```
 */
export function shareWithin(
  [wine, other]: readonly [Omit<BlendPart, 'volume_L'>, Omit<BlendPart, 'volume_L'>],
  bounds: BlendBounds,
  pK: number,
): ShareFound {
  let range: readonly [number, number] = [0, 1];
  for (const one of lineBounds([wine, other], bounds, pK)) {
    if (one.wine_mg_L === undefined || one.other_mg_L === undefined) return { fails: 'unmeasured' };
    const held = heldShares([one.wine_mg_L, one.other_mg_L], one.low_mg_L, one.high_mg_L);
    const next = held && ([Math.max(range[0], held[0]), Math.min(range[1], held[1])] as const);
    if (next === undefined || next[0] > next[1]) return { fails: one.of };
    range = next;
  }
  return { least: range[0], most: range[1] };
}

interface LineBound {
  readonly of: 'free' | 'total' | 'molecular';
  readonly wine_mg_L: number | undefined;
  readonly other_mg_L: number | undefined;
  readonly low_mg_L: number;
  readonly high_mg_L: number;
}

function lineBounds(
  [wine, other]: readonly [Omit<BlendPart, 'volume_L'>, Omit<BlendPart, 'volume_L'>],
  { free_most_mg_L, total_most_mg_L, molecular_least_mg_L, molecular_most_mg_L }: BlendBounds,
  pK: number,
): readonly LineBound[] {
  const found: LineBound[] = [];
  const total = { of: 'total', wine_mg_L: wine.total_mg_L, other_mg_L: other.total_mg_L } as const;
  const free = { wine_mg_L: wine.free_mg_L, other_mg_L: other.free_mg_L } as const;
  if (total_most_mg_L !== undefined) found.push({ ...total, low_mg_L: 0, high_mg_L: total_most_mg_L });
  if (free_most_mg_L !== undefined)
    found.push({ of: 'free', ...free, low_mg_L: 0, high_mg_L: free_most_mg_L });
  if (molecular_least_mg_L === undefined && molecular_most_mg_L === undefined) return found;
  const ph = phBetween(wine, other);
  if (ph === undefined)
    return [
      ...found,
      { of: 'molecular', wine_mg_L: undefined, other_mg_L: undefined, low_mg_L: 0, high_mg_L: 0 },
    ];
  const low_mg_L = (molecular_least_mg_L ?? 0) * freeToMolecular(ph[1], pK);
  const high_mg_L = (molecular_most_mg_L ?? Infinity) * freeToMolecular(ph[0], pK);
  return [...found, { of: 'molecular', ...free, low_mg_L, high_mg_L }];
}

/** Shares x at which wine + x·(other − wine) lies between `low` and `high`. */
function heldShares(
  [wine, other]: readonly [number, number],
  low: number,
  high: number,
): readonly [number, number] | undefined {
  assertBetween('blend', 'SO2 in mg/L', Math.min(wine, other), 0);
  if (low > high) return undefined;
  const slope = other - wine;
  if (slope === 0) return wine >= low && wine <= high ? [0, 1] : undefined;
  const [a, b] = [(low - wine) / slope, (high - wine) / slope];
  const range = [Math.max(0, Math.min(a, b)), Math.min(1, Math.max(a, b))] as const;
  return range[0] > range[1] ? undefined : range;
}
