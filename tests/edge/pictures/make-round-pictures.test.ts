import { expect, test } from 'vitest';
import type { Errand } from '../../../src/chat/conversation/ports.ts';
import { roundSvg } from '../../../src/chat/attachments/round/round-svg.ts';
import { textWidth } from '../../../src/chat/attachments/chart/text-width.ts';
import { makeRoundPictures } from '../../../src/edge/pictures/make-round-pictures.ts';
import { say, startTalk } from '../../chat/conversation/talk.ts';

const PNG = [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a];

async function sheetOf(round: string): Promise<Extract<Errand, { kind: 'round-sheet' }>> {
  const talk = startTalk();
  await talk.write(round);
  const { errand } = await talk.write('sheet picture');
  if (errand?.kind !== 'round-sheet') throw new TypeError('There is no sheet');
  return errand;
}

const roundOf = (count: number): string =>
  Array.from({ length: count }, (_, at) => `T${at + 1} ${10 + at} hl pH 3.4 free 20`).join('\n');

test('a short round is one picture, a long one several, of twenty lines each', async () => {
  const one = await makeRoundPictures(await sheetOf(roundOf(20)), 0, say);
  expect(one.map(({ name }) => name)).toEqual(['weigh-out-2026-10-05.png']);
  const many = await makeRoundPictures(await sheetOf(roundOf(45)), 0, say);
  expect(many.map(({ name }) => name)).toEqual([1, 2, 3].map((page) => `weigh-out-2026-10-05-${page}.png`));
  for (const { bytes } of [...one, ...many]) expect([...bytes.subarray(0, 8)]).toEqual(PNG);
});

const row = { name: 'T1', facts: '10 hL', amount: '21 g', aside: '', isToDo: true };
const page = { title: 'Sheet', corner: '5 Oct', totals: [], rows: [row], foot: [] };

test('the same page makes the same picture, and no name of a vessel becomes markup', () => {
  expect(roundSvg(page)).toBe(roundSvg(page));
  const evil = roundSvg({ ...page, rows: [{ ...row, name: '"/><image href="file:///x"/>' }] });
  expect(evil).not.toContain('<image');
});

test('nothing stands beyond the edge, however long a name or an amount is', () => {
  const long = 'Foudre of the north wing behind the old press, Blanca 2026';
  const svg = roundSvg({
    ...page,
    title: long,
    totals: [long + long],
    rows: [{ ...row, name: long, facts: long, amount: '1.443 L', aside: '6 % SO2 solution in water' }],
    foot: [long + long],
  });
  const texts = [
    ...svg.matchAll(/<text x="([\d.]+)" y="[\d.]+" font-size="([\d.]+)" text-anchor="(\w+)"[^>]*>([^<]*)</g),
  ];
  expect(texts.length).toBeGreaterThan(5);
  for (const [, x = '', size = '', anchor, text = ''] of texts) {
    const wide = textWidth(text, Number(size));
    const left = anchor === 'end' ? Number(x) - wide : Number(x);
    expect({ text, isInside: left >= 0 && left + wide <= 400 }).toEqual({ text, isInside: true });
  }
});

test('only what is to be done has a box to tick', () => {
  const boxes = (svg: string): number => [...svg.matchAll(/fill="none"/g)].length;
  expect(boxes(roundSvg(page))).toBe(1);
  expect(boxes(roundSvg({ ...page, rows: [{ ...row, isToDo: false }] }))).toBe(0);
});
