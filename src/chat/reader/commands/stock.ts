import type { StockEvent } from '../../../core/cellar/entry.ts';
import type { Board } from '../board.ts';
import { claim, findingOf, freshBoard, isCue, isFree, isMark, termAt } from '../board.ts';
import type { Command } from '../command.ts';
import { draftOfBoard } from '../draft-of-board.ts';
import { findAdditive } from '../finders/additive.ts';
import { findChemicalLot } from '../finders/chemical-lot.ts';
import { findTablets } from '../finders/tablets.ts';
import { findVessel } from '../finders/vessel.ts';
import { findWhen } from '../finders/when.ts';
import type { Piece } from '../own-pieces.ts';
import { ownPieces } from '../own-pieces.ts';
import type { Draft } from '../understood.ts';
import type { OwnWordId } from '../words/words.ts';
import { findStockAmount } from './stock-amount.ts';
import type { Stretch } from './stretch-behind.ts';
import { stretchBehind } from './stretch-behind.ts';
import type { Talk } from './talk.ts';
import { says } from './talk.ts';

/** The words that open what is told of the store, and what each tells. */
const OPENERS = {
  received: 'received',
  'used-up': 'used',
  discarded: 'discarded',
  counted: 'counted',
  stock: 'counted',
} as const satisfies Readonly<Partial<Record<OwnWordId, StockEvent>>>;

const OPENING = Object.keys(OPENERS) as (keyof typeof OPENERS)[];

/** Words that may stand beside an amount and its additive. */
const ALLOWED: readonly OwnWordId[] = ['spoilt', 'filler', 'courtesy', 'of', 'some', 'in-store', 'is', 'left', 'now', 'for', 'stock', 'ask', 'show', 'still', 'has']; // prettier-ignore

/** What may be found: a pH, a volume of wine, a vessel beside it, and it tells of wine. */
const OF_STOCK = new Set(['additive', 'strength_percent', 'tablet_SO2_g', 'tablet_salt_g', 'tablets', 'mass_g', 'additive_volume_mL']); // prettier-ignore

/** `25 kg de meta`: in many languages one word says from and of; behind it is a figure, or what came in. */
const isOfWhat = ({ terms }: Board, i: number): boolean =>
  terms[i]?.kind === 'number' ||
  terms[i]?.tags.some((tag) => tag.startsWith('additive:') || tag === 'label:so2') === true;

/** Whom it came from; a vessel is no supplier. */
function supplierIn(board: Board): Stretch | undefined {
  const opener = board.pieces.find(({ ids, to }) => ids.includes('supplier') && !isOfWhat(board, to + 1));
  return opener && stretchBehind(board, opener);
}

/** A verb that closes the message is no part of the name before it. */
function supplierBeside(board: Board, opener: Piece): Stretch | undefined {
  const at = board.pieces.indexOf(opener);
  const [before, after] = [board.pieces.slice(0, at), board.pieces.slice(at + 1)];
  return supplierIn({ ...board, pieces: before }) ?? supplierIn({ ...board, pieces: after });
}

/** `for rinsing`, `to clean the hoses`: what is no wine. */
function purposeIn(board: Board): Stretch | undefined {
  const { pieces } = board;
  const opener = pieces.find((piece, k) => {
    const next = pieces[k + 1]?.ids.includes('article') ? pieces[k + 2] : pieces[k + 1];
    const leads = piece.ids.includes('for') || piece.ids.includes('to');
    return leads && next?.ids.includes('for-equipment') === true;
  });
  return opener && stretchBehind(board, opener);
}

/** Why it was thrown away: `because it was caked`, `, caked`. */
function reasonIn(board: Board): Stretch | undefined {
  const { pieces } = board;
  const opener = pieces.find(
    ({ ids, text }, k) => ids.includes('because') || (text === ',' && pieces[k + 1]?.ids.includes('spoilt')),
  );
  return opener && stretchBehind(board, opener);
}

/** The message without some of its terms, with the finders of an amount and its additive run over it. */
function foundWithout(board: Board, cuts: readonly (Pick<Stretch, 'from' | 'to'> | undefined)[]): Board {
  const isCut = (i: number): boolean => cuts.some((cut) => cut && i >= cut.from && i <= cut.to);
  const terms = board.terms.filter((_, i) => !isCut(i));
  const own: Board = {
    ...freshBoard(board, { tells: true }),
    terms,
    pieces: ownPieces(terms, board.lexicon),
    pastTense: true,
  };
  for (const find of [findChemicalLot, findWhen, findVessel, findTablets, findAdditive, findStockAmount])
    find(own);
  return own;
}

/** `stock kmbs 3.2`: an amount whose unit is missing is asked for. */
function claimBareFigure(board: Board): void {
  const bare = board.terms.flatMap((_, i) => (isFree(board, i) ? [i] : []));
  const [only, another] = bare;
  if (
    only !== undefined &&
    another === undefined &&
    !isMark(board, only - 1, ',') &&
    isNamed(board) &&
    !hasAmount(board)
  )
    claim(board, only, only);
}

/** `25 kg kmbs and 5 kg smbs`: two things, of which a message notes one. */
const isOfSeveral = ({ findings }: Board): boolean =>
  (['additive', 'mass_g', 'additive_volume_mL', 'tablets'] as const).some(
    (name) => findings.filter(({ field }) => field === name).length > 1,
  );

/** Whether every word that nothing was found in is one that may stand there. */
const isRead = (board: Board): boolean =>
  board.pieces.every(
    (piece) =>
      board.taken[piece.from] === true ||
      board.ofWhen?.has(piece) === true ||
      piece.kind === 'break' ||
      (piece.kind === 'mark' && /^[,.;:!?()=-]$/.test(piece.text)) ||
      isCue(board, piece.from, 'solution') ||
      isCue(board, piece.from, 'powder') ||
      isCue(board, piece.from, 'at-strength') ||
      piece.ids.some((id) => ALLOWED.includes(id)),
  ) && !board.terms.some((_, i) => isFree(board, i));

const isNamed = (board: Board): boolean =>
  findingOf(board, 'additive') !== undefined ||
  board.marks.unnamedAdditive === true ||
  board.marks.campden === true;

const hasAmount = (board: Board): boolean =>
  board.findings.some(
    ({ field }) => field === 'mass_g' || field === 'additive_volume_mL' || field === 'tablets',
  );

/** `stock solution 10%` makes one, and counts nothing. */
const isOfSolution = (board: Board, opener: Piece): boolean =>
  isCue(board, opener.to + 1, 'solution') || board.terms.some((_, i) => isMark(board, i, '%'));

/** `how much kmbs is left`, `kmbs stock`: what is there of it; `3.2 kg kmbs left` tells it. */
function askedFor(talk: Talk): Draft | undefined {
  if (!says(talk, 'in-store', 'stock')) return undefined;
  const told = foundWithout(talk.board, []);
  const isTold = !talk.isQuestion && hasAmount(told) && isNamed(told) && isRead(told);
  if (isTold && told.findings.every(({ field }) => OF_STOCK.has(field)) && !says(talk, 'stock', 'ask'))
    return { ...draftOfBoard(told, 'command'), command: { name: 'stock-note', event: 'counted' } };
  // `kmbs stock` names no solution.
  const own = foundWithout(
    talk.board,
    talk.board.pieces.filter(({ ids }) => ids.includes('stock')),
  );
  const isAsked = own.pieces.every(
    (piece) =>
      own.taken[piece.from] === true ||
      piece.ids.includes('how-much') ||
      piece.kind === 'mark' ||
      piece.ids.some((id) => ALLOWED.includes(id)),
  );
  const names = own.findings.map(({ field }) => field);
  if (!isAsked || names.length !== 1 || names[0] !== 'additive' || own.problems.length > 0) return undefined;
  return { ...draftOfBoard(own, 'command'), command: { name: 'stock' } };
}

const openerOf = ({ ids }: Piece) => OPENING.find((id) => ids.includes(id));

/** `25 kg KDS erhalten`: elsewhere than in English the verb may close what it tells. */
const closingIn = ({ board, said }: Talk): Piece | undefined =>
  board.lexicon.language === 'en'
    ? undefined
    : said.find(({ ids }) => ids.includes('received') || ids.includes('discarded'));

/**
 * Reads what comes into the chemical store, goes out of it otherwise than into wine, and what is counted on the shelf:
 * `received 25 kg kmbs lot 4471 from Norte Supplies`, `used 200 g kmbs for rinsing`, `stock kmbs 3.2 kg`; and `stock`,
 * `stock kmbs`. An additive is named, and never the usual one; with a vessel or a volume of wine it is none of these.
 */
export function readStock(talk: Talk): Draft | undefined {
  const { board, said, isQuestion } = talk;
  const leading = said.find(
    ({ ids }) => !ids.includes('filler') && !ids.includes('ask') && !ids.includes('show'),
  );
  const first = [leading, closingIn(talk)].find((one) => one && openerOf(one));
  const opener = first && openerOf(first);
  if (first === undefined || opener === undefined) return askedFor(talk);
  const isStock = opener === 'stock';
  if (isStock ? isOfSolution(board, first) : isQuestion) return undefined;
  const [supplier, purpose, reason] = [
    opener === 'received' ? supplierBeside(board, first) : undefined,
    opener === 'used-up' ? purposeIn(board) : undefined,
    opener === 'discarded' ? reasonIn(board) : undefined,
  ];
  if (opener === 'used-up' && purpose === undefined) return undefined;
  const own = foundWithout(board, [{ from: first.from, to: first.to }, supplier, purpose, reason]);
  if (opener === 'stock' || opener === 'counted') claimBareFigure(own);
  if (!isRead(own) || !own.findings.every(({ field }) => OF_STOCK.has(field))) return undefined;
  if (isStock && !hasAmount(own) && own.terms.every(({ kind }) => kind !== 'number')) return shown(own);
  if (!isNamed(own) || isQuestion) return undefined;
  const why = purpose ?? reason;
  const command: Command = {
    name: 'stock-note',
    event: OPENERS[opener],
    ...(isOfSeveral(own) && { several: true }),
    ...(supplier && { supplier: supplier.text }),
    ...(why && { purpose: why.text }),
  };
  return { ...draftOfBoard(own, 'command'), command };
}

function shown(own: Board): Draft | undefined {
  const isOne = own.findings.every(({ field }) => field === 'additive') && own.findings.length <= 1;
  const isAlone = own.chemicalLot === undefined && own.when === undefined && own.problems.length === 0;
  if (!isOne || !isAlone || own.marks.unnamedAdditive || termAt(own, 0).kind === 'number') return undefined;
  return { ...draftOfBoard(own, 'command'), command: { name: 'stock' } };
}
