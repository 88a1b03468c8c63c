import type { AdditiveNoted } from './entry.ts';

/** How the stock of an additive is counted. */
export type StockUnit = 'g' | 'mL' | 'tablets';

/** A lot that came in. Amounts are whole thousandths of the shelf's unit, so that no order of summing changes them. */
export interface LotKept {
  /** The entry that brought it in, or the count that found it. */
  readonly entry: number;
  readonly at: number;
  readonly lot?: string;
  readonly supplier?: string;
  /** Thousandths of the unit that came in. */
  readonly received: number;
  /** Thousandths of the unit that there were when the shelf was counted last; else what came in. */
  readonly held: number;
}

/** What of an additive stands on its shelf, by the log: the additive with its size or strength, and its lots. */
export interface Shelf {
  /** Its name among the shelves of a cellar. */
  readonly shelf: string;
  readonly kind: AdditiveNoted;
  readonly unit: StockUnit;
  /** The count, or the first receipt, from which on everything is reckoned; milliseconds since 1970. */
  readonly from_at: number;
  readonly from_entry: number;
  /** When it was counted last, in milliseconds since 1970. */
  readonly counted_at?: number;
  /** By time. */
  readonly lots: readonly LotKept[];
  /** Thousandths of the unit that went out since, by the lot that was named (small letters); `''` where none was. */
  readonly out: Readonly<Record<string, number>>;
}
