import type { Board } from '../board.ts';
import { claim, freshBoard, isFree } from '../board.ts';
import { draftOfBoard } from '../draft-of-board.ts';
import { runFinders } from '../run-finders.ts';
import { isStranger } from '../stranger.ts';
import type { Draft, FieldName } from '../understood.ts';
import type { Talk } from './talk.ts';
import { saysOnly } from './talk.ts';

/** What an order may state; a reading beside it makes it none. */
const ORDERED = new Set<FieldName>(['vessel', 'vessels', 'volume_L', 'additive', 'strength_percent', 'tablet_SO2_g', 'tablet_salt_g']); // prettier-ignore
const AMOUNTS = new Set<FieldName>(['mass_g', 'additive_volume_mL', 'tablets', 'added_mg_L', 'rate_mg_L']);

/** The word that orders, in front or right behind the vessel. */
function orderAt({ board, said }: Talk): number | undefined {
  const first = said.find(({ ids }) => !ids.includes('filler'));
  const vessel = board.findings[0];
  if (first?.ids.includes('order') !== true || vessel === undefined) return undefined;
  const leads = board.pieces.every(
    ({ from, ids }) =>
      from >= first.from || ids.includes('filler') || (from >= vessel.from && from <= vessel.to),
  );
  return leads ? first.from : undefined;
}

/** `order T4`, `order kmbs for T4`: how much is missing, and nothing else is said. */
const isBare = (talk: Talk, board: Board): boolean =>
  saysOnly(talk, ['order', 'for', 'of', 'to'], new Set(talk.said.filter(({ from }) => board.taken[from])));

/** Reads an order for a vessel: `order T4 256 g`, `order 30 ppm for T4`; without a vessel it is buying. */
export function readOrder(talk: Talk): Draft | undefined {
  const at = orderAt(talk);
  if (at === undefined || talk.isQuestion) return undefined;
  // What is ordered is read as what was added is: a concentration is what goes in, and no reading.
  const board: Board = { ...freshBoard(talk.board, { orders: true }), pastTense: true };
  claim(board, at, at);
  runFinders(board);
  if (board.terms.some((_, i) => isStranger(board, i) || isFree(board, i))) return undefined;
  const draft = draftOfBoard(board, 'command');
  const names = Object.keys(draft.fields) as FieldName[];
  const isAmount = names.some((name) => AMOUNTS.has(name)) || board.problems.length > 0;
  if (names.filter((name) => AMOUNTS.has(name)).length > 1) return undefined;
  if (!isAmount && !isBare(talk, board)) return undefined;
  if (!names.every((name) => ORDERED.has(name) || AMOUNTS.has(name))) return undefined;
  return { ...draft, command: { name: 'order' } };
}
