import type { Region } from './region.ts';
import type { Confidence, LimitNoteId, LimitProduct, LimitUnit } from './limit-row.ts';

/** A limit that holds for a wine. */
export interface Limit {
  /** The id of its row. */
  readonly rule: string;
  readonly region: Region;
  readonly of: 'total' | 'free';
  readonly operator: '<=' | '<';
  /** What SO2 is compared with, mg/L: with the uplift, and by the density where the law counts by mass. */
  readonly limit_mg_L: number;
  readonly confidence: Confidence;
  /** The figure as the law has it. */
  readonly as_written: { readonly value: number; readonly unit: LimitUnit };
  /** Only where the law counts by mass: the density that it was taken at, kg/L. */
  readonly density_kg_L?: number;
  /** Only in a declared year: what is in `limit_mg_L` of it. */
  readonly uplift_mg_L?: number;
}

/** What was assumed to find a limit, or has to be said beside it. */
export interface LimitNote {
  readonly code:
    | LimitNoteId
    | 'sugar-assumed' // sugar unknown: the strictest band
    | 'colour-assumed' // colour unknown: the strictest colour
    | 'sparkling-class-assumed' // quality or other sparkling unknown: the stricter
    | 'density-assumed' // density unknown: 0.990 kg/L
    | 'designation-unknown' // a sweet wine: there are classes with a higher limit, if it is one
    | 'designation-not-on-file' // said to be of a class that this region has no row for
    | 'no-uplift' // said to be a declared year, but the row takes none
    | 'organic-not-on-file' // no organic row in this region: the general one
    | 'repealed' // a row that was repealed and is not used
    | 'other-unit-told' // a second source tells another unit; the law's is used
    | 'second-value-told'; // another figure from memory
  readonly rule?: string;
}

/** Why there is no limit: the region has none for such a drink, or it was looked for and not found. */
export interface NoLimit {
  readonly region: Region;
  readonly product: LimitProduct | 'sparkling' | 'must';
  readonly reason: 'not-on-file' | 'not-found';
}

/** The limits of a wine: of total and of free SO2, each on its own, or why there is none. */
export interface LimitsFound {
  readonly total?: Limit;
  readonly free?: Limit;
  readonly none?: NoLimit;
  readonly notes: readonly LimitNote[];
}
