import type { Board } from './board.ts';
import { holdsCue, isCue } from './board.ts';

const NOD = /[\u{1F44D}\u{1F44C}\u{1F64F}\u{1F377}\u{1F642}\u{1F600}-\u{1F60A}\u{2764}\u{2705}]/u;

/** The matter of a message that is no reading: help, thanks, a greeting; undefined for the rest. */
export function topicOf(board: Board): string | undefined {
  const marks = board.terms.filter(({ kind }) => kind !== 'break');
  if (marks.length > 0 && marks.every(({ text }) => text === '?' || text === '¿')) return 'help';
  if (board.message.trimStart().startsWith('/start') || holdsCue(board, 'help')) return 'help';
  if (board.marks.wick) return 'burning-sulfur';
  const words = board.terms.filter(({ kind }) => kind === 'word').length;
  if (words === 0 && NOD.test(board.message)) return 'thanks';
  const greets = holdsCue(board, 'greeting') && words <= 6;
  if (greets && isCue(board, 0, 'greeting')) return 'greeting';
  if (holdsCue(board, 'thanks') && words <= 8) return 'thanks';
  return greets ? 'greeting' : undefined;
}

/** Whether nothing in a message is a word that is known: then it is said not to be understood. */
export function isStrange(board: Board): boolean {
  return !board.terms.some(({ tags }) => tags.length > 0);
}
