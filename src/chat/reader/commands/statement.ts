import type { Board } from '../board.ts';
import { termAt } from '../board.ts';
import type { Command } from '../command.ts';
import { draftOfBoard } from '../draft-of-board.ts';
import type { Term } from '../split-terms.ts';
import type { Draft } from '../understood.ts';
import type { Tag } from '../words/words.ts';
import { readAcid } from './statements/acid.ts';
import { readCapacity } from './statements/capacity.ts';
import { readEmptied } from './statements/emptied.ts';
import { readLot } from './statements/lot.ts';
import { readMoved } from './statements/moved.ts';
import type { Tale } from './statements/tale.ts';
import { asks, taleOf } from './statements/tale.ts';
import { readTold } from './statements/told.ts';
import { readTopped } from './statements/topped.ts';

/** A statement has not more terms; own threshold. */
const MOST_TERMS = 24;

/** Words of a reading or a dose: beside one of them a message is no mere statement. */
const OF_A_DOSE: readonly Tag[] = ['label:ph', 'label:free', 'label:so2', 'cue:target', 'cue:how-much', 'unit:ppm', 'unit:mg/L', 'unit:g']; // prettier-ignore

const READERS: readonly ((tale: Tale) => Command | undefined)[] = [
  readMoved,
  readTopped,
  readEmptied,
  readAcid,
  readCapacity,
  readTold,
];

const isVesselWord = ({ tags }: Term): boolean => tags.some((tag) => tag.startsWith('vessel:'));

/** Whether figure `i` is joined to a word, as in the name of a vessel, or has a unit, or is one of a clock or a date. */
function hasCompany(board: Board, i: number): boolean {
  const [before, next] = [termAt(board, i - 1), termAt(board, i + 1)];
  const isJoined =
    !termAt(board, i).gap || before.text === 't' || before.text === '#' || isVesselWord(before);
  return isJoined || !/^\d*[.,]\d+$/.test(termAt(board, i).text) || next.kind === 'word';
}

/** Words of what the law asks about a wine: the figure beside one has a meaning, and its unit is no reading's. */
const OF_THE_LAW: readonly Tag[] = ['cue:designated', 'cue:density', 'cue:keep', 'cue:bottling-reserve', 'label:sugar']; // prettier-ignore

const isAboutLaw = ({ cues }: Board): boolean => OF_THE_LAW.some((tag) => cues.has(tag));

/** Whether a vessel could be named, and no figure stands alone that no statement has. */
function mayBeStatement(board: Board): boolean {
  let isNamed = false;
  const isAcid = board.pieces.some(({ ids }) => ids.includes('acidified'));
  const isOfLaw = isAboutLaw(board);
  for (let i = 0; i < board.terms.length; i++) {
    const term = termAt(board, i);
    if (isVesselWord(term)) isNamed = true;
    if (term.kind !== 'number') continue;
    const before = termAt(board, i - 1);
    if (before.text === 't' || (!term.gap && (before.kind === 'word' || before.text === '-'))) isNamed = true;
    if (!hasCompany(board, i) && !isAcid && !isOfLaw) return false;
  }
  return isNamed;
}

/**
 * Reads a statement about a vessel. It takes the whole message: a word that none of them has, a figure that is no
 * volume of wine or no moment, a question, and it is none.
 */
export function readStatement(board: Board): Draft | undefined {
  const last = termAt(board, board.terms.length - 1);
  if (board.terms.length > MOST_TERMS || last.text === '?') return undefined;
  const ofADose = isAboutLaw(board) ? OF_A_DOSE.filter((tag) => !tag.startsWith('unit:')) : OF_A_DOSE;
  if (ofADose.some((tag) => board.cues.has(tag)) || !mayBeStatement(board)) return undefined;
  const lot = readLot(board);
  if (lot) return lot;
  const tale = taleOf(board);
  if (!tale || asks(tale)) return undefined;
  for (const read of READERS) {
    const command = read(tale);
    if (command) return { ...draftOfBoard(tale.board, 'command'), command };
  }
  return undefined;
}
