import type { AdditiveAtHand } from '../../../core/additives/additive-id.ts';
import { dayText, type Telling } from '../../replies/moment-text.ts';
import { numberText, type DecimalMark } from '../../replies/number-text.ts';
import { measureText } from '../../replies/quantity-text.ts';
import { volumeText } from '../../replies/volume-text.ts';
import type { Weighed } from '../../../core/dose/totals-to-fetch.ts';
import type { RoundRow, RoundSheet } from './round-sheet.ts';
import type { ShownPage, ShownRow } from './round-svg.ts';
import { roundPages } from './round-pages.ts';
import type { RoundWords } from './round-words.ts';

/** So many names without an amount stand under the last picture. */
const MOST_NAMES = 12;

/** How days are told, the totals as they are said, and how an additive is called. */
export interface PageManner {
  readonly telling: Telling;
  readonly totals: readonly string[];
  readonly nameOf: (additive: AdditiveAtHand) => string;
}

/** The pages of a sheet in words: the totals above the first, what has no amount under the last. */
export function shownPages(
  sheet: RoundSheet,
  words: RoundWords,
  { telling, totals, nameOf }: PageManner,
): ShownPage[] {
  const pages = roundPages(sheet.rows);
  const open = sheet.rows.filter(({ is }) => is === 'open').map(({ name }) => name);
  const names = `${open.slice(0, MOST_NAMES).join(', ')}${open.length > MOST_NAMES ? ' …' : ''}`;
  const day = dayText(sheet.at, telling);
  return pages.map((rows, at) => ({
    title: words.title,
    corner: pages.length === 1 ? day : `${day} · ${at + 1}/${pages.length}`,
    totals: at === 0 ? totals : [],
    rows: rows.map((row) =>
      shownRow(row, words, { mark: sheet.mark, nameOf: totals.length > 1 ? nameOf : () => '' }),
    ),
    foot: [...(at === pages.length - 1 && open.length > 0 ? [`${words.open} ${names}`] : []), words.caution],
  }));
}

interface RowManner {
  readonly mark: DecimalMark;
  /** Says nothing where all rows take the same. */
  readonly nameOf: (additive: AdditiveAtHand) => string;
}

function shownRow(row: RoundRow, words: RoundWords, { mark, nameOf }: RowManner): ShownRow {
  const [first, rest] = row.weighed;
  const count = first?.count ?? 1;
  const asides = [
    ...(row.isLimited ? [words.limit] : []),
    ...(count > 1 ? [`× ${count}`] : []),
    ...(first === undefined || first.measure.unit === 'tablets' ? [] : [nameOf(first.additive)]),
    ...(rest === undefined ? [] : [restText(rest, words, mark)]),
  ];
  return {
    name: row.name,
    facts: factsText(row, words, mark),
    amount: first === undefined ? '' : amountText(first, words, mark),
    aside: row.is === 'nothing' ? words.nothing : asides.filter((one) => one !== '').join(' · '),
    isToDo: row.is === 'amount',
  };
}

/** The rest of a dose in tablets, with the strength of its stock: the totals above have its name. */
function restText(rest: Weighed, words: RoundWords, mark: DecimalMark): string {
  const { strength_percent } = rest.additive;
  const strength = strength_percent === undefined ? '' : ` · ${numberText(strength_percent, 2, mark)} %`;
  return `+ ${amountText(rest, words, mark)}${strength}`;
}

function amountText({ measure }: Weighed, words: RoundWords, mark: DecimalMark): string {
  const text = measureText(measure, mark);
  return measure.unit === 'tablets' ? `${text} ${words.tablets.toLowerCase()}` : text;
}

function factsText(
  { volume_L, volumeUnit, ph, free_mg_L, weighed }: RoundRow,
  words: RoundWords,
  mark: DecimalMark,
): string {
  const count = weighed[0]?.count ?? 1;
  const volume =
    volume_L === undefined
      ? []
      : [volumeText(volume_L / count, volumeUnit ?? 'L', mark).replace(/\s\(.*\)$/, '')];
  return [
    ...volume,
    ...(ph === undefined ? [] : [`${words.ph} ${numberText(ph, 2, mark)}`]),
    ...(free_mg_L === undefined ? [] : [`${words['free-short']} ${numberText(free_mg_L, 1, mark)}`]),
  ].join(' · ');
}
