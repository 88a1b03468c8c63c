import type { FoldedText } from './fold-text.ts';
import type { Entry, Lexicon } from './lexicon.ts';
import type { Tag } from './words/words.ts';
import { mendWord } from './mend-word.ts';
import { partElided } from './spellings.ts';

/** One piece of a message: a numeral, a word or phrase, a mark, or a line's end. */
export interface Term {
  readonly kind: 'number' | 'word' | 'mark' | 'break';
  readonly text: string;
  /** Offsets in the folded text. */
  readonly start: number;
  readonly end: number;
  /** Whether a blank stands before it. */
  readonly gap: boolean;
  readonly tags: readonly Tag[];
  /** Set where the piece is a fraction, so that its figure is settled. */
  readonly value?: number;
  /** All letters of it were capitals. */
  readonly capital: boolean;
}

/** What stands before the first and after the last term. */
const END: Term = { kind: 'break', text: '', start: 0, end: 0, gap: true, tags: [], capital: false };

/** Term `i`; past either end an empty line end, so that a finder may look about freely. */
export const termIn = (terms: readonly Term[], i: number): Term => terms[i] ?? END;

const VULGAR: Readonly<Record<string, number>> = {
  '½': 1 / 2, '⅓': 1 / 3, '⅔': 2 / 3, '¼': 1 / 4, '¾': 3 / 4, '⅛': 1 / 8, '⅜': 3 / 8, '⅝': 5 / 8, '⅞': 7 / 8,
}; // prettier-ignore

const NONE: readonly Tag[] = [];
const isDigit = (c: string | undefined): boolean => c !== undefined && c >= '0' && c <= '9';
const isLetter = (c: string | undefined): boolean =>
  c !== undefined && (c >= 'a' && c <= 'z' ? true : c > '\u00bf' && /\p{L}/u.test(c));

function numeralEnd(text: string, from: number): number {
  let i = from;
  while (isDigit(text[i])) i++;
  while ((text[i] === '.' || text[i] === ',' || text[i] === "'") && isDigit(text[i + 1])) {
    i++;
    while (isDigit(text[i])) i++;
  }
  return i;
}

function wordEnd(text: string, from: number, lexicon: Lexicon): number {
  for (const formula of lexicon.formulas.get(text[from] ?? '') ?? []) {
    const end = from + formula.length;
    if (text.startsWith(formula, from) && !isDigit(text[end])) return end;
  }
  let i = from;
  while (isLetter(text[i]) || (text[i] === "'" && isLetter(text[i + 1]))) i++;
  return Math.max(elidedEnd(text, from, i, lexicon) ?? i, from + 1);
}

/** `l'acide`: the end of an article that is drawn together with its word, unless both are one known word. */
function elidedEnd(text: string, from: number, to: number, lexicon: Lexicon): number | undefined {
  const cut = lexicon.elides ? text.indexOf("'", from) : -1;
  if (cut < 0 || cut >= to - 1 || lexicon.phrases.has(text.slice(from, to))) return undefined;
  return partElided(text.slice(from, to)).includes(' ') ? cut + 1 : undefined;
}

/** Known words run together beside a figure (`galph` in `1150galph3.55`): each piece a unit or a label. */
function unglue(word: string, lexicon: Lexicon): readonly string[] | undefined {
  if (word.length < 3 || word.length > 24 || lexicon.phrases.has(word)) return undefined;
  for (let cut = 1; cut < word.length; cut++) {
    const [left, right] = [word.slice(0, cut), word.slice(cut)];
    const fits = (part: string): boolean =>
      (lexicon.phrases.get(part)?.tags ?? NONE).some((tag) =>
        /^(unit:(?!none)|label|additive|cue:(target|add|molecular)$)/.test(tag),
      );
    if (fits(left) && fits(right)) return [left, right];
  }
  return undefined;
}

/** Letters that a figure is glued to and that name no quantity: `T4` in `T4,18hl`. */
function isCode(before: Term | undefined, i: number, lexicon: Lexicon): boolean {
  if (before?.kind !== 'word') return false;
  const tags = lexicon.phrases.get(before.text)?.tags ?? NONE;
  if (tags.some((tag) => tag.startsWith('vessel:'))) return true;
  if (before.end !== i || before.text.length > 4) return false;
  return !tags.some((tag) => /^(label|cue:(target|to|add|raise|molecular|by|is))/.test(tag));
}

/** A comma behind the number of a code parts fields and is no decimal mark. */
function codeEnd(text: string, from: number, to: number): number {
  const comma = text.indexOf(',', from);
  return comma < 0 ? to : comma;
}

/** The pieces before words are looked up. */
function piecesOf(folded: FoldedText, lexicon: Lexicon): Term[] {
  const { text } = folded;
  const pieces: Term[] = [];
  let gap = true;
  const push = (kind: Term['kind'], start: number, end: number, value?: number): void => {
    const capital = kind === 'word' && folded.capital[start] === true && folded.capital[end - 1] === true;
    pieces.push({
      kind,
      text: text.slice(start, end),
      start,
      end,
      gap,
      tags: NONE,
      capital,
      ...(value === undefined ? {} : { value }),
    });
    gap = false;
  };
  for (let i = 0; i < text.length;) {
    const c = text[i] ?? '';
    if (c === ' ') { gap = true; i++; continue; } // prettier-ignore
    if (c === '\n') { push('break', i, i + 1); gap = true; i++; continue; } // prettier-ignore
    let end = i + 1;
    if (
      isDigit(c) ||
      (c === '.' && isDigit(text[i + 1]) && !isDigit(text[i - 1]) && !isLetter(text[i - 1]))
    ) {
      end = c === '.' ? numeralEnd(text, i + 1) : numeralEnd(text, i);
      if (isCode(pieces.at(-1), i, lexicon)) end = Math.min(end, codeEnd(text, i, end));
      push('number', i, end);
    } else if (VULGAR[c] !== undefined) {
      push('number', i, end, VULGAR[c]);
    } else if (isLetter(c)) {
      end = wordEnd(text, i, lexicon);
      const beside = isDigit(text[i - 1]) || isDigit(text[end]);
      const parts = beside ? unglue(text.slice(i, end), lexicon) : undefined;
      let at = i;
      for (const part of parts ?? [text.slice(i, end)]) {
        push('word', at, at + part.length);
        at += part.length;
      }
    } else if ((c === '-' || c === '=') && text[i + 1] === '>') {
      end = i + 2;
      push('mark', i, end);
    } else {
      if (c >= '\ud800' && c <= '\udbff' && i + 1 < text.length) end = i + 2;
      push('mark', i, end);
    }
    i = end;
  }
  return pieces;
}

/** `tot. SO2`, `Ges.-SO2`: a point that cuts a word short parts no phrase. */
const isCutShort = ({ text }: Term, point: Term | undefined): boolean =>
  (text.length === 2 || text.length === 3) && point?.text === '.' && !point.gap;

/** The longest known phrase that begins at piece `i`; words of a phrase have a blank or a hyphen between. */
function phraseAt(
  pieces: readonly Term[],
  i: number,
  lexicon: Lexicon,
): { entry: Entry; next: number } | undefined {
  const first = termIn(pieces, i);
  const most = lexicon.longest.get(first.text) ?? 0;
  let text = '';
  let found: { entry: Entry; next: number } | undefined;
  for (let k = i, words = 0; words < most && k < pieces.length; words++) {
    const piece = termIn(pieces, k);
    if (piece.kind !== 'word' && !(piece.kind === 'number' && words > 0 && piece.text === '2')) break;
    text = words === 0 ? piece.text : `${text} ${piece.text}`;
    k++;
    const entry = lexicon.phrases.get(text);
    if (entry) found = { entry, next: k };
    const hyphen = pieces[k];
    const isGlued = hyphen?.kind === 'mark' && !hyphen.gap && pieces[k + 1]?.gap === false;
    if (isGlued && (hyphen.text === '-' || (hyphen.text === '.' && piece.text.length === 1))) k++;
    else if (isCutShort(piece, hyphen)) k += pieces[k + 1]?.text === '-' ? 2 : 1;
  }
  return found;
}

/** `the free's 19`: a known word with "is" drawn together. */
function shortIs({ text }: Term, i: number, lexicon: Lexicon): { entry: Entry; next: number } | undefined {
  const entry = text.endsWith("'s") ? lexicon.phrases.get(text.slice(0, -2)) : undefined;
  return entry && { entry, next: i + 1 };
}

/**
 * Splits a folded message into terms and looks its words up, the longest phrase first.
 *
 * @param folded The message made plain.
 * @param lexicon The words that are known.
 * @returns The terms in order; every character but blanks belongs to one.
 * @example
 * ```ts
 * import { foldText } from './fold-text.ts';
 * import { LEXICON } from './lexicon.ts';
 * splitTerms(foldText('free so2 18'), LEXICON).map((term) => term.text) // => ['free so2', '18']
 * ```
 */
export function splitTerms(folded: FoldedText, lexicon: Lexicon): Term[] {
  const pieces = piecesOf(folded, lexicon);
  const terms: Term[] = [];
  for (let i = 0; i < pieces.length;) {
    const piece = termIn(pieces, i);
    const found =
      piece.kind === 'word' ? (phraseAt(pieces, i, lexicon) ?? shortIs(piece, i, lexicon)) : undefined;
    if (!found) {
      const mended = piece.kind === 'word' ? mendWord(piece.text, lexicon) : undefined;
      const tags = mended === undefined ? undefined : lexicon.phrases.get(mended)?.tags;
      terms.push(tags ? { ...piece, tags } : piece);
      i++;
      continue;
    }
    const last = termIn(pieces, found.next - 1);
    terms.push({
      ...piece,
      text: folded.text.slice(piece.start, last.end),
      end: last.end,
      tags: found.entry.tags,
    });
    i = found.next;
  }
  return terms;
}
