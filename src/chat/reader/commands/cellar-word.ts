import type { Command } from '../command.ts';
import { isAName } from './a-name.ts';
import type { Talk } from './talk.ts';
import { saysOnly } from './talk.ts';
import { textBehind } from './text-behind.ts';

/** A name as it is written: each of its words with a capital. What the cellar is like has none. */
const CAPITALS = /^\p{Lu}[^ ]*(?: (?:\p{Lu}|&|\d)[^ ]*)*$/u;

/** Reads what is said of the cellar itself: `at Blanca`, `cellars`, `leave Blanca`, `this cellar is Blanca`, `cellar name Blanca`. */
export function readCellarWord(talk: Talk): Command | undefined {
  const { board, said, isQuestion } = talk;
  if (board.findings.length > 0) return undefined;
  if (said.some(({ ids }) => ids.includes('cellars')) && saysOnly(talk, ['cellars', 'show', 'all', 'ask']))
    return { name: 'at' };
  const [first] = said;
  if (first === undefined || isQuestion) return undefined;
  const isAt = first.ids.includes('at-cellar') && first.text === board.pieces[0]?.text;
  if (isAt && said.length === 1) return { name: 'at' };
  const text = textBehind(board, first);
  if (!isAName(text)) return undefined;
  if (isAt) return { name: 'at', cellar: text };
  if (first.ids.includes('leave-cellar'))
    return CAPITALS.test(text) ? { name: 'leave', cellar: text } : undefined;
  if (first.ids.includes('name-cellar')) return { name: 'name-cellar', as: text };
  return first.ids.includes('cellar-is') && CAPITALS.test(text)
    ? { name: 'name-cellar', as: text }
    : undefined;
}
