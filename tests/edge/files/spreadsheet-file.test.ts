import { unzipSync } from 'fflate';
import { expect, test } from 'vitest';
import type { Entry } from '../../../src/core/cellar/entry.ts';
import { struckIn } from '../../chat/attachments/any-log.ts';
import { exportOf } from './export-of.ts';

const at = Date.UTC(2026, 6, 12, 8, 30);
const noting = (entry: number) => ({ entry, key: `k${entry}`, at, noted_at: at, by: 1 });
const LOG: Entry[] = [
  { ...noting(1), kind: 'addition', vessels: ['tank 4'], mass_g: 256.25 },
  { ...noting(2), kind: 'correction', vessels: ['tank 4'], corrects: 1, reason: 'typo' },
];

async function partsOf(): Promise<(name: string) => string> {
  const bytes = await exportOf(struckIn(LOG), { format: 'xlsx' });
  const parts = unzipSync(bytes);
  return (name) => new TextDecoder().decode(parts[name]);
}

test('the headings stay in sight and columns have a width', async () => {
  const sheet = (await partsOf())('xl/worksheets/sheet1.xml');
  expect(sheet).toMatch(/<pane [^>]*ySplit="1"[^>]*state="frozen"/);
  expect(sheet).toMatch(/<col min="1" max="1" width="8"/);
});

test('a time is the day and the hour of the clock on the wall, as a spreadsheet counts them', async () => {
  const sheet = (await partsOf())('xl/worksheets/sheet1.xml');
  // 10:30 in Madrid in summer. Days since 30 December 1899 (ISO/IEC 29500-1, 18.17.4.1): 25,569 to 1970.
  const days = Date.UTC(2026, 6, 12, 10, 30) / 86_400_000 + 25_569;
  const [, cell] = /<c r="C2"[^>]*><v>([\d.]+)<\/v>/.exec(sheet) ?? [];
  expect(Number(cell)).toBeCloseTo(days, 6);
});

test('what was taken back is struck out, the rest is not', async () => {
  const part = await partsOf();
  const styles = part('xl/styles.xml');
  const fonts = [...styles.matchAll(/<font>.*?<\/font>/gs)].map(([font]) => font.includes('<strike'));
  const formats = [
    ...(/<cellXfs.*<\/cellXfs>/s.exec(styles)?.[0] ?? '').matchAll(/<xf [^>]*fontId="(\d+)"/g),
  ];
  const isStruck = (cell: string): boolean => {
    const [, style = '0'] =
      new RegExp(`<c r="${cell}"[^>]* s="(\\d+)"`).exec(part('xl/worksheets/sheet1.xml')) ?? [];
    return fonts[Number(formats[Number(style)]?.[1] ?? 0)] === true;
  };
  expect([isStruck('A2'), isStruck('G2'), isStruck('A3'), isStruck('G3')]).toEqual([
    true,
    true,
    false,
    false,
  ]);
});
