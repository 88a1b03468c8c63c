import type { Board } from '../board.ts';
import { claim, find, hasTag, isCue, isMark, refuse, saysMany, termAt } from '../board.ts';
import type { Named } from './vessel-word.ts';
import { hasOwnUnit, isWholeAt, kindOf } from './vessel-word.ts';
import { rowOrLevel } from './row-or-level.ts';
import { rowFrom } from './vessel-row.ts';

/** `4A` after a tank word: the letter belongs to the name. */
function suffix(board: Board, i: number): { letter: string; to: number } {
  const after = board.terms[i + 1];
  const letter = after?.kind === 'word' && !after.gap && /^[a-z]$/.test(after.text) && !hasOwnUnit(board, i);
  return letter ? { letter: after.text.toUpperCase(), to: i + 1 } : { letter: '', to: i };
}

/** `tank 4`, `tank #4`, `tank no. 4`, `barrel 17`, `tank B`. */
function worded(board: Board, i: number): Named | undefined {
  const kind = kindOf(board, i);
  if (kind === undefined || (termAt(board, i).text === 'stuck' && board.terms[i - 1]?.kind !== 'number'))
    return undefined;
  let k = i + 1;
  while (
    isMark(board, k, '#') ||
    isMark(board, k, '-') ||
    isMark(board, k, ':') ||
    isMark(board, k, '.') ||
    isMark(board, k, "'") ||
    isCue(board, k, 'number-sign') ||
    // `nº 7`, `n° 7`
    (isMark(board, k, '°') && isCue(board, k - 1, 'number-sign'))
  )
    k++;
  if (k > i + 4) return undefined;
  if (isWholeAt(board, k) && !hasOwnUnit(board, k)) {
    if (isCue(board, k + 1, 'times') || isMark(board, k + 1, '×')) return undefined;
    // `12 barrels 2 tablets of 5 g each`: two tablets for each of twelve.
    if (isWholeAt(board, i - 1) && saysMany(termAt(board, i)) && isCue(board, k + 1, 'tablet'))
      return undefined;
    // `10 g/barrel 12 barrels`, `barrels: 2 barrels 225 L`: so many of them, and none with that number.
    const counts = isMark(board, i - 1, '/') || (k > i + 1 && saysMany(termAt(board, k + 1)));
    if (counts && hasTag(board, k + 1, 'vessel:barrel')) return undefined;
    const { letter, to } = suffix(board, k);
    const number = Number(termAt(board, k).text);
    return { name: `${kind} ${number}${letter}`, kind, ...(letter ? {} : { number }), from: i, to };
  }
  const single = board.terms[i + 1];
  if (
    kind === 'tank' &&
    single?.kind === 'word' &&
    /^[b-z]$/.test(single.text) &&
    single.capital &&
    board.terms[i + 2]?.kind !== 'number'
  ) {
    return { name: `tank ${single.text.toUpperCase()}`, kind, from: i, to: i + 1 };
  }
  return undefined;
}

const NO_CODE =
  /^(label:(?!so2)|cue:(target|to|from|raise|up|add|need|in|of|with|by|and|per|is|molecular|lot|binding|number-sign|month|not|correction|size|past|over|at)|unit:(none|ppm)|additive|stage|style|organic|category)/;

/** `T4`, `T-4`, `FV3`, `B17`: letters and a whole number with nothing between but a hyphen. */
function coded(board: Board, i: number): Named | undefined {
  const word = termAt(board, i);
  if (!/^[a-z]{1,4}$/.test(word.text) || (board.terms[i - 1]?.kind === 'number' && !word.gap))
    return undefined;
  const hyphen = isMark(board, i + 1, '-') && termAt(board, i + 1).gap === false;
  const k = hyphen ? i + 2 : i + 1;
  if (!isWholeAt(board, k)) return undefined;
  const glued = termAt(board, k).gap === false;
  const spacedT = word.text === 't' && !hyphen;
  if (!glued && !spacedT) return undefined;
  const tank = word.text === 't' || hasTag(board, i, 'vessel:tank');
  const barrel = hasTag(board, i, 'vessel:barrel');
  const single = word.text.length === 1;
  if (
    !tank &&
    !barrel &&
    word.tags.some((tag) => (single ? /^(cue:(in|of|with)|label)/ : NO_CODE).test(tag)) &&
    word.text !== 'b'
  )
    return undefined;
  if (isCue(board, i, 'times') || (hasOwnUnit(board, k) && !glued)) return undefined;
  if (glued && !hyphen && single && hasOwnUnit(board, k) && isMark(board, k + 1, '/')) return undefined;
  // `K2CO3`, `E211`: a formula or a number of an additive is no vessel.
  const tail = board.terms[k + 1];
  if (
    tail?.kind === 'word' &&
    !tail.gap &&
    tail.text.length > 1 &&
    tail.tags.length === 0 &&
    !hasOwnUnit(board, k)
  )
    return undefined;
  if (word.text === 'e' && /^\d{3}$/.test(termAt(board, k).text)) return undefined;
  const { letter, to } = suffix(board, k);
  const number = Number(termAt(board, k).text);
  const prefix = tank && !letter ? 'tank ' : barrel ? 'barrel ' : `${word.text.toUpperCase()}`;
  const name = tank && letter ? `T${number}${letter}` : `${prefix}${number}${letter}`;
  return { name, kind: prefix, ...(letter ? {} : { number }), from: i, to };
}

/** `B1-B24`, `barrels 12 to 24`: the last vessel of the range, when one follows. */
function rangeEnd(board: Board, first: Named): { number: number; to: number } | undefined {
  const k = first.to + 1;
  const joins =
    isMark(board, k, '-') ||
    isCue(board, k, 'to') ||
    isCue(board, k, 'joined') ||
    (isMark(board, k, '.') && isMark(board, k + 1, '.'));
  const isMinus = isMark(board, k, '-') && termAt(board, k).gap && board.terms[k + 1]?.gap === false;
  if (!joins || isMinus || first.number === undefined) return undefined;
  // `moved T4 to T9`: out of one and into the other.
  const isOne = !saysMany(termAt(board, first.from));
  if (isOne && isCue(board, k, 'to') && board.pieces.some(({ ids }) => ids.includes('moved')))
    return undefined;
  const at = isMark(board, k, '.') ? k + 2 : k + 1;
  const second = worded(board, at) ?? (board.terms[at]?.kind === 'word' ? coded(board, at) : undefined);
  if (second?.number !== undefined && second.kind === first.kind)
    return { number: second.number, to: second.to };
  const glued = isMark(board, k, '-') && !termAt(board, k).gap && !termAt(board, k + 1).gap;
  const plural = saysMany(termAt(board, first.from)) || glued;
  if (
    plural &&
    isWholeAt(board, at) &&
    !hasOwnUnit(board, at) &&
    (kindOf(board, first.from) !== undefined || termAt(board, at).gap === false)
  ) {
    return { number: Number(termAt(board, at).text), to: at };
  }
  return undefined;
}

/** Finds a row of vessels, and what is left out of it; gives the term that it ends with. */
function findRange(board: Board, first: Named, last: { number: number; to: number }): number {
  const from = first.number ?? 0;
  if (last.number <= from || last.number - from > 499) {
    refuse(board, 'ambiguous-number', first.from, last.to);
    return last.to;
  }
  const prefix = /^(tank|barrel|[A-Z]+ )/.test(first.name)
    ? `${first.name.slice(0, first.name.lastIndexOf(String(from)))}`
    : first.kind;
  const left = leftOut(board, first, last.to);
  const numbers = Array.from({ length: last.number - from + 1 }, (_, k) => from + k);
  const kept = numbers.filter((number) => !left.numbers.includes(number));
  if (left.numbers.some((number) => !numbers.includes(number)) || kept.length < 2) {
    refuse(board, 'ambiguous-number', first.from, left.to);
    return left.to;
  }
  find(
    board,
    'vessels',
    kept.map((number) => `${prefix}${number}`),
    'labelled',
    first.from,
    left.to,
  );
  return left.to;
}

/** `B1-B24 without B7 and B9`, `except B7-B9`, `but not 7`: the numbers that are left out of a row, and where they end. */
function leftOut(board: Board, first: Named, to: number): { numbers: readonly number[]; to: number } {
  const numbers: number[] = [];
  let end = to;
  let k = isMark(board, to + 1, '(') || isMark(board, to + 1, ',') ? to + 2 : to + 1;
  if (!isCue(board, k, 'except')) return { numbers, to };
  const isBracketed = isMark(board, to + 1, '(');
  for (k += 1; ; k += 1) {
    if (isCue(board, k, 'article')) k += 1;
    const named = board.terms[k]?.kind === 'word' ? (worded(board, k) ?? coded(board, k)) : undefined;
    const isBare =
      isWholeAt(board, k) && !hasOwnUnit(board, k) && (numbers.length === 0 || isCue(board, k - 1, 'and'));
    const one =
      named?.number !== undefined && named.kind === first.kind
        ? { number: named.number, to: named.to }
        : isBare
          ? { number: Number(termAt(board, k).text), to: k }
          : undefined;
    if (one === undefined) break;
    const last = named === undefined ? undefined : rangeEnd(board, named);
    for (let number = one.number; number <= (last?.number ?? one.number); number += 1) numbers.push(number);
    end = last?.to ?? one.to;
    const joins = isMark(board, end + 1, ',') || isCue(board, end + 1, 'and');
    if (!joins) break;
    k = end + 1;
  }
  if (isBracketed && isMark(board, end + 1, ')')) end += 1;
  return { numbers, to: end };
}

/** `tanks 4 and 5`, `barrels 3, 5 and 9`: where the last number of the others stands, none of which is free SO2. */
function anotherNumber(board: Board, { kind, from, to }: Named): number | undefined {
  if (kindOf(board, from) !== kind || !saysMany(termAt(board, from))) return undefined;
  let last = to;
  const joins = (k: number): boolean =>
    isCue(board, k, 'and') || isMark(board, k, ',') || isMark(board, k, '&');
  while (joins(last + 1) && isWholeAt(board, last + 2) && !hasOwnUnit(board, last + 2)) last += 2;
  return last > to ? last : undefined;
}

/** Finds the vessel: a tank or barrel word with its number, or a code; `B1-B24` is that many vessels. */
export function findVessel(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (board.taken[i] === true || termAt(board, i).kind !== 'word') continue;
    const row = rowFrom(board, i);
    const named = row?.first ?? worded(board, i) ?? coded(board, i);
    if (!named) continue;
    const last = row?.last ?? rangeEnd(board, named);
    if (last) {
      i = findRange(board, named, last);
      continue;
    }
    const isWorded = named.number !== undefined && kindOf(board, named.from) === named.kind;
    const another =
      anotherNumber(board, named) ?? (isWorded ? rowOrLevel(board, named.number ?? 0, named.to) : undefined);
    if (another !== undefined) {
      refuse(board, 'ambiguous-number', named.from, another);
      i = another;
      continue;
    }
    find(board, 'vessel', named.name, 'labelled', named.from, named.to);
    if (kindOf(board, i - 1) === 'tank' || kindOf(board, i - 1) === 'barrel') claim(board, i - 1, i - 1);
    i = named.to;
  }
}
