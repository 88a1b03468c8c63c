import { MG_L_IN } from '../../core/units/concentration.ts';
import type { Board } from './board.ts';
import { hasTag, holdsCue, isMark } from './board.ts';
import type { UnitId } from './words/words.ts';

/** A unit as it stands in the text: which, and its last term. */
export interface UnitAt {
  readonly id: UnitId;
  readonly to: number;
}

/** Units of volume, litres first. */
export const VOLUME_UNITS: readonly UnitId[] = ['L', 'mL', 'cL', 'hL', 'm3', 'galUS', 'galUK', 'gal', 'floz'];
/** Units of mass; tons and quintals are of fruit. */
export const MASS_UNITS: readonly UnitId[] = ['g', 'mg', 'kg', 'lb', 'oz', 'ton', 'quintal'];

/** The unit word at term `i`, among those asked for. */
export function unitWordAt(board: Board, i: number, among: readonly UnitId[]): UnitId | undefined {
  if (board.terms[i]?.kind !== 'word' || board.taken[i] === true) return undefined;
  if (isTonne(board, i) && among.includes('ton')) return 'ton';
  return among.find((id) => hasTag(board, i, `unit:${id}`));
}

/** `vendange 8 t`, `8 t de raisin`: beside fruit the sign of the tonne; anywhere else it may be a tank or the total. */
const isTonne = (board: Board, i: number): boolean =>
  board.terms[i]?.text === 't' &&
  board.terms[i]?.capital === false &&
  board.terms[i - 1]?.kind === 'number' &&
  board.terms[i + 1]?.kind !== 'number' &&
  holdsCue(board, 'fruit');

/** The unit of volume or mass that begins at term `i`; a hyphen may stand before it (`60-gal`). */
export function unitAt(board: Board, i: number, among: readonly UnitId[]): UnitAt | undefined {
  const at = isMark(board, i, '-') && board.terms[i + 1]?.gap === false ? i + 1 : i;
  const id = unitWordAt(board, at, among);
  if (id === undefined) return undefined;
  const dotted = isMark(board, at + 1, '.') && board.terms[at + 1]?.gap === false;
  return { id, to: dotted ? at + 1 : at };
}

const isPer = (board: Board, i: number): boolean => isMark(board, i, '/') || hasTag(board, i, 'cue:per');

/** The concentration that begins at term `i`: `ppm`, `mg/L`, `mg per L`, `g/hL`, `g/L`. */
export function concentrationAt(board: Board, i: number): UnitAt | undefined {
  if (hasTag(board, i, 'unit:ppm')) return { id: 'ppm', to: i };
  if (hasTag(board, i, 'unit:mg/L')) return { id: 'mg/L', to: i };
  if (hasTag(board, i, 'unit:g/hL')) return { id: 'g/hL', to: i };
  const mass = unitWordAt(board, i, ['mg', 'g']);
  if (mass === undefined) return undefined;
  const volume = isPer(board, i + 1) ? unitWordAt(board, i + 2, ['L', 'hL']) : undefined;
  if (volume === undefined) return undefined;
  if (mass === 'mg') return volume === 'L' ? { id: 'mg/L', to: i + 2 } : undefined;
  return { id: volume === 'hL' ? 'g/hL' : 'g/L', to: i + 2 };
}

/** How many mg/L one of that concentration is. */
export const mg_L_IN: Readonly<Partial<Record<UnitId, number>>> = MG_L_IN;
