import type { Board } from '../board.ts';
import { hasTag, holdsCue, isCue, isFree, isMark, refuse, setAside, termAt } from '../board.ts';
import { isCellarTalk } from '../cellar-talk.ts';
import { isPhLike } from '../ph-like.ts';
import { isStranger } from '../stranger.ts';
import { concentrationAt } from '../units.ts';
import type { Aim } from './aim.ts';
import { aimAt, isArrow, isOther, keepAddition, keepTarget, kindAt, skipJoins } from './aim.ts';

/** The figure that a verb at term `i` governs: `add 28 ppm`, `target free 35`; and whether "to" leads to it. */
function governed(board: Board, i: number): { aim: Aim; label?: Aim['kind']; leadsTo: boolean } | undefined {
  let k = skipJoins(board, i + 1);
  // `before adding: free 18`: behind a colon a label begins anew.
  const isApart = isCue(board, i, 'add') && isMark(board, i + 1, ':');
  const beyond = isApart ? undefined : vesselEnd(board, k);
  if (beyond !== undefined) return governedBeyond(board, i, beyond);
  if (isApart && kindAt(board, k) !== undefined) return undefined;
  const label = kindAt(board, k) ?? (hasTag(board, k, 'label:so2') ? 'free' : undefined);
  if (label !== undefined) k = skipJoins(board, k + 1);
  const aim = aimAt(board, k);
  const leadsTo = board.terms.slice(i + 1, k).some((_, at) => isCue(board, i + 1 + at, 'to'));
  return aim && { aim, leadsTo, ...(label ? { label } : {}) };
}

/** Where the vessel ends that stands at term `k`. */
const vesselEnd = (board: Board, k: number): number | undefined =>
  board.findings.find(({ field, from }) => (field === 'vessel' || field === 'vessels') && from === k)?.to;

/** `raise T8 15 ppm`, `target T8 30`: the figure that a verb governs over the vessel; a bare pH is none. */
function governedBeyond(board: Board, i: number, to: number): { aim: Aim; leadsTo: boolean } | undefined {
  const isVerbOfVessel =
    isCue(board, i, 'target') ||
    ((isCue(board, i, 'raise') || isCue(board, i, 'add')) && !isStranger(board, i - 1));
  const k = skipJoins(board, to + 1);
  const aim = isPhLike(board, k) || !isVerbOfVessel ? undefined : aimAt(board, k);
  const isFirm = concentrationAt(board, k + 1) !== undefined || isCue(board, i, 'target');
  if (aim === undefined || aim.kind !== undefined || !isFirm) return undefined;
  // `sulfiter cuve 3 à 30 mg/l`: so much of it, or up to there?
  if (isCue(board, i, 'add') && !isCue(board, i, 'bring') && isCue(board, k - 1, 'also-at')) return undefined;
  return { aim, leadsTo: isCue(board, k - 1, 'to') };
}

/** A bare figure is an aim only where the message speaks of wine and nothing foreign stands beside it. */
function isClear(board: Board, i: number, { aim, label }: { aim: Aim; label?: Aim['kind'] }): boolean {
  if (aim.kind !== undefined || label !== undefined || concentrationAt(board, aim.from + 1)) return true;
  const after = aim.to + 1;
  if (isStranger(board, after) || (isCue(board, after, 'from') && !isFree(board, after + 1))) return false;
  const isTerse = board.terms.length <= 4 && !board.terms.some((_, k) => isStranger(board, k));
  return (isTerse || isCellarTalk(board)) && !isOtherVerb(board, i);
}

/** `target 35 mit`: a word that only says target is passed over beside no reading. */
const isOnlyTarget = (board: Board, i: number): boolean =>
  isCue(board, i, 'target') &&
  termAt(board, i).tags.length === 1 &&
  board.lexicon.language !== board.settings.language;

/** `chill to 30`, `TA up 1.5`, `drop pH to 3.5`: the figure belongs to what stands before the verb. */
function isOtherVerb(board: Board, i: number): boolean {
  const to = isCue(board, i, 'to') && !isCue(board, i, 'target');
  const near = [i - 1, i + 1].some(
    (k) => hasTag(board, k, 'label:aside') || hasTag(board, k, 'label:temperature'),
  );
  return (
    near ||
    (to &&
      (isStranger(board, i - 1) || isCue(board, i - 1, 'vessel-statement') || isCue(board, i - 1, 'lot')))
  );
}

/** `don't add`, `not to 30`, `don't go to 30`: the negation stands right before, or one word before. */
const declines = (board: Board, i: number): boolean =>
  isCue(board, i - 1, 'not') ||
  (isCue(board, i - 2, 'not') && (isCue(board, i - 1, 'to') || isCue(board, i - 1, 'verb')));

/** `amener la cuve 7 (49 hl, libre 16) à 30`: the term before a bracket that closes at term `i`; else `i`. */
function beforeBracket(board: Board, i: number): number {
  let k = i;
  while (isMark(board, i, ')') && k >= 0 && !isMark(board, k, '(')) k--;
  return isMark(board, k, '(') ? k - 1 : i;
}

/** `subir el depósito 14 a 34`, `porta T9 a 28`: a verb of raising before it, with nothing but the vessel or a label between. */
function isRaised(board: Board, i: number): boolean {
  const isLifting = (at: number): boolean => isCue(board, at, 'raise') || isCue(board, at, 'bring');
  let k = beforeBracket(board, i - 1);
  while (
    k >= 0 &&
    !isLifting(k) &&
    (board.taken[k] === true ||
      isCue(board, k, 'article') ||
      hasTag(board, k, 'label:free') ||
      hasTag(board, k, 'label:so2') ||
      hasTag(board, k, 'vessel:tank') ||
      (isCue(board, k, 'of') && k > 0))
  )
    k--;
  return isLifting(k) && !isCue(board, k - 1, 'not');
}

/** `2000 l a pH 3,55`, `à 18 de libre`: a word that says "at" as well as "to"; of a level nobody can tell which. */
function isAt(board: Board, i: number, { aim, label }: { aim: Aim; label?: Aim['kind'] }): boolean {
  if (!isCue(board, i, 'also-at')) return false;
  if (hasTag(board, i - 1, 'label:ph')) return true;
  if ((label === 'ph' || aim.kind === 'ph') && !isStranger(board, i - 1)) return true;
  if (isRaised(board, i)) return false;
  if (isCellarTalk(board)) refuse(board, 'ambiguous-number', i, aim.to);
  return true;
}

/** `target 30-35`: two figures, of which one has to be chosen. */
const isRange = (board: Board, { to }: Aim): boolean =>
  isMark(board, to + 1, '-') &&
  !termAt(board, to + 1).gap &&
  board.terms[to + 2]?.gap === false &&
  isFree(board, to + 2) &&
  !isOther(board, to + 3);

function findVerb(board: Board, i: number): void {
  if (isCue(board, i, 'need') && isCue(board, i + 1, 'to')) return;
  const found = governed(board, i);
  if (!found) return;
  const { aim, label, leadsTo } = found;
  // `pick it up at 6`: a time, and no figure of the wine.
  const isClock =
    isCue(board, i, 'raise') && isCue(board, i + 1, 'clock-before') && isCue(board, i + 1, 'is');
  if (isClock && concentrationAt(board, aim.from + 1) === undefined) return setAside(board, i, aim.to);
  if (isRange(board, aim)) return refuse(board, 'ambiguous-number', aim.from, aim.to + 2);
  if (isCue(board, i, 'need') && label === 'ph') return;
  if (isAt(board, i, found)) return;
  if (declines(board, i)) return refuse(board, 'ambiguous-number', i - 1, aim.to);
  if (hasTag(board, i - 1, 'label:ph')) return refuse(board, 'ambiguous-number', i - 1, aim.to);
  if (!isClear(board, i, found)) {
    const asks = (isCue(board, i, 'to') || isOnlyTarget(board, i)) && isCellarTalk(board);
    if (asks) return refuse(board, 'ambiguous-number', i - 1, aim.to);
    return setAside(board, i, isStranger(board, aim.to + 1) ? aim.to + 1 : aim.to);
  }
  const glued = isArrow(board, i) && !termAt(board, i).gap && !termAt(board, i + 1).gap;
  if (glued && hasTag(board, i - 1, 'label:free')) return refuse(board, 'ambiguous-number', i - 1, aim.to);
  // `to get 20 more ppm`: an addition in the place of a level.
  if (isCue(board, i, 'target') && isCue(board, aim.to + 1, 'addition') && isCue(board, aim.to + 1, 'extra'))
    return refuse(board, 'ambiguous-number', i, aim.to + 1);
  if (isArrow(board, i) || isCue(board, i, 'target')) return keepTarget(board, aim, i, label);
  if (isCue(board, i, 'need')) return findNeed(board, i, found);
  // `raise free to 30` says where it should go, `raise free 30` by how much.
  if (isCue(board, i, 'add') || isCue(board, i, 'raise') || isCue(board, i, 'by'))
    // `dose T4 18 ppm`: what is to go in, or the dose of a wine with 18?
    if (isCue(board, i, 'how-much') && board.taken[aim.from - 1] === true)
      return refuse(board, 'ambiguous-number', aim.from, aim.to);
    else return leadsTo ? keepTarget(board, aim, i, label) : keepAddition(board, aim, i);
  if (isCue(board, i, 'to')) keepTarget(board, aim, i, label);
}

/** `needs 25 ppm` could be a level or an addition; `needs 25 more`, `wants 30 free` are clear. */
function findNeed(board: Board, i: number, { aim, label }: { aim: Aim; label?: Aim['kind'] }): void {
  const more = isCue(board, aim.to + 1, 'addition') || isCue(board, aim.to + 1, 'past');
  if (more && !isStranger(board, aim.to + 2) && !hasTag(board, aim.to + 2, 'unit:none-of-ours'))
    return keepAddition(board, { ...aim, to: aim.to + 1 }, i);
  if (more) return setAside(board, i, aim.to + 2);
  if (label === undefined && aim.kind === undefined) return refuse(board, 'ambiguous-number', i, aim.to);
  keepTarget(board, aim, i, label);
}

const isVerb = (board: Board, i: number): boolean =>
  isArrow(board, i) ||
  (isCue(board, i, 'by') && holdsCue(board, 'raise')) ||
  (['target', 'add', 'raise', 'need', 'to'] as const).some((cue) => isCue(board, i, cue));

/** `+25 ppm`: a plus sign before its figure. */
function findPlus(board: Board, i: number): void {
  const opens = termAt(board, i).gap || board.terms[i - 1]?.kind !== 'number';
  const aim = opens ? aimAt(board, i + 1) : undefined;
  if (aim === undefined) return;
  if (board.terms[i + 1]?.gap === false) {
    if (isClear(board, i, { aim })) keepAddition(board, aim, i);
  } else findSpacedPlus(board, i, aim);
}

/** `+ 25 ppm` adds; behind another figure, or without its unit, it may join two things as well. */
function findSpacedPlus(board: Board, i: number, aim: Aim): void {
  const joins = board.terms[i - 1]?.kind === 'number';
  if (joins || concentrationAt(board, i + 2) === undefined)
    return refuse(board, 'ambiguous-number', i, aim.to);
  if (isClear(board, i, { aim })) keepAddition(board, aim, i);
}

/** `plus 20 mg/l`: beside a figure with its unit the word is the sign; behind another figure it may join two. */
function findPlusInWords(board: Board, i: number): void {
  const aim = aimAt(board, i + 1);
  if (aim === undefined) return;
  if (board.terms[i - 1]?.kind === 'number') refuse(board, 'ambiguous-number', i, aim.to);
  else keepAddition(board, aim, i);
}

/** Finds what a verb, an arrow or a plus sign aims at: a level of SO2, or a stated addition. */
export function findTarget(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (board.taken[i] === true) continue;
    if (isMark(board, i, '+')) findPlus(board, i);
    else if (isCue(board, i, 'plus') && concentrationAt(board, i + 2)) findPlusInWords(board, i);
    else if (termAt(board, i).kind !== 'number' && isVerb(board, i)) findVerb(board, i);
  }
}
