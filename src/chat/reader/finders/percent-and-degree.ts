import { celsiusSaid } from '../celsius-said.ts';
import type { Board } from '../board.ts';
import { figureAt, find, hasTag, isCue, isFree, isMark, refuse, termAt, setAside } from '../board.ts';
import { isStranger } from '../stranger.ts';
import { percentOfVolume } from './percent-of-volume.ts';

const isPercent = (board: Board, i: number): boolean => isMark(board, i, '%') || isCue(board, i, 'percent');

const unitOf = (board: Board, i: number): 'C' | 'F' | undefined =>
  hasTag(board, i, 'unit:C') ? 'C' : hasTag(board, i, 'unit:F') ? 'F' : undefined;

/** Two shares with a grape each are a blend. */
const isBlend = (board: Board): boolean => board.terms.filter((_, k) => isPercent(board, k)).length > 1;

/** `20% Merlot`, `15% headspace`, `discount 15%`, `citric 5%`: a share of something else. */
const isOfOther = (board: Board, i: number): boolean =>
  isStranger(board, i - 1) ||
  isCue(board, i - 1, 'share-word') ||
  hasTag(board, i - 1, 'additive:none') ||
  isStranger(board, i + 2) ||
  (isCue(board, i + 2, 'variety') &&
    (isBlend(board) || figureAt(board, i).value < 10 || figureAt(board, i).value > 17)) ||
  isCue(board, i + 2, 'share-word') ||
  isCue(board, i + 2, 'of') ||
  (isCue(board, i + 2, 'plain') && isStranger(board, i + 3) && !isMark(board, i + 2, ','));

/** `13.5%`, `13.5 % vol`, `13,5° alc`: an unlabelled % from 5 to 22 is alcohol. */
function findPercent(board: Board, i: number): void {
  const { value } = figureAt(board, i);
  const vol = hasTag(board, i + 2, 'label:volume') || hasTag(board, i + 2, 'label:alcohol');
  if (!vol && isOfOther(board, i))
    return setAside(
      board,
      isStranger(board, i - 1) ? i - 1 : i,
      isStranger(board, i + 2) || isCue(board, i + 2, 'variety') ? i + 2 : i + 1,
    );
  // `avec du 6 %`, `com a de 6 %`: of a solution that is not named.
  const isOfSolution =
    !vol &&
    (isCue(board, i - 1, 'of') || isCue(board, i - 1, 'article')) &&
    [i - 2, i - 3].some((k) => isCue(board, k, 'with') && !isCue(board, k, 'is-if-accented'));
  if (isOfSolution) return refuse(board, 'ambiguous-number', i, i + 1);
  if (vol || (value >= 5 && value <= 22))
    find(board, 'alcohol_percent', value, vol ? 'labelled' : 'unit', i, vol ? i + 2 : i + 1);
  else refuse(board, 'ambiguous-number', i, i + 1);
}

/** `40 hl a 12 °C`: behind figures and known words "to" says "at"; behind an unknown one it may be `enfriar a 12 °C`. */
const isAt = (board: Board, i: number): boolean =>
  isCue(board, i, 'also-at') && !board.terms.some((_, k) => k < i && isStranger(board, k));

/** `14 °C`, `57F`, `14 deg C`; `12°` alone could be alcohol or temperature. */
function findDegrees(board: Board, i: number): void {
  const sign = isMark(board, i + 1, '°') || hasTag(board, i + 1, 'unit:degree');
  const at = sign ? i + 2 : i + 1;
  const unit = unitOf(board, at);
  const { value, from } = figureAt(board, i);
  const isLevel = isCue(board, i - 1, 'to') || isCue(board, i - 1, 'target');
  if (unit && isLevel && !isAt(board, i - 1)) return setAside(board, i - 1, at);
  if (unit === 'F' && !sign && termAt(board, at).gap && value < 40) return;
  if (unit) find(board, 'temperature_C', celsiusSaid(value, unit), 'unit', from, at);
  else if (sign && hasTag(board, at, 'label:alcohol'))
    find(board, 'alcohol_percent', value, 'labelled', i, at);
  else if (sign) refuse(board, 'ambiguous-number', i, i + 1);
}

/** `T° 14`, `T°C: 14`: the temperature, as labels of tanks have it. */
function findTemperatureSign(board: Board, i: number): void {
  if (board.terms[i]?.text !== 't' || !isMark(board, i + 1, '°') || termAt(board, i + 1).gap) return;
  let k = unitOf(board, i + 2) && !termAt(board, i + 2).gap ? i + 3 : i + 2;
  if (isMark(board, k, ':') || isMark(board, k, '=')) k++;
  if (!isFree(board, k) || unitOf(board, i + 2) === 'F' || unitOf(board, k + 1) === 'F') return;
  const to = isMark(board, k + 1, '°') ? k + 1 : k;
  find(board, 'temperature_C', figureAt(board, k).value, 'labelled', i, unitOf(board, to + 1) ? to + 1 : to);
}

/** Finds alcohol by its % and temperature by its degrees. */
export function findPercentAndDegree(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) findTemperatureSign(board, i);
  for (let i = 0; i < board.terms.length; i++) {
    if (!isFree(board, i)) continue;
    const byVolume = percentOfVolume(board, i + 1);
    if (byVolume !== undefined)
      find(board, 'alcohol_percent', figureAt(board, i).value, 'labelled', i, byVolume);
    else if (isPercent(board, i + 1)) findPercent(board, i);
    else findDegrees(board, i);
  }
}
