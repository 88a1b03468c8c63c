import type { Board } from '../board.ts';
import { isMark } from '../board.ts';
import type { Command } from '../command.ts';
import { draftOfBoard } from '../draft-of-board.ts';
import { emptyReading } from '../empty-reading.ts';
import type { Draft } from '../understood.ts';
import type { OwnWordId } from '../words/words.ts';
import { readCellarWord } from './cellar-word.ts';
import { readDay } from './day.ts';
import { readExport } from './export.ts';
import { readImport } from './import.ts';
import { readJoin } from './join.ts';
import { readLimit } from './limit.ts';
import { readLab } from './lab.ts';
import { readLanguage } from './language.ts';
import { readLater } from './later.ts';
import { readOrder } from './order.ts';
import { readPersonWord } from './person-word.ts';
import { readPlain } from './plain.ts';
import { readSetting } from './settings.ts';
import { readStatement } from './statement.ts';
import { readStock } from './stock.ts';
import { readStrike } from './strike.ts';
import type { Talk } from './talk.ts';
import { talkOf } from './talk.ts';

/** A command has not more terms, unless it ends in a reason or the name of a file; own threshold. */
const MOST_TERMS = 24;

const LONG: readonly ((talk: Talk) => Command | undefined)[] = [readStrike, readImport, readJoin];
const SHORT: readonly ((talk: Talk) => Command | undefined)[] = [
  readLab,
  readPlain,
  readDay,
  readLater,
  readExport,
  readLanguage,
  readSetting,
  readPersonWord,
  readCellarWord,
];

/** The words without which nothing is talk to the bot. */
const OPENERS: ReadonlySet<OwnWordId> = new Set([
  'show', 'vessels', 'today', 'yesterday', 'last-night', 'before-yesterday', 'sheet', 'what-was-added', 'history', 'undo', 'strike',
  'order', 'orders', 'open', 'due', 'later', 'remind', 'not', 'unwatch', 'watch', 'settings', 'export', 'import', 'backup', 'forget',
  'forget-me', 'units', 'work-in', 'metric', 'us', 'imperial', 'usual', 'usual-bare', 'reds', 'whites', 'sweets', 'target', 'quiet', 'daily',
  'zone', 'we-are-in', 'allowance', 'basis', 'yield', 'replies', 'counts', 'every',
  'picture', 'round', 'added-it', 'done', 'invite', 'keeper', 'hand', 'guest', 'people', 'remove', 'join', 'at-cellar', 'cellars', 'cellar-is', 'name-cellar', 'leave-cellar',
  'read-along', 'only-called', 'language', 'law', 'limit', 'full-dose', 'yes',
  'stock', 'received', 'used-up', 'discarded', 'counted', 'in-store',
  'lab-range', 'lab-table', 'lab-molecular', 'lab-forecast', 'lab-blend', 'lab-too-much',
]); // prettier-ignore

/** Whether a message could be talk to the bot at all: one of its own words opens it, it is a day, or asks for a vessel. */
const mayBeTalk = (board: Board): boolean =>
  board.pieces.some(
    ({ ids, text, month, weekday }) =>
      ids.some((id) => OPENERS.has(id)) ||
      month !== undefined ||
      weekday !== undefined ||
      board.lexicon.languages.has(text),
  ) ||
  isMark(board, 0, '/') ||
  (isMark(board, board.terms.length - 1, '?') && board.terms.length <= 6) ||
  (board.terms[0]?.kind === 'number' && board.terms.length <= 6);

function commandOf(board: Board, talk: Talk): Draft | undefined {
  const readers = board.terms.length <= MOST_TERMS ? [...LONG, ...SHORT] : LONG;
  for (const read of readers) {
    const command = read(talk);
    if (!command) continue;
    // What stands in a reason or in the name of a file is nothing that was said of a vessel.
    if (LONG.includes(read)) return { ...emptyReading('command'), command };
    return { ...draftOfBoard(talk.board, 'command'), command };
  }
  return readStock(talk) ?? readOrder(talk) ?? readLimit(talk);
}

/**
 * Reads one of the bot's own words, or a statement about a vessel. Each takes every word of the message, so that none
 * takes a reading for its own; in doubt there is none.
 */
export function readOwn(board: Board): Draft | undefined {
  const command = mayBeTalk(board) ? commandOf(board, talkOf(board)) : undefined;
  return command ?? readStatement(board);
}
