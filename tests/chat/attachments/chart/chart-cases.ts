import type { LoggedEntry, NewEntry } from '../../../../src/core/cellar/entry.ts';
import type { ChartManner } from '../../../../src/chat/attachments/chart/chart-manner.ts';
import type { ChartOptions } from '../../../../src/chat/attachments/chart/chart-of.ts';
import { READER_DEFAULTS } from '../../../../src/chat/reader/reader-defaults.ts';

/** Days after 1 November 2026, 9:00 in UTC. */
export const day = (count: number): number => Date.UTC(2026, 10, 1, 9) + count * 86_400_000;

/** What an entry of a case says; the rest of it is as usual. */
export type Told = Partial<NewEntry> & Record<string, unknown>;

/** Entries with their numbers, of the vessel `tank 4` where they name no other. */
export function entriesOf(told: readonly Told[]): LoggedEntry[] {
  return told.map((one, i) => {
    const entry = i + 1;
    const usual = { entry, key: `k${entry}`, at: day(i), noted_at: day(i), by: 1, vessels: ['tank 4'] };
    return { ...usual, ...one } as unknown as LoggedEntry;
  });
}

/** A reading on a day; figures in mg/L. */
export const reading = (at: number, free_mg_L?: number, total_mg_L?: number, ph?: number): Told => ({
  kind: 'reading',
  at: day(at),
  ...(free_mg_L !== undefined && { free_mg_L }),
  ...(total_mg_L !== undefined && { total_mg_L }),
  ...(ph !== undefined && { ph }),
});

/** An addition on a day, in mg/L where that is known. */
export const addition = (at: number, added_mg_L?: number): Told => ({
  kind: 'addition',
  at: day(at),
  additive: 'potassium-metabisulfite',
  ...(added_mg_L === undefined ? { mass_g: 250 } : { added_mg_L }),
});

/** How most pictures are made. */
export const OPTIONS: ChartOptions = { vessel: 'tank 4', targets: READER_DEFAULTS.targets, basis: 'pk-1.81' };

/** How most pictures tell figures and days. */
export const MANNER: ChartManner = {
  telling: { zone: 'Europe/Madrid', language: 'en', now: day(60) },
  mark: '.',
  unit: 'mg/L',
};

/** A log to make a picture of, and what is not as usual. */
export interface ChartCase {
  readonly entries: LoggedEntry[];
  readonly options?: Partial<ChartOptions>;
  readonly manner?: Partial<ChartManner>;
}

const often = (count: number, step: number): Told[] =>
  Array.from({ length: count }, (_, i) => {
    const free = 22 + 12 * Math.sin(i / 7) + (i % 5);
    return reading(i * step, Math.round(free), Math.round(free + 45 + i / 4), 3.4 + (i % 40) / 200);
  });

/** What a cellar may hand in, from the usual to the odd. */
export const CASES: Readonly<Record<string, ChartCase>> = {
  usual: {
    entries: entriesOf([
      reading(0, 21, 58, 3.58),
      addition(1, 30),
      reading(4, 38, 86),
      reading(18, 30, 84, 3.61),
      reading(33, 24, 82),
      addition(34, 25),
      reading(37, 40.5, 104, 3.55),
    ]),
    options: { limit_mg_L: 150 },
  },
  'one reading': { entries: entriesOf([reading(0, 21, 58, 3.58)]) },
  'one reading of free alone': { entries: entriesOf([reading(0, 21)]) },
  'total alone': { entries: entriesOf([reading(0, undefined, 58), reading(20, undefined, 61)]) },
  'some without total': {
    entries: entriesOf([reading(0, 21, 58, 3.4), reading(9, 18), reading(16, 17), reading(30, 15, 57)]),
  },
  'two years': {
    entries: entriesOf([
      ...often(50, 15),
      ...[10, 80, 200, 330, 340, 500, 640].map((at, i) => addition(at, 20 + i * 5)),
    ]),
    options: { limit_mg_L: 200 },
  },
  'twenty years': { entries: entriesOf(often(120, 61)) },
  '200 readings': {
    entries: entriesOf([...often(200, 2), ...Array.from({ length: 60 }, (_, i) => addition(i * 6.5, 12))]),
    options: { limit_mg_L: 200 },
  },
  'an addition without mg/L': {
    entries: entriesOf([reading(0, 21, 58, 3.5), addition(2), addition(9, 20), reading(12, 38, 90)]),
  },
  'free above total': {
    entries: entriesOf([reading(0, 21, 58), reading(6, 40, 25, 3.5), reading(9, 24, 60)]),
  },
  'all at 0': { entries: entriesOf([reading(0, 0, 0), reading(10, 0, 0)]) },
  'very large': {
    entries: entriesOf([reading(0, 1000, 10_000, 3.5), addition(1, 10_000), reading(9, 900, 9800)]),
    options: { limit_mg_L: 400 },
  },
  'very small': { entries: entriesOf([reading(0, 0.1, 0.35), reading(10, 0.25, 0.4)]) },
  'a struck reading': {
    entries: entriesOf([
      reading(0, 21, 58, 3.5),
      { ...reading(2, 999, 999), struck: { entry: 3, reason: 'typed wrong' } },
      { kind: 'correction', at: day(3), corrects: 2, reason: 'typed wrong' },
      reading(5, 20, 58),
    ]),
  },
  'markup in the name': {
    entries: entriesOf(
      [reading(0, 21, 58, 3.5), reading(9, 19)].map((one) => ({
        ...one,
        vessels: [`<b>&"T'4</b>\u0007\ud800`],
      })),
    ),
    options: { vessel: `<b>&"T'4</b>\u0007\ud800` },
  },
  'a long name': {
    entries: entriesOf(
      [reading(0, 21, 58, 3.5)].map((one) => ({
        ...one,
        vessels: ['OLD WEST CELLAR UPRIGHT TANK NUMBER 17B'],
      })),
    ),
    options: { vessel: 'OLD WEST CELLAR UPRIGHT TANK NUMBER 17B' },
  },
  'several additions in a day': {
    entries: entriesOf([
      reading(0, 21, 58, 3.5),
      ...[10, 10.1, 10.2, 10.3, 11].map((at) => addition(at, 15)),
      reading(14, 60, 130),
      reading(40, 50, 128),
    ]),
  },
  'its pH not known for a while': {
    entries: entriesOf([
      reading(0, 21, 58, 3.58),
      reading(10, 19),
      { kind: 'vessel', event: 'acid', at: day(12) },
      reading(20, 18),
      reading(26, 18, 57, 3.41),
      { kind: 'vessel', event: 'blended', at: day(31), vessels: ['tank 9'], to: 'tank 4' },
      reading(34, 25, 70),
    ]),
    options: { limit_mg_L: 150 },
  },
  'long words for days': {
    entries: entriesOf(often(30, 3)),
    manner: { telling: { zone: 'America/Sao_Paulo', language: 'pt', now: day(900) }, mark: ',' },
  },
  'everything at once': {
    entries: entriesOf([
      reading(0, 21, 58, 3.58),
      addition(3),
      addition(6, 22.5),
      reading(8, 60, 40),
      { kind: 'vessel', event: 'blended', at: day(31), vessels: ['tank 9'], to: 'tank 4' },
      reading(34, 25, 70, 3.5),
    ]),
    options: { limit_mg_L: 200 },
    manner: { mark: ',', unit: 'ppm' },
  },
};
