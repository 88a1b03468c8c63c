import type { Board } from '../board.ts';
import { hasTag, isCue, isFree, isMark, refuse, setAside, termAt, labelBefore } from '../board.ts';

const textAt = (board: Board, i: number): string => board.terms[i]?.text ?? '';
const isPlainWhole = (board: Board, i: number): boolean =>
  isFree(board, i) && /^\d+$/.test(textAt(board, i)) && termAt(board, i).value === undefined;
const isLabelBefore = (board: Board, i: number): boolean => {
  const label = labelBefore(board, i);
  return label !== undefined && !hasTag(board, label, 'label:aside');
};
const isUnitAfter = (board: Board, i: number): boolean =>
  board.terms[i + 1]?.tags.some((tag) => tag.startsWith('unit:') && tag !== 'unit:none-of-ours') === true;

/** `12/11/2026`, `2026-11-12`. */
function dateEnd(board: Board, i: number): number | undefined {
  const mark = textAt(board, i + 1);
  if ((mark !== '/' && mark !== '-') || textAt(board, i + 3) !== mark) return undefined;
  return [i, i + 2, i + 4].every((k) => isPlainWhole(board, k)) && termAt(board, i + 1).gap === false
    ? i + 4
    : undefined;
}

/** `8:30`, and `3.30 pm`. */
function clockEnd(board: Board, i: number): number | undefined {
  if (
    !isMark(board, i + 1, ':') ||
    !isPlainWhole(board, i + 2) ||
    termAt(board, i + 1).gap ||
    termAt(board, i + 2).gap
  )
    return undefined;
  return hasTag(board, i + 3, 'unit:none-of-ours') ? i + 3 : i + 2;
}

function vintageEnd(board: Board, i: number): number | undefined {
  const text = textAt(board, i);
  const year = /^(19[89]\d|20[0-3]\d)$/.test(text) && termAt(board, i).value === undefined;
  return year && !isUnitAfter(board, i) && !isLabelBefore(board, i) && !isCue(board, i + 1, 'thousand')
    ? i
    : undefined;
}

/** A number between words that say it is a month's day, a lot, a block: `12 Nov`, `lot 4471`, `block 7`. */
function namedEnd(board: Board, i: number): number | undefined {
  if (isCue(board, i + 1, 'month') && isPlainWhole(board, i)) return i + 1;
  if (isUnitAfter(board, i) || hasTag(board, i + 1, 'vessel:barrel')) return undefined;
  if (isCue(board, i - 1, 'month')) return hasTag(board, i + 1, 'unit:none-of-ours') ? i + 1 : i;
  const sign = isMark(board, i - 1, '#') || isCue(board, i - 1, 'number-sign') ? i - 2 : i - 1;
  if (isCue(board, sign, 'lot') && !hasTag(board, sign, 'vessel:tank') && isPlainWhole(board, i)) return i;
  return undefined;
}

/** A blank inside a decimal: `pH 3. 61` could be 3.61, or 3 and 61. */
function brokenDecimalEnd(board: Board, i: number): number | undefined {
  if (!/^[2-4]$/.test(textAt(board, i)) || board.terms[i + 1]?.gap !== false) return undefined;
  const isPoint =
    isMark(board, i + 1, '.') || (isMark(board, i + 1, ',') && hasTag(board, i - 1, 'label:ph'));
  return isPoint &&
    /^\d{1,2}$/.test(textAt(board, i + 2)) &&
    termAt(board, i + 2).gap &&
    !isUnitAfter(board, i + 2) &&
    (!hasTag(board, i + 3, 'label:free') || isFree(board, i + 4))
    ? i + 2
    : undefined;
}

const isBullet = (board: Board, i: number): boolean => {
  const before = board.terms[i - 1];
  const starts = before === undefined || before.kind === 'break';
  return (
    starts &&
    isPlainWhole(board, i) &&
    (isMark(board, i + 1, ')') || (isMark(board, i + 1, '.') && board.terms[i + 2]?.gap === true))
  );
};

/** `from 20 to 12 brix`: the unit behind the second figure is of both. */
const fallsFrom = (board: Board, i: number): number =>
  isCue(board, i - 1, 'to') && isFree(board, i - 2) && !isLabelBefore(board, i - 2) ? i - 2 : i;

/** Sets aside dates, times, vintages, lots and figures with units that are none of ours. */
export function findOtherFigures(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (!isFree(board, i)) continue;
    const broken = brokenDecimalEnd(board, i);
    if (broken !== undefined) {
      refuse(board, 'ambiguous-number', i, broken);
      continue;
    }
    if (isBullet(board, i)) {
      board.taken[i] = true;
      continue;
    }
    const from = isMark(board, i - 1, "'") && !termAt(board, i).gap ? i - 1 : i;
    const short = from < i && /^\d\d$/.test(textAt(board, i)) ? i : undefined;
    const named = namedEnd(board, i);
    const end = short ?? dateEnd(board, i) ?? clockEnd(board, i) ?? named ?? vintageEnd(board, i);
    const labelled = end === named && named === i && !isCue(board, i - 1, 'month');
    if (end !== undefined) setAside(board, labelled ? i - 1 : from, end);
    else if (hasTag(board, i + 1, 'unit:none-of-ours') && !isLabelBefore(board, i))
      setAside(board, fallsFrom(board, i), i + 1);
  }
}
