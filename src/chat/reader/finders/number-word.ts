import type { Board } from '../board.ts';
import { hasTag, isCue, isMark, refuse, saysMany, termAt } from '../board.ts';
import { MASS_UNITS, VOLUME_UNITS, concentrationAt, unitAt } from '../units.ts';

const isCounted = (board: Board, i: number): boolean =>
  unitAt(board, i, VOLUME_UNITS) !== undefined ||
  unitAt(board, i, MASS_UNITS) !== undefined ||
  concentrationAt(board, i) !== undefined ||
  isCue(board, i, 'tablet') ||
  ['vessel:barrel', 'vessel:cask', 'additive:campden'].some((tag) =>
    hasTag(board, i, tag as 'vessel:barrel'),
  );

/** `two tanks of 20 hl`: each of them or both together, nobody can tell. */
function areTanks(board: Board, i: number): boolean {
  if (!hasTag(board, i, 'vessel:tank') || !saysMany(termAt(board, i))) return false;
  const joins =
    isMark(board, i + 1, ',') || (['of', 'from', 'with'] as const).some((cue) => isCue(board, i + 1, cue));
  const figure = joins ? i + 2 : i + 1;
  const isVolume = VOLUME_UNITS.some((unit) => hasTag(board, figure + 1, `unit:${unit}`));
  return board.terms[figure]?.kind === 'number' && isVolume;
}

/** `half full`, `2/3 full`: how much is in the tank nobody can tell from its size. */
const isShare = (board: Board, i: number): boolean =>
  (['half', 'third', 'quarter', 'two-thirds', 'three-quarters'] as const).some((cue) =>
    isCue(board, i, cue),
  ) ||
  (board.terms[i]?.kind === 'number' && (board.terms[i - 1]?.text === '/' || board.terms[i].text === '½'));

/** Refuses a number in words where a figure should stand: `two barrels`, `half a pound`. */
export function findNumberWord(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (isCue(board, i + 1, 'fullness') && isShare(board, i)) {
      refuse(board, 'ambiguous-number', i, i + 1);
      continue;
    }
    if (!isCue(board, i, 'number-word') || board.taken[i] === true) continue;
    const to =
      isCue(board, i + 1, 'of') || isCue(board, i + 1, 'article') || isCue(board, i + 1, 'number-word')
        ? i + 2
        : i + 1;
    // A tablet is found before its number is missed: `two tablets of 2 g` are not one.
    const isTablet = isCue(board, to, 'tablet') || hasTag(board, to, 'additive:campden');
    if (areTanks(board, to) || (isCounted(board, to) && (isTablet || board.taken[to] !== true)))
      refuse(board, 'ambiguous-number', i, to);
    else if (
      board.terms[i - 1]?.tags.some((tag) => /^label:(free|total|ph)$/.test(tag)) &&
      !isCue(board, i, 'plain')
    )
      refuse(board, 'ambiguous-number', i - 1, i);
  }
}
