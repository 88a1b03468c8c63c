import type { Board, Finding } from '../../board.ts';
import { freshBoard, saysMany } from '../../board.ts';
import { findKind } from '../../finders/kind.ts';
import { findLabelled } from '../../finders/labels.ts';
import { findLawFacts } from '../../finders/law-facts.ts';
import { findStage } from '../../finders/stage.ts';
import { findVessel } from '../../finders/vessel.ts';
import { findVolume } from '../../finders/volume.ts';
import { findWhen } from '../../finders/when.ts';
import type { Piece } from '../../own-pieces.ts';
import { partElided } from '../../spellings.ts';
import type { Term } from '../../split-terms.ts';
import type { OwnWordId } from '../../words/words.ts';

/** A piece of a statement: something found, or words. */
export interface Item {
  readonly finding?: Finding;
  readonly piece: Piece;
}

/** A message as something told of a vessel: what was found in it, and the words between. */
export interface Tale {
  readonly board: Board;
  readonly items: readonly Item[];
}

const GOES: ReadonlySet<OwnWordId> = new Set(['moved', 'racked', 'pumped', 'blended']);
const FINDERS = [findStage, findWhen, findVessel, findLawFacts, findVolume, findLabelled, findKind];

const isStop = ({ kind, text, gap }: Piece): boolean =>
  kind === 'break' || (kind === 'mark' && (/^[,.;:!=]$/.test(text) || (text === '-' && gap)));

/** `moved T4 to T9` names two vessels and no six: where wine goes somewhere, "to" joins no range of single vessels. */
function apart({ terms, pieces }: Board): readonly Term[] {
  const goes = pieces.some(({ ids }) => ids.some((id) => GOES.has(id)));
  const isMany = terms.some((term) => saysMany(term) && term.tags.some((tag) => tag.startsWith('vessel:')));
  if (!goes || isMany) return terms;
  return terms.map((term) => (term.tags.includes('cue:to') ? { ...term, tags: [] } : term));
}

/** A phrase as the lexicon has it. */
const spacedOf = (text: string, { lexicon }: Board): string =>
  (lexicon.elides ? partElided(text) : text).replaceAll('-', ' ');

/** A word that was mended may be another: nothing is told of a vessel by a slip. */
const isMended = (board: Board, { field, from, to }: Finding): boolean =>
  field !== 'volume_L' &&
  board.terms
    .slice(from, to + 1)
    .some(({ text, tags }) => tags.length > 0 && !board.lexicon.phrases.has(spacedOf(text, board)));

/** To stop a fermentation is a wish, and answered with a warning. */
const isToStop = ({ notes }: Board): boolean => notes.some(({ id }) => id === 'ferment-stop');

const saysTwoVolumes = ({ findings }: Board): boolean =>
  new Set(findings.flatMap(({ field, value }) => (field === 'volume_L' ? [value] : []))).size > 1;

/** `T4 in malo tomorrow` states nothing yet. */
const isToCome = ({ pieces }: Board): boolean =>
  pieces.some(({ ids }) => ids.includes('tomorrow') || ids.includes('next-week'));

/**
 * Tries a message as something told of a vessel.
 *
 * @returns What was found and the words between; undefined where a figure or a question makes it something else.
 */
export function taleOf(board: Board): Tale | undefined {
  const own: Board = { ...freshBoard(board, { tells: true }), terms: apart(board) };
  for (const find of FINDERS) find(own);
  const isOfVessel = own.findings.some(({ field }) => field === 'vessel' || field === 'vessels');
  const isUnclear = own.problems.length > 0 || own.findings.some((one) => isMended(own, one));
  if (!isOfVessel || isUnclear || saysTwoVolumes(own) || isToCome(own) || isToStop(own)) return undefined;
  const items: Item[] = [];
  for (const piece of own.pieces) {
    const finding = own.findings.find(({ from, to }) => piece.from >= from && piece.to <= to);
    if (finding !== undefined) {
      if (items.at(-1)?.finding !== finding) items.push({ finding, piece });
    } else if (!isStop(piece) && own.ofWhen?.has(piece) !== true) items.push({ piece });
  }
  return { board: own, items };
}

/** Whether some word of the tale is one of those. */
export const tells = ({ items }: Tale, ...ids: readonly OwnWordId[]): boolean =>
  items.some(({ finding, piece }) => finding === undefined && piece.ids.some((id) => ids.includes(id)));

/** Words that any statement may have: who, and that it is done. */
const ANYWHERE: readonly OwnWordId[] = ['courtesy', 'article', 'who', 'done-to', 'now', 'at', 'on'];

/** Whether every word of the tale is one of those, or may stand in any statement. */
export const tellsOnly = ({ items }: Tale, ids: readonly OwnWordId[]): boolean =>
  items.every(
    ({ finding, piece }) =>
      finding !== undefined || piece.ids.some((id) => ANYWHERE.includes(id) || ids.includes(id)),
  );

/** Whether nothing was found but those fields. */
export const findsOnly = ({ board }: Tale, ...fields: readonly Finding['field'][]): boolean =>
  board.findings.every(({ field }) => fields.includes(field));

/** `is T4 empty`, `has T4 been racked`: a question without its mark. */
export const asks = ({ items }: Tale): boolean =>
  items[0]?.finding === undefined &&
  items[0]?.piece.ids.some((id) => id === 'is' || id === 'has' || id === 'done-to') === true &&
  items[1]?.finding !== undefined;
