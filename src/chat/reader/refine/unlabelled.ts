import type { Board } from '../board.ts';
import {
  decimalAt,
  figureAt,
  find,
  isCue,
  isFound,
  isFree,
  isMark,
  placeOf,
  refuse,
  saysMany,
  setAside,
  termAt,
} from '../board.ts';
import { isCellarTalk } from '../cellar-talk.ts';
import { MOST_UNLABELLED_FREE_mg_L } from '../finders/keep-labelled.ts';
import { isPhLike } from '../ph-like.ts';
import { holdsUnknownVerb, isNegated, isOfUnknown, speaksOfAdding } from './unsaid.ts';
import { isForeignAim } from '../foreign-aim.ts';
import { mayBeOrder } from './may-be-order.ts';
import { isStranger, strangerBefore } from '../stranger.ts';
import { concentrationAt, mg_L_IN } from '../units.ts';

const isWhole = (board: Board, i: number): boolean =>
  termAt(board, i).value === undefined && /^\d+$/.test(termAt(board, i).text);

/** Whether the figure ends or begins a range with a figure beside it: `18-20`. */
function rangeEnd(board: Board, i: number): number | undefined {
  const joins =
    (isMark(board, i + 1, '-') && termAt(board, i + 1).gap === (board.terms[i + 2]?.gap ?? false)) ||
    isCue(board, i + 1, 'to');
  return joins &&
    isFree(board, i + 2) &&
    isPhLike(board, i) === isPhLike(board, i + 2) &&
    !(isMark(board, i + 1, '-') && termAt(board, i + 1).gap)
    ? i + 2
    : undefined;
}

/** `23 Chard`: the vintage, or free SO2? */
function mayBeVintage(board: Board, i: number): boolean {
  const { value } = figureAt(board, i);
  const beside = isCue(board, i + 1, 'variety') || (isCue(board, i - 1, 'variety') && termAt(board, i).gap);
  return beside && value >= 10 && value <= 30 && concentrationAt(board, i + 1) === undefined;
}

const isAfterInto = (board: Board, i: number): boolean =>
  isCue(board, i - 1, 'in') && !isCue(board, i - 1, 'is');

/** `50 of kmbs`: grams or mg/L of an additive, and no reading. */
const isOfAdditive = (board: Board, i: number): boolean =>
  isCue(board, i + 1, 'of') && board.terms[i + 2]?.tags.some((tag) => tag.startsWith('additive:')) === true;

/** An article alone names no tank: `the 4`. */
const isAfterArticle = (board: Board, i: number): boolean =>
  isCue(board, i - 1, 'article') || isMark(board, i - 1, '#');

/** `at 3.30`, `meeting 3.30` may be the clock. */
const isTimeLike = (board: Board, i: number, isOnly: boolean): boolean =>
  /^\d\.[0-5]\d$/.test(termAt(board, i).text) &&
  (isCue(board, i - 1, 'clock-before') ||
    (isOnly && isStranger(board, i - 1) && /^\p{Ll}/u.test(placeOf(board, i - 1, i - 1).text)));

function findPh(board: Board, candidates: readonly number[]): void {
  const likely = candidates.filter((i) => isPhLike(board, i) && concentrationAt(board, i + 1) === undefined);
  if (isFound(board, 'ph') || likely.length === 0) return;
  if (likely.length > 1 && new Set(likely.map((i) => decimalAt(board, i).value)).size > 1) {
    for (const i of likely)
      if (isFree(board, i)) refuse(board, 'ambiguous-number', i, rangeEnd(board, i) ?? i);
    return;
  }
  const [i] = likely as [number];
  if (
    isTimeLike(board, i, candidates.length === 1) &&
    board.findings.every(({ field }) => field === 'vessel' || field === 'stage' || field === 'style')
  )
    return setAside(board, i, i);
  if (isAfterInto(board, i)) return refuse(board, 'ambiguous-number', i, i);
  board.notes.push({ id: 'ph-unlabelled', text: placeOf(board, i, i).text });
  find(board, 'ph', decimalAt(board, i).value, 'bare', i, i);
}

function findFree(board: Board, candidates: readonly number[]): void {
  const left = candidates.filter((i) => isFree(board, i));
  const vintage = left.find((i) => mayBeVintage(board, i));
  if (
    vintage !== undefined &&
    (isFound(board, 'free_mg_L') ||
      left.some((i) => i !== vintage && concentrationAt(board, i + 1) !== undefined))
  ) {
    board.setAside.push(placeOf(board, vintage, vintage).text);
    board.taken[vintage] = true;
    return findFree(board, candidates);
  }
  if (left.length === 0) return;
  if (isNegated(board) && speaksOfAdding(board)) {
    for (const i of left) if (isFree(board, i)) setAside(board, i, concentrationAt(board, i + 1)?.to ?? i);
    return;
  }
  const only =
    left.length === 1 || new Set(left.map((i) => figureAt(board, i).value)).size === 1 ? left[0] : undefined;
  const isTaken = isFound(board, 'free_mg_L') || isFound(board, 'added_mg_L');
  const figure = only === undefined ? undefined : figureAt(board, only);
  const unit = only === undefined ? undefined : concentrationAt(board, only + 1);
  const fine =
    !speaksOfAdding(board) &&
    !isOfUnknown(board, only) && !((unit !== undefined || !board.lexicon.isTold) && holdsUnknownVerb(board)) &&
    only !== undefined && figure !== undefined && !isOfAdditive(board, only) && !isTaken && rangeEnd(board, only) === undefined && !isAfterInto(board, only) && !isAfterArticle(board, only) && !mayBeOrder(board, only) &&
    vintage === undefined && !isMark(board, only + 1, '/') && !isMark(board, only - 1, '/') && figure.value <= MOST_UNLABELLED_FREE_mg_L && (isWhole(board, only) || unit !== undefined) && unit?.id !== 'g/L'; // prettier-ignore
  if (fine && figure.value < 0) return refuse(board, 'negative-value', figure.from, only);
  if (fine) {
    const to = unit?.to ?? only;
    if (unit?.id === 'ppm' || unit?.id === 'mg/L') board.marks.concentrationUnit ??= unit.id;
    board.notes.push({ id: 'free-unlabelled', text: placeOf(board, only, to).text });
    return find(
      board,
      'free_mg_L',
      figure.value * (unit ? (mg_L_IN[unit.id] ?? 1) : 1),
      'bare',
      figure.from,
      to,
    );
  }
  for (const i of left)
    if (isFree(board, i))
      refuse(
        board,
        'ambiguous-number',
        figureAt(board, i).from,
        rangeEnd(board, i) ?? concentrationAt(board, i + 1)?.to ?? i,
      );
}

/** … and how many where none of the figures could be a pH. */
const MOST_CHATTER_WITHOUT_PH = 2;

/** How many ordinary words a message may hold beside bare figures and still be a reading. */
const MOST_CHATTER = 5;

function isChatter(board: Board): boolean {
  const firm = board.findings.some(
    ({ field, said }) =>
      said !== 'bare' &&
      field !== 'vessel' &&
      field !== 'style' &&
      field !== 'stage' &&
      field !== 'category' &&
      field !== 'product' &&
      field !== 'organic',
  );
  if (firm || holdsAim(board)) return false;
  const strange = board.terms.filter(
    (term, i) =>
      term.kind === 'word' &&
      board.taken[i] !== true &&
      (term.tags.length === 0 ||
        term.tags.every((tag) => tag === 'cue:plain' || tag === 'cue:verb' || tag === 'cue:pronoun')),
  ).length;
  const phLike = board.terms.some((_, i) => isFree(board, i) && isPhLike(board, i));
  return strange >= (phLike ? MOST_CHATTER : MOST_CHATTER_WITHOUT_PH);
}

const holdsAim = (board: Board): boolean =>
  board.findings.some(({ field }) => field === 'target' || field === 'volume_L');

/** `3 tanks`: how many vessels is no figure of the wine. */
function setCountsAside(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (
      isFree(board, i) &&
      isWhole(board, i) &&
      saysMany(termAt(board, i + 1)) &&
      termAt(board, i + 1).tags.some((tag) => tag === 'vessel:tank' || tag === 'vessel:other')
    )
      setAside(board, i, i + 1);
  }
}

/** `v3.2`: a letter glued to its figure. */
const isGluedToWord = (board: Board, i: number): boolean =>
  !termAt(board, i).gap &&
  termAt(board, i - 1).kind === 'word' &&
  board.taken[i - 1] !== true &&
  termAt(board, i - 1).tags.length === 0;

/** `pallet 18`, `crew of 18`, `cost 12`: a known word whose figure is none of the wine's. */
function otherMatterBefore(board: Board, i: number): number | undefined {
  const at = isCue(board, i - 1, 'of') ? i - 2 : i - 1;
  const other = (['lot', 'limit', 'buy', 'bag', 'bottle-unit', 'in-store'] as const).some((cue) =>
    isCue(board, at, cue),
  );
  return (other && !isCue(board, at, 'is')) || termAt(board, at).tags.includes('unit:none-of-ours')
    ? at
    : undefined;
}

/** `temperature of the cellar 14`: the label of something else, with one word of whose it is between. */
function otherLabelBefore(board: Board, i: number): number | undefined {
  let k = i - 1;
  for (let words = 0; words < 4 && board.taken[k] !== true && termAt(board, k).kind === 'word'; words++, k--)
    if (termAt(board, k).tags.some((tag) => tag === 'label:temperature' || tag === 'label:aside')) return k;
  return undefined;
}

/** The word before a figure that makes it none of the wine's, if one does. */
function matterBefore(board: Board, i: number, labelled: boolean): number | undefined {
  if (isGluedToWord(board, i)) return i - 1;
  return (
    otherLabelBefore(board, i) ??
    (labelled ? strangerBefore(board, i) : undefined) ??
    otherMatterBefore(board, i)
  );
}

/** Who labels one figure labels the others: then a bare one beside an unknown word is that word's (`hose 18`, `18 pumpovers`). */
function setStrangersAside(board: Board): void {
  const labelled = board.findings.some(
    ({ field, said }) =>
      said === 'labelled' && (field === 'ph' || field === 'free_mg_L' || field === 'total_mg_L'),
  );
  for (let i = 0; i < board.terms.length; i++) {
    if (!isFree(board, i)) continue;
    const to = concentrationAt(board, i + 1)?.to ?? i;
    const before = matterBefore(board, i, labelled);
    if (isForeignAim(board, i - 1)) refuse(board, 'ambiguous-number', i - 1, to);
    else if (before !== undefined) setAside(board, before, to);
    else if (isStranger(board, to + 1) && (labelled || isPhLike(board, i))) setAside(board, i, to + 1);
    else if (isCue(board, i - 1, 'not')) refuse(board, 'ambiguous-number', i - 1, to);
    else if (isMark(board, i - 1, '<') || isMark(board, i - 1, '>'))
      refuse(board, 'ambiguous-number', i - 1, to);
  }
}

/** Reads the figures that nothing names: one as the pH, one as the free SO2; else it asks. */
export function readUnlabelled(board: Board): void {
  if (!isCellarTalk(board) || isChatter(board)) return;
  setCountsAside(board);
  setStrangersAside(board);
  const candidates = board.terms.map((_, i) => i).filter((i) => isFree(board, i));
  findPh(board, candidates);
  findFree(board, candidates);
}
