import { doseFor, type Allowance } from '../binding/allowance.ts';
import { freeSO2Needed } from '../chemistry/free-so2-needed.ts';
import { molecularSO2 } from '../chemistry/molecular-so2.ts';
import type { Target } from '../wine.ts';
import { oxygenLoss, type OxygenAtBottling } from './oxygen-loss.ts';

/** What an aim hangs on; all may be unknown. */
export interface AimFacts extends Allowance, OxygenAtBottling {
  readonly ph?: number;
  readonly free_mg_L?: number;
}

/** A target as free and molecular SO2, the rise that it takes, and what goes in for it; all mg/L. */
export interface Aim {
  readonly target_free_mg_L?: number;
  readonly target_molecular_mg_L?: number;
  /** Never negative; 0 where the wine has enough. */
  readonly add_mg_L?: number;
  readonly dose_mg_L?: number;
}

/**
 * What a target takes, as far as it is known: a molecular one needs the pH, a rise needs the free SO2 too. Where oxygen
 * is stated, the free SO2 aimed at is what has to be there before it, so that the target stands after it.
 *
 * @param target in mg/L
 * @param facts pH, free SO2 in mg/L, allowance or share
 * @param pK from `dissociation`
 * @throws RangeError outside `BOUNDS`
 *
 * @example
 * ```ts
 * aimAt({ molecular_mg_L: 0.8 }, { ph: 3.58, free_mg_L: 21 }, 1.81).add_mg_L // => 26.907
 * aimAt({ free_mg_L: 36 }, { free_mg_L: 40 }, 1.81) // => { target_free_mg_L: 36, add_mg_L: 0, dose_mg_L: 0 }
 * aimAt({ free_mg_L: 30 }, { free_mg_L: 22, oxygen_mg_L: 2 }, 1.81).target_free_mg_L // => 38.008
 * aimAt({ add_mg_L: 28 }, {}, 1.81) // => { add_mg_L: 28, dose_mg_L: 28 }
 * ```
 */
export function aimAt(target: Target, facts: AimFacts, pK: number): Aim {
  const { ph, free_mg_L } = facts;
  if ('add_mg_L' in target) {
    return { add_mg_L: target.add_mg_L, dose_mg_L: doseFor(target.add_mg_L, facts) };
  }
  const loss_mg_L = oxygenLoss(facts);
  const wanted: Aim =
    'molecular_mg_L' in target
      ? {
          target_molecular_mg_L: target.molecular_mg_L,
          ...(ph === undefined
            ? {}
            : { target_free_mg_L: freeSO2Needed(target.molecular_mg_L, ph, pK) + loss_mg_L }),
        }
      : {
          target_free_mg_L: target.free_mg_L + loss_mg_L,
          ...(ph === undefined ? {} : { target_molecular_mg_L: molecularSO2(target.free_mg_L, ph, pK) }),
        };
  if (wanted.target_free_mg_L === undefined || free_mg_L === undefined) return wanted;
  const add_mg_L = Math.max(0, wanted.target_free_mg_L - free_mg_L);
  return { ...wanted, add_mg_L, dose_mg_L: doseFor(add_mg_L, facts) };
}
