import type { FoldedText } from './fold-text.ts';
import type { Term } from './split-terms.ts';
import { termIn } from './split-terms.ts';
import { READ_IN_FULL } from './words/read-in-full.ts';
import type { OwnWordId } from './words/words.ts';

/** The terms of a line without its remark, and the remark in the person's words. */
export interface WithRemark {
  readonly terms: readonly Term[];
  readonly remark?: string;
}

const QUOTES: Readonly<Record<string, string>> = { '"': '"', '“': '”“"', '„': '“”"', '«': '»', '”': '”' };
const wordsOf = (id: OwnWordId): ReadonlySet<string> =>
  new Set(READ_IN_FULL.flatMap(({ own = {} }) => own[id] ?? []));
/** Words that open a remark with a colon, and those that need none. */
const OPENERS = wordsOf('remark');
const BARE_OPENERS = wordsOf('remark-bare');
/** A word in brackets that says something of the wine makes them no remark. */
const SPEAKS =
  /^(label|unit|additive|style|category|product|stage|vessel|organic|cue:(?!plain|article|is$|and|in|of|with|verb|pronoun|past-time|thanks|by|to|from|cellar|lot|variety))/;

/** Terms `from` to `to` are the remark; `until` is the first term behind it. */
interface Range {
  readonly at: number;
  readonly from: number;
  readonly to: number;
  readonly until: number;
}

const lineEnd = (terms: readonly Term[], i: number): number => {
  const end = terms.findIndex(({ kind }, k) => k >= i && kind === 'break');
  return end < 0 ? terms.length : end;
};

/** `note: …` to the end of its line, behind something else. */
function announced(terms: readonly Term[], i: number): Range | undefined {
  const { kind, text } = termIn(terms, i);
  if (kind !== 'word' || !(OPENERS.has(text) || BARE_OPENERS.has(text))) return undefined;
  const colon = termIn(terms, i + 1).text === ':';
  if (!colon && !BARE_OPENERS.has(text)) return undefined;
  const from = colon ? i + 2 : i + 1;
  const until = lineEnd(terms, i);
  const isBehind = terms.slice(0, i).some((term) => term.kind === 'number');
  return isBehind && until > from ? { at: i, from, to: until - 1, until } : undefined;
}

/** Words between quotes, where something else is said beside them. */
function quoted(terms: readonly Term[], i: number): Range | undefined {
  const { kind, text, gap } = termIn(terms, i);
  const closers = kind === 'mark' ? QUOTES[text] : undefined;
  // `2"`: inches.
  if (closers === undefined || (!gap && termIn(terms, i - 1).kind === 'number')) return undefined;
  const end = terms.findIndex((term, k) => k > i && term.kind === 'mark' && closers.includes(term.text));
  if (end <= i + 1) return undefined;
  const inside = terms.slice(i + 1, end);
  const isName = inside.length <= 3 && inside[0]?.kind === 'word' && inside.at(-1)?.kind === 'number';
  const isBeside = terms.some((term, k) => (k < i || k > end) && term.kind === 'number');
  return isBeside && !isName ? { at: i, from: i + 1, to: end - 1, until: end + 1 } : undefined;
}

const BRACKETS: ReadonlySet<string> = new Set(['(', ')']);

/** Words in brackets that are no figures and say nothing of the wine that is known. */
function bracketed(terms: readonly Term[], i: number): Range | undefined {
  if (termIn(terms, i).kind !== 'mark' || termIn(terms, i).text !== '(') return undefined;
  // Only the innermost brackets: a text of nothing but brackets is gone through once.
  let end = i + 1;
  while (end < terms.length && !BRACKETS.has(termIn(terms, end).text)) end++;
  if (end <= i + 1 || terms[end]?.text !== ')') return undefined;
  const inside = terms.slice(i + 1, end);
  const isPlain = inside.every(
    ({ kind, tags }) => kind !== 'number' && !tags.some((tag) => SPEAKS.test(tag)),
  );
  const isSaid = inside.some(
    ({ kind, tags, text }) => kind === 'word' && tags.length === 0 && text.length > 2,
  );
  const isBeside = terms.some((term, k) => (k < i || k > end) && term.kind === 'number');
  return isPlain && isSaid && isBeside ? { at: i, from: i + 1, to: end - 1, until: end + 1 } : undefined;
}

/** Whether a term could open a remark at all. */
const mayOpen = ({ kind, text }: Term): boolean =>
  kind === 'mark'
    ? text === '(' || QUOTES[text] !== undefined
    : kind === 'word' && (OPENERS.has(text) || BARE_OPENERS.has(text));

/** Takes the remark out of a line before anything in it is read; a comma stands in its place. */
export function takeRemark(message: string, folded: FoldedText, terms: readonly Term[]): WithRemark {
  if (!terms.some(mayOpen)) return { terms };
  const kept: Term[] = [];
  const remarks: string[] = [];
  for (let i = 0; i < terms.length;) {
    const range = announced(terms, i) ?? quoted(terms, i) ?? bracketed(terms, i);
    if (range === undefined) {
      kept.push(termIn(terms, i));
      i++;
      continue;
    }
    const [first, last] = [termIn(terms, range.from), termIn(terms, range.to)];
    remarks.push(message.slice(folded.at[first.start], (folded.at[last.end - 1] ?? 0) + 1).trim());
    kept.push({ ...termIn(terms, range.at), kind: 'mark', text: ',', tags: [] });
    i = range.until;
  }
  return remarks.length === 0 ? { terms } : { terms: kept, remark: remarks.join('; ') };
}
