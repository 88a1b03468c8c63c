import { describe, expect, test } from 'vitest';
import type { ChartManner } from '../../../../src/chat/attachments/chart/chart-manner.ts';
import { chartOf } from '../../../../src/chat/attachments/chart/chart-of.ts';
import { pictureLines } from '../../../../src/chat/attachments/chart/picture-lines.ts';
import { pictureName } from '../../../../src/chat/attachments/chart/picture-name.ts';
import { makeSay } from '../../../../src/chat/replies/say.ts';
import { loadLocales } from '../../../../src/edge/locales.ts';
import { CASES, MANNER, OPTIONS, addition, day, entriesOf, reading } from './chart-cases.ts';
import type { ChartCase, Told } from './chart-cases.ts';

const say = makeSay(loadLocales());

function textOf({ entries, options = {}, manner = {} }: ChartCase): string {
  const told: ChartManner = { ...MANNER, ...manner };
  const all = { ...OPTIONS, ...options };
  const lines = pictureLines(chartOf(entries, all), { vessel: all.vessel, manner: told });
  return say({ language: told.telling.language, lines, buttons: [] }).text;
}

const CASE = (name: string): ChartCase => CASES[name] ?? { entries: [] };
const ofEntries = (...told: Told[]): string => textOf({ entries: entriesOf(told) });

test('the text beside a picture says what it shows', () => {
  expect(textOf(CASE('usual')).split('\n')).toEqual([
    'T4 since 1 Nov. Readings: 5, additions: 2.',
    'Free 40.5 mg/L (8 Dec), total 104 mg/L (8 Dec), bound 63.5 mg/L (8 Dec).',
    'pH 3.55 (8 Dec): 0.8 molecular takes 45 mg/L free.',
    'Limit of total: 150 mg/L.',
    'Added, mg/L: 30 (2 Nov), 25 (5 Dec).',
  ]);
});

test('figures are told as the person writes them', () => {
  const text = textOf({ ...CASE('usual'), manner: { mark: ',', unit: 'ppm' } });
  expect(text).toContain('Free 40,5 ppm (8 Dec), total 104 ppm (8 Dec), bound 63,5 ppm (8 Dec).');
});

describe('what a picture must not hide', () => {
  test.each<[string, string, string]>([
    [
      'an addition whose mg/L are not known',
      textOf(CASE('an addition without mg/L')),
      'not known (3 Nov), 20 (10 Nov)',
    ],
    [
      'free above total',
      textOf(CASE('free above total')),
      'Free above total (7 Nov): one of the two is wrong',
    ],
    ['a pH that is not known', textOf(CASE('one reading of free alone')), 'pH not known now'],
    [
      'a blend',
      textOf(CASE('everything at once')),
      'Blended on 2 Dec: the figures before are of another wine.',
    ],
    [
      'an addition that nobody measured after',
      ofEntries(reading(0, 21), addition(3, 30)),
      'Free not measured since the addition of 4 Nov.',
    ],
    [
      'a vessel that is empty',
      ofEntries(reading(0, 21), { kind: 'vessel', event: 'emptied', at: day(4) }),
      'Empty since 5 Nov.',
    ],
    [
      'where its wine came from',
      ofEntries(
        { kind: 'vessel', event: 'moved', at: day(1), vessels: ['tank 9'], to: 'tank 4' },
        reading(4, 21),
      ),
      'It came from T9 on 2 Nov: earlier figures are there.',
    ],
    [
      'a wine without a usual target',
      ofEntries({ kind: 'vessel', event: 'told', at: day(0), stage: 'fermenting' }, reading(1, 21, 50, 3.5)),
      'No usual target for it now.',
    ],
  ])('%s', (_, text, line) => {
    expect(text).toContain(line);
  });
});

test('bound is told of one sample, never of a total with a later free', () => {
  expect(ofEntries(reading(0, 21, 58), reading(9, 18))).toContain(
    'Free 18 mg/L (10 Nov), total 58 mg/L (1 Nov), bound 37 mg/L (1 Nov).',
  );
});

test('of many additions the newest are told and the others counted; it stays short enough for a caption', () => {
  const text = textOf(CASE('200 readings'));
  expect(text).toContain('54 earlier');
  for (const one of Object.values(CASES)) expect(textOf(one).length).toBeLessThan(1024);
});

test('where nothing was measured there is no picture, and it says so', () => {
  expect(textOf({ entries: [] })).toBe('No picture of T4: no SO2 measured yet in the wine that is in it.');
});

test.each([
  ['tank 4', 'tank-4.png'],
  ['FV3', 'fv3.png'],
  ['../../etc/passwd', 'etc-passwd.png'],
  ['Fût n° 7', 'fut-n-7.png'],
  ['酒', 'vessel.png'],
  ['x'.repeat(300), `${'x'.repeat(60)}.png`],
])('the file of %s is called %s', (vessel, name) => {
  expect(pictureName(vessel)).toBe(name);
});
