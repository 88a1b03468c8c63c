import type { Board } from '../board.ts';
import { findingOf, hasTag, holdsCue, isCue, isFound, isMark } from '../board.ts';
import type { Intent } from '../understood.ts';
import { isStranger } from '../stranger.ts';
import { isCellarTalk } from '../cellar-talk.ts';

const any = (board: Board, ...fields: readonly Parameters<typeof isFound>[1][]): boolean =>
  fields.some((field) => isFound(board, field));

const hasAmount = (board: Board): boolean =>
  any(board, 'mass_g', 'additive_volume_mL', 'tablets') || board.marks.spoon === true;
const hasVolume = (board: Board): boolean =>
  any(board, 'volume_L') ||
  board.marks.barrelsAssumed_L !== undefined ||
  board.marks.casksWithoutSize === true;
const hasAdditive = (board: Board): boolean =>
  any(board, 'additive') || board.marks.unnamedAdditive === true || board.marks.campden === true;
const hasVessel = (board: Board): boolean => any(board, 'vessel', 'vessels');
const isNegated = (board: Board): boolean => board.notes.some(({ id }) => id === 'negated');

const refused = (board: Board, code: string): boolean =>
  board.problems.some((problem) => problem.code === code);

/** `rinse T4`: a vessel is to be cleaned, and nothing goes into its wine. */
const opensWithCleaning = (board: Board): boolean =>
  isCue(board, 0, 'cleaning') && hasVessel(board) && board.terms.length <= 5;

/** A solution in water: never a dose for wine. */
function isSolution(board: Board): boolean {
  const { solutionUse } = board.marks;
  if (solutionUse === undefined) return false;
  if (solutionUse === 'holding') return true;
  if (solutionUse === 'cleaning')
    return (
      hasVolume(board) ||
      hasAdditive(board) ||
      hasAmount(board) ||
      any(board, 'strength_percent') ||
      opensWithCleaning(board)
    );
  const dissolved =
    findingOf(board, 'additive')?.value.endsWith('-solution') === true || any(board, 'strength_percent');
  const inWater = holdsCue(board, 'water');
  if (inWater && any(board, 'rate_mg_L')) return true;
  return dissolved
    ? !hasAmount(board) || inWater
    : inWater && (hasAmount(board) || hasAdditive(board)) && hasVolume(board);
}

function isAdded(board: Board): boolean {
  if (!board.pastTense) return false;
  const said =
    hasAmount(board) ||
    any(board, 'added_mg_L', 'rate_mg_L') ||
    refused(board, 'unknown-additive') ||
    refused(board, 'ambiguous-number');
  const isVerb = (i: number): boolean => isCue(board, i, 'past') || isCue(board, i, 'past-if-accented');
  const isOnlyDone = !board.terms.some((_, i) => isVerb(i) && !isCue(board, i, 'only-done'));
  return (
    said ||
    (hasAdditive(board) && !isOnlyDone) ||
    (hasVessel(board) &&
      !isOnlyDone &&
      !any(board, 'ph', 'free_mg_L') &&
      (holdsSulfite(board) || isBareNote(board)))
  );
}

/** `added T4`: nothing else is said, so what is missing is the amount. */
const isBareNote = (board: Board): boolean =>
  board.terms.length <= 5 && !board.terms.some((_, i) => isStranger(board, i) || isCue(board, i, 'water'));

const holdsSulfite = (board: Board): boolean => board.cues.has('label:so2') || board.cues.has('cue:addition');

function isReading(board: Board): boolean {
  return (
    holdsCue(board, 'reading') &&
    any(board, 'ph', 'free_mg_L', 'total_mg_L') &&
    !any(board, 'target') &&
    !holdsCue(board, 'how-much') &&
    !hasAmount(board) &&
    !isMark(board, board.terms.length - 1, '?')
  );
}

/** `5G signal is down`: a mass with nothing of a cellar about it, among unknown words. */
const isIdleMass = (board: Board): boolean =>
  !hasVolume(board) &&
  !hasAdditive(board) &&
  !hasVessel(board) &&
  !any(board, 'ph', 'free_mg_L') &&
  !board.terms.some((_, i) => hasTag(board, i, 'additive:none')) &&
  board.terms.some((_, i) => isStranger(board, i));

function isEffect(board: Board): boolean {
  if (any(board, 'rate_mg_L') || board.marks.fruitRate) return true;
  if (!hasAmount(board)) return false;
  const isBareMass =
    any(board, 'ph', 'free_mg_L', 'total_mg_L') &&
    !hasVolume(board) &&
    !hasAdditive(board) &&
    !refused(board, 'unknown-additive');
  return !isBareMass;
}

/** `combien`, and not `combien de temps`, which only holds it. */
const asksHowMuch = (board: Board): boolean => board.terms.some((_, i) => isCue(board, i, 'how-much'));

/** A question for an amount that names an additive or a vessel alone. */
function asksForDose(board: Board): boolean {
  if (holdsCue(board, 'in-store')) return false;
  if (holdsCue(board, 'how-much'))
    return hasAdditive(board) || (hasVessel(board) && board.terms.length <= 12 && asksHowMuch(board));
  const asked =
    isMark(board, board.terms.length - 1, '?') ||
    board.terms.some((_, i) => isCue(board, i, 'into') && board.taken[i + 1] === true);
  return hasAdditive(board) && hasVessel(board) && asked && !holdsCue(board, 'question');
}

/** `eyes on T4 please`: a vessel and a please, with no other business. */
const isBarePlea = (board: Board): boolean =>
  holdsCue(board, 'please') &&
  board.terms.length <= 6 &&
  !holdsCue(board, 'vessel-statement') &&
  !holdsCue(board, 'question') &&
  !holdsCue(board, 'cleaning');

function isDose(board: Board): boolean {
  if (any(board, 'target', 'ph', 'free_mg_L', 'total_mg_L')) return true;
  const moves =
    holdsCue(board, 'vessel-statement') &&
    !holdsCue(board, 'how-much') &&
    !hasAdditive(board) &&
    !board.marks.fruitByWeight;
  if (
    any(board, 'volume_L') ||
    board.marks.barrelsCounted === true ||
    board.marks.fruitByWeight === true ||
    board.marks.yield_L_per_100_kg !== undefined ||
    (board.marks.casksWithoutSize === true && any(board, 'stage', 'style'))
  )
    return !moves;
  if (asksForDose(board)) return true;
  if (hasVessel(board) && isBarePlea(board)) return true;
  return (
    any(
      board,
      'temperature_C',
      'alcohol_percent',
      'sugar_g_L',
      'binding_share',
      'binding_allowance_percent',
    ) &&
    hasVessel(board) &&
    !moves
  );
}

/** A level to reach; a negated addition is none. */
const aimsAtLevel = (board: Board): boolean => {
  const target = findingOf(board, 'target')?.value;
  return target !== undefined && !('add_mg_L' in target);
};

/** `order 5 kg kmbs`, `500 g kmbs left`: the store, and no wine. */
const isTrade = (board: Board): boolean =>
  (holdsCue(board, 'buy') || holdsCue(board, 'in-store')) &&
  hasAmount(board) &&
  !hasVolume(board) &&
  !hasVessel(board) &&
  !any(board, 'ph', 'free_mg_L');

/** `did we add the 80 g to T4?`, `who added 80 g to T4`: what was done is asked, and nothing is to be reckoned. */
function asksWhatWasDone(board: Board): boolean {
  const first = board.terms.findIndex(({ kind }) => kind === 'word');
  return (
    isCue(board, first, 'asks-past') &&
    board.terms.some((_, i) => isCue(board, i, 'add') || isCue(board, i, 'past')) &&
    !holdsCue(board, 'how-much') &&
    !any(board, 'ph', 'free_mg_L', 'total_mg_L')
  );
}

/** `300 L of diesel`, `20 L of water`: a volume of something else. */
function isOfOther(board: Board): boolean {
  const volume = findingOf(board, 'volume_L');
  if (volume === undefined || any(board, 'style', 'category', 'product', 'stage')) return false;
  const k = isCue(board, volume.to + 1, 'of') ? volume.to + 2 : volume.to + 1;
  return (k > volume.to + 1 && isStranger(board, k)) || isCue(board, k, 'water');
}

/** `order 3 boxes of corks, 20 gal drums`: what is bought, and no wine. */
const isErrand = (board: Board): boolean =>
  (isOfOther(board) || (isCue(board, 0, 'buy') && isCue(board, 2, 'bag'))) &&
  !hasAdditive(board) &&
  !hasAmount(board) &&
  !hasVessel(board) &&
  !any(board, 'ph', 'free_mg_L', 'total_mg_L', 'target');

/** What a message wants. With nothing that is ours it is chat. */
export function decideIntent(board: Board): Intent {
  if (isSolution(board)) return 'solution';
  if (isAdded(board)) return 'added';
  if (isNegated(board) && !any(board, 'ph', 'free_mg_L') && !aimsAtLevel(board)) return 'chat';
  if (isTrade(board) || isErrand(board) || asksWhatWasDone(board)) return 'chat';
  if (hasAmount(board) && isIdleMass(board)) return 'chat';
  if (isReading(board)) return 'reading';
  if (isEffect(board)) return 'effect';
  if (isDose(board)) return 'dose';
  return board.problems.length > 0 && isCellarTalk(board) ? 'dose' : 'chat';
}
