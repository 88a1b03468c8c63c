import { describe, expect, test } from 'vitest';
import { SPOKEN } from '../../../src/chat/replies/spoken.ts';
import { LAYOUT } from '../../../src/chat/attachments/chart/layout.ts';
import { POINTS_PER_UNIT, renderPng } from '../../../src/edge/pictures/render-png.ts';
import { CASES } from '../../chat/attachments/chart/chart-cases.ts';
import { pointsOf, svgOf, textsOf } from './picture-of.ts';
import type { DrawnText, Points } from './picture-of.ts';

/** Letters may come as near to the edge as this. */
const EDGE = 4;

const touches = (one: DrawnText, other: DrawnText): boolean =>
  one.left < other.right && other.left < one.right && one.top < other.bottom && other.top < one.bottom;

/** How many points of a rectangle are as dark as letters are. */
function darkIn({ colourAt }: Points, { left, right, top, bottom }: DrawnText): number {
  let count = 0;
  for (let y = Math.floor(top * POINTS_PER_UNIT); y < bottom * POINTS_PER_UNIT; y += 1)
    for (let x = Math.floor(left * POINTS_PER_UNIT); x < right * POINTS_PER_UNIT; x += 1)
      if (Math.max(...colourAt(x, y)) < 0x90) count += 1;
  return count;
}

/** The points around the outermost edge that are not paper. */
function inkOnEdge({ width, height, colourAt }: Points): string[] {
  const edge = [
    ...Array.from({ length: width }, (_, x) => [x, 0] as const),
    ...Array.from({ length: width }, (_, x) => [x, height - 1] as const),
    ...Array.from({ length: height }, (_, y) => [0, y] as const),
    ...Array.from({ length: height }, (_, y) => [width - 1, y] as const),
  ];
  return edge.filter(([x, y]) => Math.min(...colourAt(x, y)) < 255).map((place) => place.join());
}

const DRAWN = SPOKEN.flatMap((language) =>
  Object.entries(CASES).map(([name, one]) => [name, language, one] as const),
);

describe.each(DRAWN)('%s in %s', (_, language, one) => {
  const svg = svgOf(one, language);
  const texts = textsOf(svg);
  const points = pointsOf(renderPng(svg));

  test('it is 400 wide at two points each, and not much higher than a phone is', () => {
    expect(points.width).toBe(LAYOUT.width * POINTS_PER_UNIT);
    expect(points.height / points.width).toBeGreaterThan(0.75);
    expect(points.height / points.width).toBeLessThan(1.4);
  });

  test('every label is there as dark points, because without its font it would vanish without a word', () => {
    const inkOf = texts.map((text) => [text.text, darkIn(points, text) > 6] as const);
    expect(inkOf.filter(([, isThere]) => !isThere)).toEqual([]);
    expect(texts.length).toBeGreaterThan(7);
  });

  test('nothing is cut off: the edge of the image is paper, and letters keep away from it', () => {
    expect(inkOnEdge(points)).toEqual([]);
    const height = points.height / POINTS_PER_UNIT;
    const near = texts.filter(
      ({ left, right, top, bottom }) =>
        left < EDGE || right > LAYOUT.width - EDGE || top < EDGE || bottom > height - EDGE,
    );
    expect(near).toEqual([]);
  });

  test('no label touches another', () => {
    const pairs = texts.flatMap((text, i) =>
      texts.slice(i + 1).flatMap((other) => (touches(text, other) ? [`${text.text} × ${other.text}`] : [])),
    );
    expect(pairs).toEqual([]);
  });
});

test('the check finds a label that has no letters, one that is cut off, and two that touch', () => {
  const text = (x: number, y: number, what: string): string =>
    `<text x="${x}" y="${y}" font-size="12" font-family="Noto Sans">${what}</text>`;
  const head = '<svg xmlns="http://www.w3.org/2000/svg" width="400" height="60" viewBox="0 0 400 60">';
  const paper = '<rect width="400" height="60" fill="#FFFFFF"/>';
  const drawn = `${head}${paper}${text(-3, 40, 'free')}${text(15, 44, 'total')}</svg>`;
  const [free, total] = textsOf(drawn);
  if (free === undefined || total === undefined) throw new TypeError('Two texts were drawn');
  expect(touches(free, total)).toBe(true);
  expect(inkOnEdge(pointsOf(renderPng(drawn)))).not.toEqual([]);
  expect(darkIn(pointsOf(renderPng(drawn)), total)).toBeGreaterThan(6);
  expect(darkIn(pointsOf(renderPng(`${head}${paper}</svg>`)), total)).toBe(0);
});
