import fc from 'fast-check';
import { expect, test } from 'vitest';
import { chartOf } from '../../../../src/chat/attachments/chart/chart-of.ts';
import { chartSvg } from '../../../../src/chat/attachments/chart/chart-svg.ts';
import type { ChartWords } from '../../../../src/chat/attachments/chart/chart-words.ts';
import { CHART_WORDS, chartWords } from '../../../../src/chat/attachments/chart/chart-words.ts';
import { LAYOUT } from '../../../../src/chat/attachments/chart/layout.ts';
import { textWidth } from '../../../../src/chat/attachments/chart/text-width.ts';
import { CASES, MANNER, OPTIONS, addition, entriesOf, reading } from './chart-cases.ts';
import type { ChartCase } from './chart-cases.ts';

const words = (vessel: string, say = (word: string) => word): ChartWords => ({
  vessel,
  words: Object.fromEntries(CHART_WORDS.map((word) => [word, say(word)])),
  manner: MANNER,
});

function svgOf({ entries, options }: ChartCase, said = words(options?.vessel ?? 'T4')): string {
  const data = chartOf(entries, { ...OPTIONS, ...options });
  return data === undefined ? '' : chartSvg(data, said);
}

const count = (svg: string, sign: RegExp): number => svg.match(sign)?.length ?? 0;

test.each(Object.entries(CASES))('the same data make the same picture: %s', (_, one) => {
  expect(svgOf(one)).toBe(svgOf(one));
  expect(svgOf(one)).not.toMatch(/NaN|Infinity|undefined|null/);
});

test('each sample has a dot, a diamond and a bar, each addition an arrow, also where figures have no room', () => {
  const svg = svgOf({ ...CASES['200 readings'], entries: CASES['200 readings']?.entries ?? [] });
  // One more of each is in the legend.
  expect(count(svg, /fill="#0072B2"/g)).toBe(201);
  expect(count(svg, /stroke="#009E73"/g)).toBe(201);
  expect(count(svg, /stroke="#56B4E9"/g)).toBe(201);
  expect(count(svg, /fill="#CC79A7"/g)).toBe(61);
  const figures = count(svg, />\+12</g);
  expect(figures).toBeGreaterThan(10);
  expect(figures).toBeLessThan(60);
});

test.each<[string, string[], string[]]>([
  [
    'usual',
    ['free', 'total', 'bound', 'needed', 'limit', 'added'],
    ['added-thinned', 'added-unknown', 'odd', 'blended'],
  ],
  ['200 readings', ['added-thinned'], ['added']],
  ['one reading of free alone', ['free'], ['total', 'bound', 'needed', 'limit', 'added']],
  ['everything at once', ['odd', 'added', 'added-unknown', 'blended'], ['added-thinned']],
])('a sign is explained where it is drawn, and only there: %s', (name, there, absent) => {
  const one = CASES[name] ?? { entries: [] };
  const data = chartOf(one.entries, { ...OPTIONS, ...one.options });
  const svg = data
    ? chartSvg(
        data,
        chartWords(data, MANNER, ({ key }) => `[${key}]`),
      )
    : '';
  for (const word of there) expect(svg).toContain(`[picture-${word}]`);
  for (const word of absent) expect(svg).not.toContain(`[picture-${word}]`);
});

test.each([60, 200, 400, 3000])(
  'a limit of %i is inside of the plot, above all data that it is above',
  (limit_mg_L) => {
    const svg = svgOf({ entries: entriesOf([reading(0, 21, 58)]), options: { limit_mg_L } });
    const [sample = 0, limit = 0] = [...svg.matchAll(/<line [^>]*y2="([\d.]+)"[^>]*"9 3 2 3"\/>/g)].map(
      ([, y]) => Number(y),
    );
    const totals = [...svg.matchAll(/translate\(([\d.]+) ([\d.]+)\)" fill="#FFFFFF"/g)].map(([, , y]) =>
      Number(y),
    );
    expect(limit).toBeGreaterThan(sample + LAYOUT.legend.row / 2);
    expect(limit).toBeLessThan(totals.at(-1) ?? 0);
  },
);

test('no sign of markup in a name becomes markup', () => {
  const name = `<script>alert(1)</script>&amp;"'><image href="file:///etc/passwd"/>\u0000\u001b\ud800`;
  const svg = svgOf({ entries: entriesOf([reading(0, 21)]) }, words(name));
  expect(svg).not.toMatch(/<(script|image)/);
  expect(svg.isWellFormed()).toBe(true);
  expect(svg).toContain('&lt;script&gt;');
});

test('any log is drawn inside of the picture, and no two labels touch', () => {
  const figure = fc.oneof(fc.integer({ min: 0, max: 200 }), fc.double({ min: 0, max: 10_000, noNaN: true }));
  const when = fc.oneof(fc.integer({ min: 0, max: 60 }), fc.double({ min: 0, max: 9000, noNaN: true }));
  const happening = fc.oneof(
    fc
      .tuple(
        when,
        figure,
        fc.option(figure, { nil: undefined }),
        fc.double({ min: 2.5, max: 4.8, noNaN: true }),
      )
      .map(([at, free, total, ph]) => reading(at, free, total, ph)),
    fc.tuple(when, fc.option(figure, { nil: undefined })).map(([at, added]) => addition(at, added)),
  );
  const log = fc.array(happening, { maxLength: 60 }).map((all) => entriesOf([reading(0, 20), ...all]));
  fc.assert(
    fc.property(log, fc.option(figure, { nil: undefined }), (entries, limit_mg_L) => {
      const svg = svgOf({ entries, options: limit_mg_L === undefined ? {} : { limit_mg_L } });
      const boxes = [
        ...svg.matchAll(
          /<text x="([-\d.]+)" y="([-\d.]+)" font-size="([\d.]+)" text-anchor="(\w+)"[^>]*>([^<]*)</g,
        ),
      ].map(([, x, y, size, anchor, text = '']) => {
        const width = textWidth(text, Number(size));
        const left = Number(x) - (anchor === 'end' ? width : anchor === 'middle' ? width / 2 : 0);
        return { text, left, right: left + width, base: Number(y) };
      });
      expect(boxes.filter(({ left, right }) => left < 4 || right > LAYOUT.width - 4)).toEqual([]);
      const touching = boxes.flatMap((one, i) =>
        boxes.slice(i + 1).filter((other) => {
          const isBeside = one.left < other.right && other.left < one.right;
          return isBeside && Math.abs(one.base - other.base) < 10;
        }),
      );
      expect(touching).toEqual([]);
    }),
    { numRuns: 200 },
  );
});
