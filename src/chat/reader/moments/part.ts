import type { SaidDay } from '../../../core/time/said-when.ts';

/** A part of a moment: a day, a time, both, or so long ago; with the pieces it stands in. */
export interface Part {
  readonly day?: SaidDay;
  readonly hour?: number;
  readonly minute?: number;
  readonly hours_ago?: number;
  readonly from: number;
  readonly to: number;
  /** It can be no day to come. */
  readonly isPast: boolean;
  /** It holds figures that no other finder may read. */
  readonly isClaimed: boolean;
  /** A point parts its figures. */
  readonly isPointed?: boolean;
}
