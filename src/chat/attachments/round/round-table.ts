import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import type { Weighed } from '../../../core/dose/totals-to-fetch.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import type { Cell, Sheet } from '../cell.ts';
import type { RoundRow, RoundSheet } from './round-sheet.ts';
import { roundTotals } from './round-totals.ts';
import type { RoundWord, RoundWords, SayLine } from './round-words.ts';

/** A column of the sheet: its word, its width in letters, and the decimals that are shown. */
const COLUMNS: readonly (readonly [word: RoundWord, letters: number, decimals?: number])[] = [
  ['vessel', 16],
  ['volume', 10, 1],
  ['ph', 7, 2],
  ['free', 10, 1],
  ['total', 10, 1],
  ['dose', 10, 1],
  ['weigh', 10, 2],
  ['measure', 11, 1],
  ['tablets', 9, 1],
  ['additive', 28],
  ['strength', 10, 2],
  ['after', 12, 0],
  ['note', 40],
  ['done', 8],
];

type Cells = Partial<Record<RoundWord, Cell>>;

/** How additives are called. */
export type AdditiveNames = (id: AdditiveId) => string;

/**
 * The weigh-out sheet as rows of a file: a row for each vessel and each thing that is measured for it, an empty cell to
 * tick, then what to fetch in all, then the lines without an amount and why.
 */
export function roundTable(
  { rows }: Pick<RoundSheet, 'rows'>,
  words: RoundWords,
  { sayLine, nameOf }: { readonly sayLine: SayLine; readonly nameOf: AdditiveNames },
): Sheet {
  const done = rows.filter(({ is }) => is !== 'open');
  const open = rows.filter(({ is }) => is === 'open');
  const cells: Cells[] = [
    ...done.flatMap((row) => cellsOf(row, nameOf, noteOf(row, words, sayLine))),
    ...roundTotals(rows).map(({ additive, ...total }): Cells => ({
      vessel: words['in-all'],
      weigh: total.mass_g,
      measure: total.additive_volume_mL,
      tablets: total.tablets,
      additive: nameOf(additive),
      strength: total.strength_percent,
    })),
    ...open.map((row): Cells => ({ ...factsOf(row, row.name), note: row.lines.map(sayLine).join(' ') })),
  ];
  const used = COLUMNS.filter(
    ([word]) => word === 'done' || cells.some((row) => row[word] !== undefined && row[word] !== ''),
  );
  return {
    columns: used.map(([word, letters, decimals]) => ({
      heading: words[word],
      letters,
      ...(decimals !== undefined && { decimals }),
    })),
    rows: cells.map((row) => used.map(([word]) => row[word])),
    struck: cells.map(() => false),
  };
}

function noteOf({ is, lines, isLimited }: RoundRow, words: RoundWords, sayLine: SayLine): string {
  if (is === 'nothing') return words.nothing;
  const warnings = lines.filter(({ key }) => key.startsWith('warning-')).map(sayLine);
  return [...(isLimited ? [words.limit] : []), ...warnings].join(' ');
}

/** A row for each vessel, and for tablets and the rest of their dose one each. */
function cellsOf(row: RoundRow, nameOf: AdditiveNames, note: string): Cells[] {
  const names = row.vessels.length > 1 ? row.vessels.map(vesselName) : [row.name];
  return names.flatMap((name): Cells[] => {
    const facts = { ...factsOf(row, name), note };
    if (row.weighed.length === 0) return [facts];
    return row.weighed.map((one, at): Cells => ({
      ...(at === 0
        ? { ...facts, dose: rounded(row.dose_mg_L), after: rounded(row.free_after_mg_L) }
        : { vessel: name }),
      ...amountOf(one),
      additive: nameOf(one.additive.id),
      strength: one.additive.strength_percent,
    }));
  });
}

/** A computed figure to 0.1, for the eye: what is weighed stands beside it. */
const rounded = (mg_L: number | undefined): number | undefined =>
  mg_L === undefined ? undefined : Number(mg_L.toFixed(1));

function factsOf({ vessels, volume_L, ph, free_mg_L, total_mg_L }: RoundRow, vessel: string): Cells {
  const each_L = volume_L === undefined ? undefined : volume_L / Math.max(1, vessels.length);
  return {
    vessel,
    volume: each_L === undefined ? undefined : Number(each_L.toFixed(1)),
    ph,
    free: free_mg_L,
    total: total_mg_L,
  };
}

/** A measure in the column of its unit: grams and millilitres throughout, so that a column can be added up. */
function amountOf({ measure: { value, unit } }: Weighed): Cells {
  switch (unit) {
    case 'g':
      return { weigh: value };
    case 'kg':
      return { weigh: Number((value * 1000).toFixed(2)) };
    case 'mL':
      return { measure: value };
    case 'L':
      return { measure: Number((value * 1000).toFixed(2)) };
    case 'tablets':
      return { tablets: value };
  }
}
