import type { Command } from '../command.ts';
import type { Talk } from './talk.ts';

/** The code of an invitation, with nothing but the word before it; chat platforms hand one in behind `/start`. */
const JOIN = /^\s*\/?(\p{L}+)(?:@\w+)?[\s:]+([A-Za-z0-9_]{1,47}-[A-Za-z0-9]{16,32})[\s.!]*$/u;

/** Reads `join CODE`; anything else behind the word, and it is talk. */
export function readJoin({ board, said }: Pick<Talk, 'board' | 'said'>): Command | undefined {
  const [, , code] = JOIN.exec(board.message) ?? [];
  return code !== undefined && said[0]?.ids.includes('join') === true ? { name: 'join', code } : undefined;
}
