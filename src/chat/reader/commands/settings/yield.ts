import { freshBoard } from '../../board.ts';
import type { Command } from '../../command.ts';
import { findYield } from '../../finders/fruit.ts';
import type { Talk } from '../talk.ts';
import { says, saysOnly } from '../talk.ts';
import { set, setWrong } from './set.ts';

const SMALL = ['yield', 'usual-bare', 'default', 'is', 'of', 'to'] as const;

/** Reads `yield 65`, `our yield is 160 gal/ton`, `no yield`, where nothing else is said. */
export function readYield(talk: Talk): Command | undefined {
  if (!says(talk, 'yield')) return undefined;
  const board = freshBoard(talk.board);
  findYield(board);
  const claimed = talk.said.filter(({ from, to }) => board.taken[from] === true && board.taken[to] === true);
  if (!saysOnly(talk, [...SMALL, 'no', 'off'], new Set(claimed))) return undefined;
  if (board.problems.length > 0) return setWrong(talk, 'yield', claimed);
  const { yield_L_per_100_kg } = board.marks;
  if (yield_L_per_100_kg !== undefined) return set({ of: 'yield', yield_L_per_100_kg });
  return says(talk, 'no', 'off') ? set({ of: 'yield', yield_L_per_100_kg: 'off' }) : undefined;
}
