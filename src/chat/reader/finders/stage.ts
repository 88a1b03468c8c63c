import type { Stage } from '../../../core/wine.ts';
import type { Board } from '../board.ts';
import { isStranger } from '../stranger.ts';
import { claim, find, hasTag, isCue, isMark, termAt } from '../board.ts';

const STAGES: readonly Stage[] = ['fermenting', 'malolactic', 'must', 'base', 'bottled', 'finished'];

const isLabelled = (board: Board, i: number): boolean =>
  board.terms[i]?.tags.some((tag) => tag === 'label:ph' || tag === 'label:free' || tag === 'label:total') ===
  true;

/** `350 mL` is a volume; `free 20 ML done` and `ML done` are not. */
function isUnit(board: Board, i: number): boolean {
  const [term, before] = [termAt(board, i), board.terms[i - 1]];
  if (!hasTag(board, i, 'unit:mL') || before?.kind !== 'number') return false;
  const speaksOfMalo = isCue(board, i + 1, 'over') || isCue(board, i + 1, 'ml-bugs');
  return !(speaksOfMalo && (term.capital || isLabelled(board, i - 2)));
}

function malolacticAt(board: Board, i: number): Stage | undefined {
  if (isMark(board, i + 1, '?') || isMark(board, i + 2, '?'))
    return isCue(board, i + 1, 'over') ? 'malolactic' : undefined;
  if (isCue(board, i + 1, 'yet') || isCue(board, i + 1, 'ml-bugs')) return 'malolactic';
  if (isCue(board, i - 1, 'ml-around')) return 'malolactic';
  if (isCue(board, i - 1, 'ml-over') || isCue(board, i - 1, 'ml-without') || isCue(board, i + 1, 'over'))
    return 'finished';
  return 'malolactic';
}

/** `must` is juice only as a noun: not in "I must", "must be". */
function isNounMust(board: Board, i: number): boolean {
  if (board.terms[i]?.text !== 'must') return true;
  const measured = termAt(board, i - 1).tags.some(
    (tag) => /^unit:(L|hL|m3|gal)/.test(tag) || tag === 'cue:fruit' || tag === 'cue:of',
  );
  if (measured && isCue(board, i + 1, 'add')) return true;
  if (!measured && isStranger(board, i + 1)) return false;
  if (
    isCue(board, i + 1, 'verb') &&
    !isCue(board, i + 1, 'plain') &&
    !hasTag(board, i + 1, 'unit:none-of-ours')
  )
    return false;
  if (isCue(board, i + 1, 'verb') || (isCue(board, i - 1, 'pronoun') && !isCue(board, i - 1, 'article')))
    return false;
  return true;
}

function stopsFerment(board: Board, i: number): boolean {
  if (!isCue(board, i, 'stop')) return false;
  for (let k = i + 1; k <= i + 4; k++)
    if (isCue(board, k, 'ferment') || hasTag(board, k, 'stage:fermenting')) return true;
  return stopsIt(board, i + 1);
}

/** `stuck at 12 g/L, I want to stop it`, `stop T7 at 40 g/L sugar`: what ferments stands before, or is a vessel with sugar. */
function stopsIt(board: Board, i: number): boolean {
  const isCoded = board.terms[i]?.kind === 'word' && board.terms[i + 1]?.kind === 'number';
  const isIt = isCue(board, i, 'pronoun') || hasTag(board, i, 'vessel:tank') || isCoded;
  const { cues } = board;
  return isIt && (cues.has('stage:fermenting') || cues.has('cue:ferment') || cues.has('label:sugar'));
}

/**
 * Finds where the wine stands: must, fermenting, malolactic, base, finished, bottled.
 * A bare "malo" counts as malolactic, since that is the reading that harms nothing.
 */
export function findStage(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (termAt(board, i).kind !== 'word' || board.taken[i] === true) continue;
    if (isCue(board, i, 'past-ferment')) claim(board, i, i);
    else if (stopsFerment(board, i)) {
      board.notes.push({ id: 'ferment-stop', text: '' });
      find(board, 'stage', 'fermenting', 'labelled', i, i);
    } else if (isCue(board, i, 'ml') && !isUnit(board, i)) {
      const stage = malolacticAt(board, i);
      // `ML 90% done`: not done.
      const isPart =
        board.terms[i + 1]?.kind === 'number' && isMark(board, i + 2, '%') && isCue(board, i + 3, 'over');
      if (isPart) {
        find(board, 'stage', 'malolactic', 'labelled', i, i + 3);
        continue;
      }
      const to = isCue(board, i + 1, 'over') || isCue(board, i + 1, 'ml-bugs') ? i + 1 : i;
      if (stage) find(board, 'stage', stage, 'labelled', i, to);
    } else {
      const stage = STAGES.find((one) => hasTag(board, i, `stage:${one}`));
      const counted = board.terms[i - 1]?.kind === 'number' && hasTag(board, i, 'vessel:cask');
      const yetToCome =
        stage === 'bottled' &&
        (['not-yet', 'should', 'verb'] as const).some((cue) => isCue(board, i - 1, cue));
      if (stage && !yetToCome && !counted && !(stage === 'must' && !isNounMust(board, i)))
        find(board, 'stage', stage, 'labelled', i, i);
    }
  }
}

/** The most cautious of the stages that were read: one that wants no sulfite before one that does. */
export function mostCautious(stages: readonly Stage[]): Stage | undefined {
  return STAGES.find((stage) => stages.includes(stage));
}
