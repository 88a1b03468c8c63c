import type { Term } from './split-terms.ts';
import { termIn } from './split-terms.ts';
import { READ_IN_FULL } from './words/read-in-full.ts';
import type { OwnWordId, Words } from './words/words.ts';

/** A word, numeral, mark or line's end of a message, and what it is among the bot's own words. */
export interface Piece {
  readonly kind: Term['kind'];
  readonly text: string;
  readonly ids: readonly OwnWordId[];
  /** Whether a blank stands before it. */
  readonly gap: boolean;
  /** The terms it stands in. */
  readonly from: number;
  readonly to: number;
}

interface Phrase {
  readonly words: readonly string[];
  readonly ids: OwnWordId[];
}

const NONE: readonly OwnWordId[] = [];
const NO_PHRASES: readonly Phrase[] = [];

function indexOf(lists: readonly Words[]): Map<string, Phrase[]> {
  const index = new Map<string, Phrase[]>();
  for (const [id, entries] of lists.flatMap(
    ({ own = {} }) => Object.entries(own) as [OwnWordId, readonly string[]][],
  )) {
    for (const entry of entries) {
      const words = entry.split(' ');
      const same = index.get(words[0] ?? '') ?? [];
      const known = same.find((phrase) => phrase.words.join(' ') === entry);
      if (known) known.ids.push(id);
      else same.push({ words, ids: [id] });
      index.set(words[0] ?? '', same);
    }
  }
  for (const phrases of index.values()) phrases.sort((a, b) => b.words.length - a.words.length);
  return index;
}

const OWN = indexOf(READ_IN_FULL);

/** Each word by itself, whatever phrase the lexicon made of it. */
function singlesOf(terms: readonly Term[]): Piece[] {
  const singles: Piece[] = [];
  for (let i = 0; i < terms.length; i++) {
    const { kind, text, gap } = termIn(terms, i);
    if (kind !== 'word' || !/[ .-]/.test(text)) {
      singles.push({ kind, text, ids: NONE, gap, from: i, to: i });
      continue;
    }
    for (const [n, word] of text.split(/[ .-]+/).entries())
      singles.push({ kind, text: word, ids: NONE, gap: n > 0 || gap, from: i, to: i });
  }
  return singles;
}

const isJoint = ({ kind, text, gap }: Piece): boolean =>
  kind === 'mark' && (text === '-' || text === '_' || text === '.') && !gap;

/** Where a phrase that begins at `i` ends, if it stands there. */
function phraseEnd(singles: readonly Piece[], i: number, words: readonly string[]): number | undefined {
  let k = i;
  for (let n = 1; n < words.length; n++) {
    k++;
    const joint = singles[k];
    if (joint && isJoint(joint) && singles[k + 1]?.gap === false) k++;
    if (singles[k]?.kind !== 'word' || singles[k]?.text !== words[n]) return undefined;
  }
  return k;
}

/**
 * The pieces of a message, the longest phrase of the bot's own words first.
 *
 * @param terms The terms of a line or message.
 * @example
 * ```ts
 * import { foldText } from './fold-text.ts';
 * import { LEXICON } from './lexicon.ts';
 * import { splitTerms } from './split-terms.ts';
 * ownPieces(splitTerms(foldText('forget me'), LEXICON)).map((piece) => piece.text) // => ['forget me']
 * ```
 */
export function ownPieces(terms: readonly Term[]): Piece[] {
  const singles = singlesOf(terms);
  const pieces: Piece[] = [];
  for (let i = 0; i < singles.length; i++) {
    const single = singles[i] as Piece;
    let piece = single;
    let last = i;
    const phrases = single.kind === 'word' ? OWN.get(single.text) : undefined;
    for (const { words, ids } of phrases ?? NO_PHRASES) {
      const end = phraseEnd(singles, i, words);
      if (end === undefined) continue;
      piece = { ...single, text: words.join(' '), ids, to: singles[end]?.to ?? i };
      last = end;
      break;
    }
    pieces.push(piece);
    i = last;
  }
  return pieces;
}

/** Whether piece `i` is one of those words. */
export const isOwn = (pieces: readonly Piece[], i: number, ...ids: readonly OwnWordId[]): boolean =>
  pieces[i]?.ids.some((id) => ids.includes(id)) === true;
