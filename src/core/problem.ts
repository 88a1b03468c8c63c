/**
 * What is wrong with something a person wrote. A problem is data, never thrown:
 * beside one, no number is ever given.
 */
export type ProblemCode =
  | 'ph-out-of-range'
  | 'negative-value'
  | 'total-below-free'
  | 'volume-not-positive'
  | 'unit-mismatch'
  | 'ambiguous-number'
  | 'conflicting-values'
  | 'unknown-additive'
  | 'strength-out-of-range'
  | 'value-out-of-range'
  | 'not-understood'
  | 'too-long';

/** A problem and the person's own words it is about (`"12°"`; empty when it is the whole message). */
export interface Problem {
  readonly code: ProblemCode;
  readonly about: string;
}
