import { findingOf, placeOf, termAt } from '../../board.ts';
import type { Command } from '../../command.ts';
import type { OwnWordId } from '../../words/words.ts';
import type { Item, Tale } from './tale.ts';
import { findsOnly, tells, tellsOnly } from './tale.ts';

const KIND = [
  'style', 'category', 'product', 'organic', 'stage', 'designated_mg_L', 'uplift', 'quality', 'pdo', 'bulk', 'density_kg_L', 'reserve_mg_L', 'sugar_g_L',
] as const; // prettier-ignore

/** `T4 finished`: the word behind the vessel and alone; `we finished T4` tells of work. */
function endsFermentations({ board, items }: Tale): boolean {
  const at = items.findIndex(({ finding, piece }) => finding === undefined && piece.ids.includes('finished'));
  const item = items[at];
  const isBehind = at > items.findIndex(({ finding }) => finding !== undefined);
  const isByNobody = items.every(({ piece }) => !piece.ids.includes('who'));
  const isSaid = board.findings.every(({ field }) => field === 'vessel' || field === 'vessels');
  if (item === undefined || !isBehind || !isByNobody || !isSaid) return false;
  const { from, to } = item.piece;
  board.findings.push({ field: 'stage', value: 'finished', said: 'labelled', from, to });
  return true;
}

/** `T4 bubbles`, `T4 port`: a word that may tell of the tank and not of its wine, unless it is said to be it. */
const isUnclear = (tale: Tale): boolean =>
  !tells(tale, 'is') &&
  tale.items.filter(({ finding }) => finding !== undefined).length === 2 &&
  tale.items.some(
    ({ finding, piece }) =>
      finding !== undefined &&
      piece.ids.includes('two-meanings') &&
      termAt(tale.board, piece.from).text === piece.text,
  );

/** `T4 5200 L` asks for a dose; what is, or is left, or is now in it is told. */
function isStated({ items }: Tale): boolean {
  const at = items.findIndex(({ finding }) => finding?.field === 'volume_L');
  const isWord = (k: number, ...ids: readonly OwnWordId[]): boolean =>
    items[k]?.finding === undefined && items[k]?.piece.ids.some((id) => ids.includes(id)) === true;
  return isWord(at - 1, 'is', 'has', 'now', 'there-is') || isWord(at + 1, 'now', 'in-it');
}

/** `T4 red merlot`: a grape is named, and nothing is kept of it. */
function varietiesAside({ board, items }: Tale): { readonly tale: Tale; readonly words: readonly string[] } {
  const isVariety = ({ finding, piece }: Item): boolean =>
    finding === undefined && termAt(board, piece.from).tags.includes('cue:variety');
  return {
    tale: { board, items: items.filter((item) => !isVariety(item)) },
    words: items.filter(isVariety).map(({ piece }) => placeOf(board, piece.from, piece.to).text),
  };
}

/** Reads what a vessel is or holds: `T4 red`, `T4 in malo`, `T4 finished`, `T4 is 5200 L now`. */
export function readTold(tale: Tale): Command | undefined {
  const { board } = tale;
  if (!findsOnly(tale, 'vessel', 'vessels', 'volume_L', ...KIND)) return undefined;
  const isVolume = findingOf(board, 'volume_L') !== undefined;
  if ((isVolume && !isStated(tale)) || isUnclear(tale)) return undefined;
  const isKind = KIND.some((field) => findingOf(board, field) !== undefined);
  const aside = varietiesAside(tale);
  const allowed = ['is', 'has', 'there-is', 'in-it', 'in', 'wine', 'and', 'still', 'again', 'ml-way', 'finished'] as const; // prettier-ignore
  if (!tellsOnly(aside.tale, allowed)) return undefined;
  if (!isKind && !isVolume && !endsFermentations(tale)) return undefined;
  if (isKind && tells(tale, 'finished') && findingOf(board, 'stage') === undefined) return undefined;
  if (isKind) board.setAside.push(...aside.words);
  else if (aside.words.length > 0) return undefined;
  return { name: 'told' };
}
