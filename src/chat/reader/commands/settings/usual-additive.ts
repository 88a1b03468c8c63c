import type { Board } from '../../board.ts';
import { findingOf, freshBoard } from '../../board.ts';
import type { Command } from '../../command.ts';
import { findAdditive } from '../../finders/additive.ts';
import type { Talk } from '../talk.ts';
import { says } from '../talk.ts';
import { set, setWrong } from './set.ts';

const SPEAKS_OF_STRENGTH = /^cue:(salt-word|solution|powder|percent|of)$/;
const NAMES = /^(additive:|cue:(tablet|sachet)$)/;

const isNamed = (board: Board): boolean =>
  board.terms.some(({ tags }) => tags.some((tag) => NAMES.test(tag))) ||
  findingOf(board, 'additive') !== undefined;

/** `our usual is …`, `usual: …`; the usual kmbs alone answers a question and sets nothing. */
const isOpened = (talk: Talk): boolean =>
  says(talk, 'usual') ||
  (says(talk, 'usual-bare') &&
    (says(talk, 'is') || talk.board.terms.some(({ text }) => text === ':' || text === '=')));

const openerOf = ({ said }: Talk): number =>
  said.find(({ ids }) => ids.includes('usual') || ids.includes('usual-bare'))?.from ?? 0;

/** `potassium metabisulfite, 57%`: nothing else is said, so the per cent is its own. */
const commasAsColons = (board: Board): Board => ({
  ...board,
  terms: board.terms.map((term) => (term.text === ',' ? { ...term, text: ':' } : term)),
});

/** Reads `our usual is kmbs 57%`, `usual additive smbs`; what cannot be the usual one is quoted. */
export function readUsualAdditive(talk: Talk): Command | undefined {
  if (!isOpened(talk)) return undefined;
  const board = commasAsColons(freshBoard(talk.board));
  findAdditive(board);
  const named = talk.said.filter(
    ({ ids }) => !ids.some((id) => /^(usual|usual-bare|filler|is|default|work-in)$/.test(id)),
  );
  const rest = named.filter(
    ({ from, kind }) =>
      board.taken[from] !== true &&
      kind !== 'mark' &&
      !board.terms[from]?.tags.some((tag) => SPEAKS_OF_STRENGTH.test(tag)),
  );
  if (named.length === 0 || !isNamed(board)) return undefined;
  const additive = findingOf(board, 'additive')?.value;
  const isFirst = named.every(({ from }) => from > openerOf(talk));
  if (!isFirst || rest.some(({ kind }) => kind === 'number')) return undefined;
  if (additive === undefined || board.marks.unnamedAdditive)
    return rest.length <= 2 ? setWrong(talk, 'usual-additive', named) : undefined;
  if (rest.length > 0) return undefined;
  if (board.problems.length > 0) return setWrong(talk, 'usual-additive', named);
  const strength_percent = findingOf(board, 'strength_percent')?.value;
  return set({
    of: 'usual-additive',
    additive,
    ...(strength_percent !== undefined && { strength_percent }),
    ...(board.marks.strengthAsSalt && { strength_of: 'salt' }),
  });
}
