import type { LoggedEntry } from '../../core/cellar/entry.ts';
import { offsetAt } from '../../core/time/offset-at.ts';
import { DAY_ms } from '../../core/time/durations.ts';
import { litresTo } from '../../core/units/volume.ts';
import type { Cell } from './cell.ts';
import type { ShownColumn } from './columns.ts';
import type { ExportWord } from './export-words.ts';
import type { WineThen } from './wine-then.ts';

/** What the cells of a row are made from. */
export interface RecordRow {
  readonly entry: LoggedEntry;
  readonly zone: string;
  /** How the person is called who noted it. */
  readonly person: string;
  readonly wine: WineThen;
  /** What was left in store after it, in the unit of its amount. */
  readonly left: number | undefined;
  readonly words: Readonly<Record<ExportWord, string>>;
}

/**
 * Days after which an entry is marked late: records are to be made within 3 days (Australia, Wine Australia Act 2013,
 * Label Integrity Program), by the third business day (US, 27 CFR 24.300(b)); plain days here.
 */
const LATE_days = 3;

/** The cells that follow from an entry and are for the eye. */
export const SHOWN_CELLS: Readonly<Record<ShownColumn, (row: RecordRow) => Cell>> = {
  done: ({ entry, zone }) => onTheWall(entry.at, zone),
  noted: ({ entry, zone }) => onTheWall(entry.noted_at, zone),
  late: ({ entry, words }) => (entry.noted_at - entry.at > LATE_days * DAY_ms ? words['is-late'] : undefined),
  person: ({ person }) => person,
  'wine-lot': ({ wine }) => wine.lot,
  wine: ({ wine }) => wine.wine,
  'us-gallons': ({ entry }) =>
    'volume_L' in entry && entry.volume_L !== undefined
      ? rounded(litresTo(entry.volume_L, 'galUS'))
      : undefined,
  'stock-left': ({ left }) => left,
  calculated: ({ entry, words }) => {
    if (entry.kind === 'other') return words['is-not-calculated'];
    if (entry.kind !== 'addition' && entry.kind !== 'order') return undefined;
    const known = entry.SO2_g ?? entry.added_mg_L;
    return known === undefined ? words['is-not-calculated'] : words['is-calculated'];
  },
  'struck-reason': ({ entry }) => entry.struck?.reason,
};

const onTheWall = (at: number, zone: string): Cell => ({ local_ms: at + offsetAt(at, zone) });

/** To 0.001 of its unit: for the eye, no trace of a conversion far behind the point. */
const rounded = (value: number): number => Math.round(value * 1000) / 1000;
