import type { Board } from '../board.ts';
import { claim, figureAt, hasTag, isCue, isFree, isMark, refuse, setAside, termAt, find } from '../board.ts';
import { isStranger } from '../stranger.ts';
import { concentrationAt } from '../units.ts';
import type { LabelId } from '../words/words.ts';
import type { Beside } from './figure-beside.ts';
import { figureAfter, figureBefore, figureBeside, hasForeignUnit, labelAt } from './figure-beside.ts';
import { keepFigure } from './keep-labelled.ts';
import { percentOfVolume } from './percent-of-volume.ts';
import { isWishedLevel } from './wished-level.ts';

function isRangeAt(board: Board, { at, to }: Beside): number | undefined {
  const joins =
    isMark(board, to + 1, '-') && !termAt(board, to + 1).gap && board.terms[to + 2]?.gap === false;
  return joins && isFree(board, to + 2) && !hasForeignUnit(board, to + 2) && isMark(board, at + 1, '-')
    ? to + 2
    : undefined;
}

/** `18 no 20`: a correction inside the message. */
function correctionAt(board: Board, to: number): number | undefined {
  let k = to + 1;
  if (isMark(board, k, ',') || isMark(board, k, '.') || isMark(board, k, '-')) k++;
  if (!isCue(board, k, 'correction')) return undefined;
  while (isCue(board, k, 'correction') || isMark(board, k, ',')) k++;
  return isFree(board, k) && !hasForeignUnit(board, k) ? k : undefined;
}

function asideEnd(board: Board, to: number): number {
  const conc = concentrationAt(board, to + 1);
  if (conc) return conc.to;
  return isMark(board, to + 1, '%') || hasTag(board, to + 1, 'unit:none-of-ours') ? to + 1 : to;
}

/** `legal max 350 total`, `keep total below 120`: a bound and no measured figure. */
const isLimit = (board: Board, i: number, { at, to }: Beside): boolean =>
  [Math.min(i, at) - 1, Math.max(i, to) + 1].some((k) => isCue(board, k, 'limit')) ||
  (at > i + 1 && isCue(board, i + 1, 'limit'));

/** `total of 18 people`, `free 20 min`: a count or a time. */
const isCounted = (board: Board, label: LabelId, { at }: Beside): boolean =>
  (label === 'free' || label === 'total') &&
  hasTag(board, at + 1, 'unit:none-of-ours') &&
  !hasTag(board, at + 1, 'label:aside');

/** `are you free at 3`: the word alone, in a message that speaks of no wine. */
function isSmallTalk(board: Board, label: LabelId, { at }: Beside): boolean {
  if ((label !== 'free' && label !== 'total') || concentrationAt(board, at + 1) || board.terms.length <= 3)
    return false;
  if (termAt(board, at - 1).text.length > 4 && hasTag(board, at - 1, 'label:free')) return false;
  const others = board.terms.some(
    (term, k) =>
      board.taken[k] === true ||
      (term.kind === 'word' &&
        term.tags.some((tag) =>
          /^(label:(?!free|total|aside|volume)|unit:(?!none)|additive:(?!none)|vessel|style|stage|cue:(variety|molecular|wine|target))/.test(
            tag,
          ),
        )),
  );
  return !others && board.terms.some((_, k) => isStranger(board, k) || isCue(board, k, 'pronoun'));
}

function findLabel(board: Board, i: number, label: LabelId): void {
  const after = figureAfter(board, i);
  const volumeTaken = isForeignAfter(board, i);
  const beside = figureBeside(board, i, label);
  if (label === 'aside') {
    const own = after && !hasForeignUnit(board, after.at) ? after : beside;
    if (own) setAside(board, Math.min(i, own.at), Math.max(i, asideEnd(board, own.to)));
    return;
  }
  if (!beside) {
    if (label === 'total' && isCue(board, i + 1, 'of')) return;
    if (
      volumeTaken !== undefined &&
      label !== 'so2' &&
      label !== 'total' &&
      label !== 'volume' &&
      label !== 'sugar'
    )
      mismatch(board, i, volumeTaken);
    return;
  }
  const [from, to] = [Math.min(i, figureAt(board, beside.at).from), Math.max(i, beside.to)];
  if (isCue(board, i - 1, 'not') && beside.at > i) return refuse(board, 'ambiguous-number', i - 1, to);
  if ((label === 'free' || label === 'so2') && isWishedLevel(board, from))
    return refuse(board, 'ambiguous-number', from, to);
  if (isLimit(board, i, beside)) return setAside(board, from, to);
  if (isCounted(board, label, beside)) return setAside(board, from, Math.max(to, beside.at + 1));
  if (isSmallTalk(board, label, beside)) return;
  if (hasForeignUnit(board, beside.at)) {
    if (label !== 'volume' && label !== 'so2') refuse(board, 'unit-mismatch', from, to + 1);
    return;
  }
  if (
    isMark(board, beside.at + 1, '/') &&
    isFree(board, beside.at + 2) &&
    (label === 'so2' || label === 'free' || label === 'total' || label === 'ph')
  )
    // The pair (`SO2 18/60`) is read by the finder of pairs; the label only says that it is one.
    return claim(board, i, i);
  const below =
    beside.at < i &&
    isMark(board, beside.at - 1, '-') &&
    !termAt(board, beside.at - 1).gap &&
    isFree(board, beside.at - 2);
  if (below && label !== 'volume') return refuse(board, 'ambiguous-number', beside.at - 2, to);
  const range = isRangeAt(board, beside);
  if (range !== undefined && label !== 'volume') return refuse(board, 'ambiguous-number', from, range);
  const corrected = correctionAt(board, beside.to);
  if (corrected !== undefined && figureAt(board, corrected).value !== figureAt(board, beside.at).value)
    return refuse(board, 'conflicting-values', from, corrected);
  keepFigure(board, label, beside, from, to);
}

/** `free 20 hl`: the figure after the label was read as a volume or a mass. */
function isForeignAfter(board: Board, i: number): number | undefined {
  let k = i + 1;
  while (
    isMark(board, k, ':') ||
    isMark(board, k, '=') ||
    (isCue(board, k, 'is') && board.terms[k]?.kind === 'word')
  )
    k++;
  const index = board.findings.findIndex(
    ({ field, from }) => (field === 'volume_L' || field === 'mass_g') && from === k,
  );
  return board.terms[k]?.kind === 'number' && index >= 0 ? index : undefined;
}

function mismatch(board: Board, i: number, index: number): void {
  const finding = board.findings[index];
  if (!finding || figureBefore(board, i)) return;
  board.findings.splice(index, 1);
  refuse(board, 'unit-mismatch', i, finding.to);
}

/** `free should be 30`: a wish. Of free SO2 it is the target; of anything else it is set aside. */
function findWish(board: Board, i: number): boolean {
  const label = labelAt(board, i);
  if (label === undefined || !isCue(board, i + 1, 'should')) return false;
  const at = isCue(board, i + 2, 'is') ? i + 3 : i + 2;
  if (!isFree(board, at)) return false;
  const to = concentrationAt(board, at + 1)?.to ?? at;
  if (label === 'free' || label === 'so2')
    find(board, 'target', { free_mg_L: figureAt(board, at).value }, 'labelled', i, to);
  else setAside(board, i, to);
  return true;
}

/** Finds the figures that a label before or after them names; of one label only, where it is given. */
export function findLabelled(board: Board, only?: LabelId): void {
  for (const weak of [false, true]) {
    for (let i = 0; i < board.terms.length; i++) {
      const label = labelAt(board, i);
      if (only !== undefined && label !== only) continue;
      if (findWish(board, i)) continue;
      const isPercentVolume =
        label === 'volume' && (isMark(board, i - 1, '%') || percentOfVolume(board, i) !== undefined);
      if (label !== undefined && !isPercentVolume && (label === 'so2' || label === 'volume') === weak)
        findLabel(board, i, label);
    }
  }
}
