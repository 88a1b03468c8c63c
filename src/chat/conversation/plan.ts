import type { AdditiveNoted, AmountNoted } from '../../core/cellar/entry.ts';

/** Who is about to dose a vessel. */
export interface Claim {
  /** The number of the person. */
  readonly by: number;
  /** Since when, in milliseconds since 1970. */
  readonly at: number;
}

/** A dose that was reckoned for a vessel: what to weigh, and where it should lead. */
export interface Plan extends AdditiveNoted, AmountNoted {
  /** What the reading is remembered under, and in which chat. */
  readonly ref: string;
  readonly chat: string;
  readonly at: number;
  readonly planned_mg_L: number;
  readonly planned_free_mg_L?: number;
}

/** How long a claim holds, in milliseconds (4 h). */
export const CLAIM_ms = 4 * 3_600_000;

/** How long a reckoned dose is taken for what an addition was meant to be, in milliseconds (2 days; own choice). */
export const PLAN_ms = 48 * 3_600_000;

/** How long the buttons under a reply work, in milliseconds (14 days; own choice). */
export const BUTTONS_ms = 14 * 86_400_000;
