import type { Problem, ProblemCode } from '../../core/problem.ts';
import type { FoldedText } from './fold-text.ts';
import type { Grouping } from './numbers.ts';
import { readDecimal, readNumeral } from './numbers.ts';
import { concentrationLength, looksLikePh } from './join-numbers.ts';
import type { Lexicon } from './lexicon.ts';
import type { Piece } from './own-pieces.ts';
import type { SaidWhen } from './command.ts';
import type { Term } from './split-terms.ts';
import { termIn } from './split-terms.ts';
import type { FieldName, Fields, Marks, Place, ReadNote, ReaderSettings } from './understood.ts';
import type { CueId, Tag } from './words/words.ts';

/** How sure a finding is: a label or a unit says what it is, or it stands alone. */
export type Said = 'labelled' | 'unit' | 'bare';

/** One thing read: which field, what value, where. */
export interface Finding<F extends FieldName = FieldName> {
  readonly field: F;
  readonly value: NonNullable<Fields[F]>;
  readonly said: Said;
  readonly from: number;
  readonly to: number;
}

/** The table at which the finders work: the terms, which of them are taken, and what was found so far. */
export interface Board {
  readonly message: string;
  readonly folded: FoldedText;
  readonly terms: readonly Term[];
  readonly taken: boolean[];
  /** Tags of every word and phrase of the message, whatever a longer phrase made of it. */
  readonly cues: ReadonlySet<Tag>;
  readonly grouping: Grouping;
  readonly settings: ReaderSettings;
  readonly findings: Finding[];
  readonly problems: Problem[];
  readonly notes: ReadNote[];
  readonly setAside: string[];
  readonly marks: Marks;
  /** Whether the message says that something was added: past tense, neither negated nor conditional. */
  pastTense: boolean;
  /** The terms as the bot's own words. */
  readonly pieces: readonly Piece[];
  /** The words with which the message is read. */
  readonly lexicon: Lexicon;
  /** The board is tried as a statement of something that happened to a vessel. */
  readonly tells?: boolean;
  /** The board is tried as an order for a vessel. */
  readonly orders?: boolean;
  /** A remark that was taken out of the terms. */
  readonly remark?: string;
  when?: SaidWhen;
  /** The pieces that say when. */
  ofWhen?: ReadonlySet<Piece>;
  /** The lot on an additive's label: its code, and the words that say so. */
  chemicalLot?: { readonly code: string; readonly words: string };
}

/** The same terms with nothing claimed or found yet, for a reading that is only tried. */
export const freshBoard = (
  { message, folded, terms, cues, grouping, settings, pieces, lexicon, remark }: Board,
  tried: { readonly tells?: boolean; readonly orders?: boolean } = {},
): Board => ({
  message,
  folded,
  terms,
  taken: [],
  cues,
  grouping,
  settings,
  pieces,
  lexicon,
  findings: [],
  problems: [],
  notes: [],
  setAside: [],
  marks: {},
  pastTense: false,
  ...(remark !== undefined && { remark }),
  ...tried,
});

/** A finder or refiner: looks at the board and writes what it found. */
export type Finder = (board: Board) => void;

/** Term `i` of a board; past either end an empty line end. */
export const termAt = (board: Board, i: number): Term => termIn(board.terms, i);

/** Whether term `i` carries a tag. */
export const hasTag = (board: Board, i: number, tag: Tag): boolean =>
  board.terms[i]?.tags.includes(tag) === true;

/** Whether term `i` carries a cue. */
export const isCue = (board: Board, i: number, cue: CueId): boolean => hasTag(board, i, `cue:${cue}`);

/** Whether the message holds a cue anywhere. */
export const holdsCue = (board: Board, cue: CueId): boolean => board.cues.has(`cue:${cue}`);

/** Whether a word names more than one: by its ending, or as its language's list says. */
export const saysMany = ({ text, tags }: Term): boolean =>
  tags.includes('cue:many') || (text.endsWith('s') && !tags.includes('cue:one'));

/** Whether term `i` is that mark. */
export const isMark = (board: Board, i: number, mark: string): boolean => {
  const term = board.terms[i];
  return term?.kind === 'mark' && term.text === mark;
};

/** Whether term `i` is a numeral that nothing has claimed yet. */
export const isFree = (board: Board, i: number): boolean =>
  board.terms[i]?.kind === 'number' && board.taken[i] !== true;

/** The person's own words from term `from` to term `to`. */
export function wordsOf(board: Board, from: number, to: number): string {
  const { start, end } = placeOf(board, from, to);
  return board.message.slice(start, end).trim();
}

/** Where terms `from` to `to` stood in the message as it came. */
export function placeOf(board: Board, from: number, to: number): Place {
  const { at } = board.folded;
  const start = at[board.terms[from]?.start ?? 0] ?? 0;
  const last = board.terms[to]?.end ?? 0;
  const end = (at[last - 1] ?? 0) + 1;
  return { start, end: Math.max(start, end), text: board.message.slice(start, end) };
}

/** Marks terms as claimed, so that no later finder reads them again. */
export function claim(board: Board, from: number, to: number): void {
  for (let i = from; i <= to; i++) board.taken[i] = true;
}

/** Writes a finding and claims its terms. */
export function find<F extends FieldName>(
  board: Board,
  field: F,
  value: NonNullable<Fields[F]>,
  said: Said,
  from: number,
  to: number,
): void {
  board.findings.push({ field, value, said, from, to });
  claim(board, from, to);
}

/** Writes a problem about terms and claims them. */
export function refuse(board: Board, code: ProblemCode, from: number, to: number): void {
  board.problems.push({ code, about: wordsOf(board, from, to) });
  claim(board, from, to);
}

/** Sets figures aside that are none of ours, to be named in the reply. */
export function setAside(board: Board, from: number, to: number): void {
  board.setAside.push(wordsOf(board, from, to));
  claim(board, from, to);
}

/** Whether a field was found. */
export const isFound = (board: Board, field: FieldName): boolean =>
  board.findings.some((finding) => finding.field === field);

/** The first finding of a field. */
export const findingOf = <F extends FieldName>(board: Board, field: F): Finding<F> | undefined =>
  board.findings.find((finding) => finding.field === field) as Finding<F> | undefined;

/** The label before figure `i` that claims it (past a colon or "is"); undefined where none does. */
export function labelBefore(board: Board, i: number): number | undefined {
  let k = i - 1;
  while (isMark(board, k, ':') || isMark(board, k, '=') || (isCue(board, k, 'is') && !isLabel(board, k))) k--;
  return isLabel(board, k) && !hasOwnFigure(board, k) ? k : undefined;
}

/** Whether a label before figure `i` claims it: `free 12 tablets` is free SO2, and no twelve tablets. */
export const isLabelled = (board: Board, i: number): boolean => labelBefore(board, i) !== undefined;

/** An arrow, a plus, a verb that takes the figure behind it. */
export const claimsNext = (board: Board, i: number): boolean =>
  ['->', '=>', '→', '+'].some((mark) => isMark(board, i, mark)) ||
  (['target', 'to', 'add', 'raise', 'by'] as const).some((cue) => isCue(board, i, cue));

/** `3.52 pH 6 barrels`: a label behind its figure claims no second one. */
function hasOwnFigure(board: Board, k: number): boolean {
  const at = k - 1 - concentrationLength(board.terms, k - 1);
  if (board.terms[at]?.kind !== 'number' || board.taken[at] === true) return false;
  const isOfSO2 = hasTag(board, k, 'label:free') || hasTag(board, k, 'label:total');
  if (at === k - 1 && isOfSO2 && looksLikePh(termAt(board, at).text)) return false;
  return !claimsNext(board, at - 1) && labelBefore(board, at) === undefined;
}

const isLabel = (board: Board, i: number): boolean =>
  board.terms[i]?.tags.some((tag) => tag.startsWith('label:') && tag !== 'label:volume') === true;

/** A figure with its sign and whether it could be off by a thousand. */
export interface Figure {
  readonly value: number;
  readonly unsure: boolean;
  /** The term before it when that is its minus sign, else the numeral's own. */
  readonly from: number;
}

const opensMinus = (board: Board, i: number): boolean => {
  const [sign, figure, before] = [board.terms[i - 1], board.terms[i], board.terms[i - 2]];
  if (sign?.kind !== 'mark' || sign.text !== '-' || figure?.gap !== false) return false;
  return (
    sign.gap ||
    before === undefined ||
    before.kind === 'break' ||
    (before.kind === 'mark' && before.text !== ')')
  );
};

/** Reads numeral `i` with its sign, as a figure whose thousands may be grouped. */
export function figureAt(board: Board, i: number): Figure {
  const term = board.terms[i];
  if (term?.kind !== 'number') return { value: Number.NaN, unsure: false, from: i };
  const minus = opensMinus(board, i);
  const read =
    term.value === undefined ? readNumeral(term.text, board.grouping) : { value: term.value, unsure: false };
  return { value: minus ? -read.value : read.value, unsure: read.unsure, from: minus ? i - 1 : i };
}

/** Reads numeral `i` with its sign, as a figure whose only separator is a decimal mark (a pH). */
export function decimalAt(board: Board, i: number): Figure {
  const figure = figureAt(board, i);
  const term = board.terms[i];
  if (term === undefined || term.value !== undefined || !/^\d+[.,']\d+$/.test(term.text)) return figure;
  const value = readDecimal(term.text);
  return { ...figure, value: figure.value < 0 ? -value : value, unsure: false };
}
