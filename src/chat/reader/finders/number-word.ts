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

/** `half of 90 g`, `la mitad del depósito`: where the figure or the vessel ends that is halved. */
function halvedEnd(board: Board, i: number): number | undefined {
  let k = i + 1;
  while (k <= i + 2 && (isCue(board, k, 'of') || isCue(board, k, 'article'))) k++;
  const isHalf = k === i + 1 && !isCue(board, i, 'half');
  if (isHalf || board.taken[i] === true || isCue(board, i, 'number-word')) return undefined;
  const isAmount = board.findings.some(
    ({ field, from }) => from === k && ['mass_g', 'volume_L', 'additive_volume_mL'].includes(field),
  );
  return isAmount || hasTag(board, k, 'vessel:tank') || hasTag(board, k, 'vessel:barrel') ? k : undefined;
}

/** Beside none of these a tank is only spoken of: `tank two leaks`. */
const READS = /^label:(ph|free|total|so2)$/;

/** `tank two`: which one it is stands in words; `tank a`, `tank half` name no number. */
const isNumberOfVessel = (board: Board, i: number): boolean =>
  (['vessel:tank', 'vessel:barrel', 'vessel:cask', 'vessel:other'] as const).some((tag) =>
    hasTag(board, i - 1, tag),
  ) &&
  board.taken[i - 1] !== true &&
  !isCue(board, i, 'article') &&
  !isShare(board, i) &&
  !saysMany(termAt(board, i - 1)) &&
  (board.findings.length > 0 ||
    board.terms.some(({ kind, tags }) => kind === 'word' && tags.some((tag) => READS.test(tag))));

/** Refuses a number in words where a figure should stand: `two barrels`, `half a pound`. */
export function findNumberWord(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (isCue(board, i + 1, 'fullness') && isShare(board, i)) {
      refuse(board, 'ambiguous-number', i, i + 1);
      continue;
    }
    const halved = isShare(board, i) && termAt(board, i).kind === 'word' ? halvedEnd(board, i) : undefined;
    if (halved !== undefined) {
      refuse(board, 'ambiguous-number', i, halved);
      continue;
    }
    // `mezza dose`: half of what is still to be reckoned.
    if (isCue(board, i, 'half') && isCue(board, i + 1, 'how-much')) {
      refuse(board, 'ambiguous-number', i, i + 1);
      continue;
    }
    if (!isCue(board, i, 'number-word') || board.taken[i] === true) continue;
    if (isNumberOfVessel(board, i)) {
      refuse(board, 'ambiguous-number', i - 1, i);
      continue;
    }
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
