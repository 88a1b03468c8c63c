import { assertBetween, assertWithinBounds } from '../bounds.ts';
import { molecularSO2 } from '../chemistry/molecular-so2.ts';
import { line } from '../dose/line.ts';
import { shown } from '../units/shown.ts';
import { over, plus, times, type Step, type Term } from '../working.ts';

/** A wine that goes into a blend: litres, and what is measured of it. SO2 in mg/L. */
export interface BlendPart {
  readonly volume_L: number;
  readonly free_mg_L?: number;
  readonly total_mg_L?: number;
  readonly ph?: number;
}

/** What a blend holds before binding moves. Its pH is measured and never reckoned: only its bounds are told. */
export interface Blend {
  readonly volume_L: number;
  readonly free_mg_L?: number;
  readonly total_mg_L?: number;
  /** The lower and the higher pH of the two; where between them the blend lies is measured. */
  readonly ph_between?: readonly [number, number];
  /** Molecular SO2 at either end, mg/L, low and high. */
  readonly molecular_between_mg_L?: readonly [number, number];
  readonly steps: readonly Step[];
}

/**
 * Two wines as one: free and total SO2 by volume, before any of it binds or is let go. Volumes in L, SO2 in mg/L; pH
 * and molecular SO2 as a range only.
 *
 * @param pK from `dissociation`
 * @throws RangeError outside `BOUNDS`
 *
 * Source: mass balance (general).
 *
 * @example
 * ```ts
 * const both = blend({ volume_L: 3000, free_mg_L: 60, total_mg_L: 160, ph: 3.4 }, { volume_L: 1000, free_mg_L: 20, total_mg_L: 80, ph: 3.6 }, 1.81);
 * [both.free_mg_L, both.total_mg_L] // => [50, 140]
 * both.molecular_between_mg_L // => [0.79796, 1.25299]
 * ```
 */
export function blend(one: BlendPart, other: BlendPart, pK: number): Blend {
  for (const part of [one, other]) {
    assertWithinBounds('blend', 'volume_L', part.volume_L);
    assertWithinBounds('blend', 'free_mg_L', part.free_mg_L);
    assertWithinBounds('blend', 'total_mg_L', part.total_mg_L);
    assertWithinBounds('blend', 'ph', part.ph);
  }
  const volume_L = one.volume_L + other.volume_L;
  const mixed = (a: number | undefined, b: number | undefined): number | undefined =>
    a === undefined || b === undefined ? undefined : (a * one.volume_L + b * other.volume_L) / volume_L;
  const free_mg_L = mixed(one.free_mg_L, other.free_mg_L);
  const total_mg_L = mixed(one.total_mg_L, other.total_mg_L);
  const ph_between = phBetween(one, other);
  return {
    volume_L,
    ...(free_mg_L !== undefined && { free_mg_L }),
    ...(total_mg_L !== undefined && { total_mg_L }),
    ...(ph_between !== undefined && { ph_between }),
    ...(ph_between !== undefined &&
      free_mg_L !== undefined && {
        molecular_between_mg_L: [
          molecularSO2(free_mg_L, ph_between[1], pK),
          molecularSO2(free_mg_L, ph_between[0], pK),
        ] as const,
      }),
    steps: [
      ...stepOf('blend-free', [one.volume_L, one.free_mg_L], [other.volume_L, other.free_mg_L]),
      ...stepOf('blend-total', [one.volume_L, one.total_mg_L], [other.volume_L, other.total_mg_L]),
    ],
  };
}

/**
 * The lower and the higher pH of two wines; undefined where one is not measured. No unit, 2.5 to 4.8.
 *
 * @example
 * ```ts
 * phBetween({ ph: 3.6 }, { ph: 3.4 }) // => [3.4, 3.6]
 * ```
 */
export function phBetween(
  one: Pick<BlendPart, 'ph'>,
  other: Pick<BlendPart, 'ph'>,
): readonly [number, number] | undefined {
  if (one.ph === undefined || other.ph === undefined) return undefined;
  return [Math.min(one.ph, other.ph), Math.max(one.ph, other.ph)];
}

const DIGITS = 4;

function stepOf(
  name: 'blend-free' | 'blend-total',
  [one_L, a]: readonly [number, number | undefined],
  [other_L, b]: readonly [number, number | undefined],
): readonly Step[] {
  if (a === undefined || b === undefined) return [];
  assertBetween('blend', 'volume_L', one_L + other_L, Number.MIN_VALUE);
  const of = (mg_L: number, volume_L: number): Term => times(shown(mg_L, 'mg/L'), shown(volume_L, 'L'));
  const whole = plus(shown(one_L, 'L'), shown(other_L, 'L'));
  return [line(name, over(plus(of(a, one_L), of(b, other_L)), whole), 'mg/L', DIGITS).step];
}
