import { symbolCircle, symbolDiamond, symbolTimes, symbolTriangle } from 'd3-shape';
import { element, at, lineFrom, shapeAt } from './elements.ts';
import type { Place } from './elements.ts';
import { INK, PALETTE } from './palette.ts';

/**
 * Free SO2 of a sample: a full dot.
 *
 * @param radius of the dots, in units of the picture
 */
export function freeSign(place: Place, radius: number): string {
  const look = { fill: PALETTE.blue, stroke: INK.paper, 'stroke-width': at(radius / 5) };
  return shapeAt(place, { type: symbolCircle, area: Math.PI * radius ** 2 }, look);
}

/**
 * Total SO2 of a sample: an open diamond.
 *
 * @param radius of the dots, in units of the picture
 */
export function totalSign(place: Place, radius: number): string {
  const look = { fill: INK.paper, stroke: PALETTE.green, 'stroke-width': at(Math.max(1.2, radius / 2.5)) };
  return shapeAt(place, { type: symbolDiamond, area: 3.1 * radius ** 2 }, look);
}

/**
 * What is bound: a broad bar from free up to total.
 *
 * @param radius of the dots, in units of the picture
 */
export function boundSign(free: Place, total: Place, radius: number): string {
  return lineFrom(free, total, {
    stroke: PALETTE.sky,
    'stroke-opacity': '0.55',
    'stroke-width': at(radius * 1.6),
  });
}

/**
 * Free above total: a dotted line between the two and a cross above them.
 *
 * @param radius of the dots, in units of the picture
 */
export function oddSign(free: Place, total: Place, radius: number): string {
  const look = { stroke: PALETTE.black, 'stroke-width': '1.5', 'stroke-dasharray': '1.5 2' };
  return lineFrom(free, total, look) + oddCross({ x: free.x, y: free.y - radius * 2.2 - 2 }, radius);
}

/**
 * The cross of what cannot be, alone.
 *
 * @param radius of the dots, in units of the picture
 */
export function oddCross(place: Place, radius: number): string {
  const look = { stroke: PALETTE.black, 'stroke-width': '2', fill: 'none' };
  return shapeAt(place, { type: symbolTimes, area: 4 * radius ** 2 }, look);
}

/** How the line of what free SO2 is needed looks. */
export const NEEDED_LOOK = {
  stroke: PALETTE.vermilion,
  'stroke-width': '2.2',
  'stroke-dasharray': '8 3.5',
  fill: 'none',
} as const;

/** How the line of the limit looks. */
export const LIMIT_LOOK = {
  stroke: PALETTE.black,
  'stroke-width': '1.6',
  'stroke-dasharray': '9 3 2 3',
} as const;

/** How the line looks at which another wine came in. */
export const BLENDED_LOOK = {
  stroke: INK.aside,
  'stroke-width': '3',
  'stroke-dasharray': '1.5 1.5',
} as const;

/** How long the arrow of an addition is, in units of the picture. */
export const ARROW = 17;

/** How an arrow looks: open where the amount is not known, narrow where there are many. */
export interface ArrowLook {
  readonly isKnown: boolean;
  readonly isNarrow?: boolean;
}

/** An addition: an arrow upward from its foot. */
export function additionSign(foot: Place, { isKnown, isNarrow = false }: ArrowLook): string {
  const head = { x: foot.x, y: foot.y - ARROW + 5.5 };
  const stem = { stroke: PALETTE.purple, 'stroke-width': isNarrow ? '1.2' : '2.2' };
  const look = isKnown
    ? { fill: PALETTE.purple, stroke: PALETTE.purple, 'stroke-width': '1' }
    : { fill: INK.paper, stroke: PALETTE.purple, 'stroke-width': '1.6' };
  const sign = { type: symbolTriangle, area: isNarrow ? 14 : 48 };
  return lineFrom(foot, head, stem) + shapeAt(head, sign, look);
}

/** A line as it stands beside its word. */
export function lineSample({ x, y }: Place, look: Readonly<Record<string, string>>): string {
  return element('line', { x1: at(x - 13), y1: at(y), x2: at(x + 13), y2: at(y), ...look });
}

/** An upright line as it stands beside its word. */
export function lineSampleUpright({ x, y }: Place, look: Readonly<Record<string, string>>): string {
  return element('line', { x1: at(x), y1: at(y - 8), x2: at(x), y2: at(y + 8), ...look });
}
