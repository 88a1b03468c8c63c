import type { Lexicon, OwnPhrase } from './lexicon.ts';
import { partElided } from './spellings.ts';
import type { Term } from './split-terms.ts';
import { termIn } from './split-terms.ts';
import type { OwnWordId } from './words/words.ts';

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
  /** The month or the day of the week that it names; January and Monday are 1. */
  readonly month?: number;
  readonly weekday?: number;
}

const NONE: readonly OwnWordId[] = [];
const NO_PHRASES: readonly OwnPhrase[] = [];

/** Each word by itself, whatever phrase the lexicon made of it. */
function singlesOf(terms: readonly Term[], lexicon: Lexicon): Piece[] {
  const singles: Piece[] = [];
  for (let i = 0; i < terms.length; i++) {
    const { kind, text, gap } = termIn(terms, i);
    if (kind !== 'word' || !/[ .'-]/.test(text)) {
      singles.push({ kind, text, ids: NONE, gap, from: i, to: i });
      continue;
    }
    for (const [n, word] of (lexicon.elides ? partElided(text) : text).split(/[ .-]+/).entries())
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
 * @param lexicon The words they were looked up in.
 * @example
 * ```ts
 * import { foldText } from './fold-text.ts';
 * import { LEXICON } from './lexicon.ts';
 * import { splitTerms } from './split-terms.ts';
 * ownPieces(splitTerms(foldText('forget me'), LEXICON), LEXICON).map((piece) => piece.text) // => ['forget me']
 * ```
 */
export function ownPieces(terms: readonly Term[], lexicon: Lexicon): Piece[] {
  const singles = singlesOf(terms, lexicon);
  const pieces: Piece[] = [];
  for (let i = 0; i < singles.length; i++) {
    const single = singles[i] as Piece;
    let piece = single;
    let last = i;
    const phrases = single.kind === 'word' ? lexicon.own.get(single.text) : undefined;
    for (const { words, ids } of phrases ?? NO_PHRASES) {
      const end = phraseEnd(singles, i, words);
      if (end === undefined) continue;
      piece = { ...single, text: words.join(' '), ids, to: singles[end]?.to ?? i };
      last = end;
      break;
    }
    const month = single.kind === 'word' ? lexicon.months.get(piece.text) : undefined;
    const weekday = single.kind === 'word' ? lexicon.weekdays.get(piece.text) : undefined;
    const isDated = month !== undefined || weekday !== undefined;
    pieces.push(
      isDated
        ? { ...piece, ...(month !== undefined && { month }), ...(weekday !== undefined && { weekday }) }
        : piece,
    );
    i = last;
  }
  return pieces;
}

/** Whether piece `i` is one of those words. */
export const isOwn = (pieces: readonly Piece[], i: number, ...ids: readonly OwnWordId[]): boolean =>
  pieces[i]?.ids.some((id) => ids.includes(id)) === true;
