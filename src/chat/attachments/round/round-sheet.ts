import type { Weighed } from '../../../core/dose/totals-to-fetch.ts';
import type { VolumeUnit } from '../../reader/understood.ts';
import type { DecimalMark } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';

/** A line of a round on its weigh-out sheet. Volumes in litres, SO2 in mg/L. */
export interface RoundRow {
  /** What the reading of it is remembered under. */
  readonly ref: string;
  readonly name: string;
  readonly vessels: readonly string[];
  /** An amount, nothing to add, or no figure: a problem, something missing, a choice. */
  readonly is: 'amount' | 'nothing' | 'open';
  readonly volume_L?: number;
  readonly volumeUnit?: VolumeUnit;
  readonly ph?: number;
  readonly free_mg_L?: number;
  readonly total_mg_L?: number;
  /** What is measured out: one thing, or tablets and the rest of the dose as a stock. */
  readonly weighed: readonly Weighed[];
  readonly dose_mg_L?: number;
  readonly free_after_mg_L?: number;
  /** What tablets give alone, mg/L SO2, where they are fewer than the dose. */
  readonly gives_mg_L?: number;
  /** The amount is held back by a limit of the law. */
  readonly isLimited?: true;
  /** Whether one tap may note it. */
  readonly mayBeNoted?: true;
  /** What was said of it. */
  readonly lines: readonly Line[];
}

/** A whole round as it was said: plain data that is kept, so that the sheet shows what the reply showed. */
export interface RoundSheet {
  readonly ref: string;
  /** When it was worked out, in milliseconds since 1970. */
  readonly at: number;
  readonly rows: readonly RoundRow[];
  readonly mark: DecimalMark;
  readonly unit: 'mg/L' | 'ppm';
  /** What stands above all rows: the additive and what was said of all. */
  readonly head: readonly Line[];
  /** What holds for all: the stage, what was assumed, the cautions. */
  readonly foot: readonly Line[];
}
