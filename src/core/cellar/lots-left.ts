import type { LotKept, Shelf } from './shelf.ts';

/** A lot with what is left of it, in thousandths of the shelf's unit. */
export interface LotLeft extends LotKept {
  /** Thousandths of the unit. */
  readonly left: number;
}

/** What there is of an additive, in thousandths of the shelf's unit. */
export interface ShelfLeft {
  readonly lots: readonly LotLeft[];
  /** Thousandths of the unit over all lots: below 0 where more went out than is noted to have come in. */
  readonly balance: number;
}

/**
 * What is left of each lot, in thousandths of the shelf's unit. What went out of a named lot is taken from that one; what
 * it does not hold, and what went out of none, from the oldest that has something left.
 *
 * @example
 * ```ts
 * const lots = [{ entry: 1, at: 1, lot: 'A', received: 500, held: 500 }, { entry: 2, at: 2, lot: 'B', received: 900, held: 900 }];
 * const shelf = { shelf: 's', kind: {}, unit: 'g', from_at: 1, from_entry: 1, lots, out: { '': 600 } };
 * lotsLeft(shelf).lots.map(({ left }) => left) // => [0, 800]
 * lotsLeft(shelf).balance // => 800
 * ```
 */
export function lotsLeft({ lots, out }: Pick<Shelf, 'lots' | 'out'>): ShelfLeft {
  const left = lots.map((lot) => ({ ...lot, left: lot.held }));
  const take = (from: typeof left, amount: number): number => {
    let missing = amount;
    for (const lot of from) {
      const part = Math.min(missing, lot.left);
      lot.left -= part;
      missing -= part;
    }
    return missing;
  };
  let unnamed = 0;
  for (const [name, amount] of Object.entries(out))
    unnamed +=
      name === ''
        ? amount
        : take(
            left.filter((lot) => isLot(lot, name)),
            amount,
          );
  const missing = take(left, unnamed);
  const there = left.reduce((sum, lot) => sum + lot.left, 0);
  return { lots: left, balance: there - missing };
}

/**
 * Whether a lot goes by that name, in whatever letters it is written. No figures and no units.
 *
 * @example
 * ```ts
 * isLot({ lot: 'AB-12' }, 'ab-12') // => true
 * ```
 */
export function isLot({ lot }: Pick<LotKept, 'lot'>, name: string): boolean {
  return lot !== undefined && lotKey(lot) === lotKey(name);
}

/**
 * The name of a lot as it is looked for: small letters, no blanks at the ends. `''` where none is named.
 *
 * @example
 * ```ts
 * lotKey(' AB-12 ') // => 'ab-12'
 * ```
 */
export function lotKey(lot: string | undefined): string {
  return lot?.trim().toLowerCase() ?? '';
}
