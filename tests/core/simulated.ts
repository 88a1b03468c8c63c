/** Numbers that look like chance and are the same every time. */
export interface Chance {
  /** Evenly from 0 to 1. */
  readonly even: () => number;
  /** Normal, with mean 0 and standard deviation 1. */
  readonly normal: () => number;
}

/** A source of numbers by a seed: the generator mulberry32, and Box and Muller's way to normal ones. */
export function chanceOf(seed: number): Chance {
  let state = seed >>> 0;
  const even = (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  const normal = (): number => Math.sqrt(-2 * Math.log(1 - even())) * Math.cos(2 * Math.PI * even());
  return { even, normal };
}
