/**
 * Standard atomic weights as IUPAC/CIAAW 2021 prints them (g/mol): an interval of natural materials, or a
 * value with its uncertainty. Read.
 *
 * @example
 * ```ts
 * STANDARD_ATOMIC_WEIGHTS.S // => [32.059, 32.076]
 * ```
 */
export const STANDARD_ATOMIC_WEIGHTS = {
  H: [1.00784, 1.00811],
  N: [14.00643, 14.00728],
  O: [15.99903, 15.99977],
  Na: [22.98976926, 22.9897693],
  S: [32.059, 32.076],
  K: [39.0982, 39.0984],
} as const;

/** An element that the additives are made of. */
export type Element = keyof typeof STANDARD_ATOMIC_WEIGHTS;

/**
 * The single values that stand for those intervals in trade (g/mol): IUPAC's conventional weights, from memory;
 * Na and K are the standard values themselves. A test holds each inside its interval.
 *
 * @example
 * ```ts
 * ATOMIC_WEIGHTS.S // => 32.06
 * ```
 */
export const ATOMIC_WEIGHTS: Readonly<Record<Element, number>> = {
  H: 1.008,
  N: 14.007,
  O: 15.999,
  Na: 22.98976928,
  S: 32.06,
  K: 39.0983,
};
