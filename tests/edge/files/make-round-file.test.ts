import { expect, test } from 'vitest';
import type { Errand } from '../../../src/chat/conversation/ports.ts';
import { makeRoundFile } from '../../../src/edge/files/make-round-file.ts';
import { readCsv } from '../../../src/edge/files/read-csv.ts';
import { readXlsx } from '../../../src/edge/files/read-xlsx.ts';
import { say, startTalk } from '../../chat/conversation/talk.ts';

type SheetErrand = Extract<Errand, { kind: 'round-sheet' }>;

async function sheetOf(round: string): Promise<SheetErrand> {
  const talk = startTalk();
  await talk.write(round);
  const { errand } = await talk.write('sheet csv');
  if (errand?.kind !== 'round-sheet') throw new TypeError('There is no sheet');
  return errand;
}

const ROUND =
  'kmbs\nT1 10 hl pH 3.4 free 20\nB1-B3 225 L pH 3.5 free 20\nT2 10 hl pH 3.2 free 40\nT3 10 hl pH 36 free 20';

test('the sheet has a row for each vessel, the sum, and what has no amount with its reason', async () => {
  const { name, bytes } = await makeRoundFile(await sheetOf(ROUND), 'csv', say);
  expect(name).toBe('weigh-out-2026-10-05.csv');
  const { rows } = readCsv(new TextDecoder().decode(bytes).replace('\uFEFF', ''));
  const [heading = [], ...below] = rows;
  const cell = (row: number, word: string): unknown => below[row]?.[heading.indexOf(word)];
  expect(below.map(([vessel]) => vessel)).toEqual(['T1', 'B1', 'B2', 'B3', 'T2', 'In all', 'T3']);
  expect(below.map((_, at) => cell(at, 'Weigh g'))).toEqual(['21', '7.8', '7.8', '7.8', '', '44.4', '']);
  expect([cell(1, 'Volume L'), cell(4, 'Note')]).toEqual(['225', 'Nothing to add']);
  expect(cell(6, 'Note')).toMatch(/^T3: “pH 36”/);
  expect(heading).not.toContain('Tablets');
});

test('a spreadsheet has the same rows, with numbers as numbers', async () => {
  const { bytes } = await makeRoundFile(await sheetOf(ROUND), 'xlsx', say);
  const { rows } = await readXlsx(bytes);
  const [heading = [], first = []] = rows;
  expect(first[heading.indexOf('Weigh g')]).toBe(21);
  expect(rows).toHaveLength(8);
});

test('tablets and the rest of their dose are a row each, and no text is a formula', async () => {
  const sheet = await sheetOf('T1 900 L pH 3.5 free 10, 5 g tabs\nT2 900 L pH 3.5 free 10, 5 g tabs');
  const evil = {
    ...sheet,
    sheet: { ...sheet.sheet, rows: sheet.sheet.rows.map((row) => ({ ...row, name: '=1+1' })) },
  };
  const { bytes } = await makeRoundFile(evil, 'csv', say);
  const text = new TextDecoder().decode(bytes);
  expect(text).not.toMatch(/(^|,)=1/m);
  const { rows } = readCsv(text.replace('\uFEFF', ''));
  expect(rows).toHaveLength(1 + 4 + 2);
});
