import type { Term } from './split-terms.ts';
import { termIn } from './split-terms.ts';

const DENOMINATORS = new Set([2, 3, 4, 8, 16]);
const isWhole = (term: Term | undefined): boolean =>
  term?.kind === 'number' && term.value === undefined && /^\d+$/.test(term.text);
const has = (term: Term | undefined, pattern: RegExp): boolean =>
  term?.tags.some((tag) => pattern.test(tag)) === true;

const FRACTION_OF = /^(unit:(?!none|ppm|mg\/L|C$|F$|degree)|cue:tablet|additive:campden)/;

/** Whether a unit of mass or volume, a spoon or a tablet follows, so that `1/2` is half of one. */
function isOfSomething(terms: readonly Term[], i: number): boolean {
  for (let k = i; k < i + 3; k++) {
    if (has(terms[k], FRACTION_OF)) return true;
    if (!has(terms[k], /^cue:(of|article)$/) && terms[k]?.text !== '-') return false;
  }
  return false;
}

function joined(first: Term, last: Term, value: number, text: string): Term {
  return { ...first, text, end: last.end, value };
}

/** `1/2 lb`, `1 1/2 oz`, `1½ lb`: one number where a unit follows. */
function joinFractions(terms: readonly Term[]): Term[] {
  const out: Term[] = [];
  for (let i = 0; i < terms.length; i++) {
    const [a, slash, b] = [termIn(terms, i), termIn(terms, i + 1), termIn(terms, i + 2)];
    const vulgar = a.kind === 'number' && a.value !== undefined && a.value < 1;
    const [n, d] = [Number(a.text), Number(b.text)];
    const plain =
      isWhole(a) &&
      slash.text === '/' &&
      !slash.gap &&
      isWhole(b) &&
      b.gap === false &&
      DENOMINATORS.has(d) &&
      n > 0 &&
      n < d;
    if (!(vulgar || (plain && terms[i + 3]?.text !== '/' && isOfSomething(terms, i + 3)))) {
      out.push(a);
      continue;
    }
    const last = plain ? b : a;
    const share = plain ? n / d : (a.value ?? 0);
    const whole = out.at(-1);
    if (
      whole &&
      isWhole(whole) &&
      (vulgar || a.gap) &&
      Number(whole.text) < 1000 &&
      out.at(-2)?.text !== '/'
    ) {
      out[out.length - 1] = joined(whole, last, Number(whole.text) + share, `${whole.text} ${a.text}`);
    } else out.push(joined(a, last, share, a.text));
    if (plain) i += 2;
  }
  return out;
}

/** `3 comma 4`, `3point45`: the mark in words. Behind a vessel's number nobody can tell, and it stays apart. */
function joinSpokenDecimals(terms: readonly Term[]): Term[] {
  const out: Term[] = [];
  for (let i = 0; i < terms.length; i++) {
    const [a, mark, b] = [termIn(terms, i), termIn(terms, i + 1), termIn(terms, i + 2)];
    const isOfVessel = has(out.at(-1), /^vessel:/) || (!a.gap && !has(out.at(-1), /^label:/));
    const joins =
      isWhole(a) && a.text.length <= 3 && has(mark, /^cue:decimal$/) && isWhole(b) && b.text.length <= 2;
    if (joins && !(isOfVessel && out.at(-1)?.kind === 'word')) {
      out.push({ ...a, text: `${a.text}.${b.text}`, end: b.end });
      i += 2;
    } else out.push(a);
  }
  return out;
}

const CLAIMS_NEXT = /^(label:(?!volume)|vessel:|cue:(target|to|add|raise|lot|molecular|from|by|need|at)$)/;

/** How many terms a concentration takes that ends at term `i`: `ppm` one, `g/L` three. */
export function concentrationLength(terms: readonly Term[], i: number): number {
  if (has(terms[i], /^unit:(ppm|mg\/L)$/)) return 1;
  const per = terms[i - 1]?.text === '/' || has(terms[i - 1], /^cue:per$/);
  return has(terms[i], /^unit:(L|hL)$/) && per && has(terms[i - 2], /^unit:(g|mg)$/) ? 3 : 0;
}

/** A numeral that is written as a pH is. */
export const looksLikePh = (text: string): boolean => /^(2[.,'][7-9]|3[.,']\d|4[.,'][0-5])\d?$/.test(text);

/** `3.52 pH 1 250 L`: a label behind its figure claims no second one. */
function hasOwnFigure(terms: readonly Term[], k: number): boolean {
  if (!has(terms[k], /^(label:|cue:molecular$)/)) return false;
  const at = k - 1 - concentrationLength(terms, k - 1);
  if (terms[at]?.kind !== 'number') return false;
  // `3.5 free 20 800 gal`: the first is the pH, and the label's own stands behind it.
  if (at === k - 1 && has(terms[k], /^label:(free|total)$/) && looksLikePh(termIn(terms, at).text))
    return false;
  // `T8 alc 13.5`: the vessel's number is no figure.
  const glued =
    termIn(terms, at).gap === false && terms[at - 1]?.kind === 'word' && !has(terms[at - 1], /^label:/);
  return !glued && !isClaimedBefore(terms, at - 1);
}

/** Marks that claim the figure behind them: `-> 35 950 gal`, `+25 900 gal`, `@ 18 900 gal`. */
const CLAIMING_MARKS = new Set(['->', '=>', '→', '+', '@', '<', '>', '≈']);

/** `L 17 T 58 180 hl`: side by side the letters are labels, as the letter pair reads them. */
function isSecondLetter(terms: readonly Term[], i: number): boolean {
  const first = terms[i - 1]?.text === ',' || terms[i - 1]?.text === '/' ? i - 3 : i - 2;
  const isPair = termIn(terms, i).text === 't' && terms[first + 1]?.kind === 'number';
  return isPair && terms[first]?.kind === 'word' && /^[fl]$/.test(termIn(terms, first).text);
}

/** Whether the number after term `i` is claimed by a label or vessel word before it. */
function isClaimedBefore(terms: readonly Term[], i: number): boolean {
  if (CLAIMING_MARKS.has(termIn(terms, i).text) || isSecondLetter(terms, i)) return true;
  // `#3 900 gal`
  if (termIn(terms, i).text === '#' && terms[i + 1]?.gap === false) return true;
  let k = i;
  while (
    k >= 0 &&
    (termIn(terms, k).text === ':' ||
      termIn(terms, k).text === '=' ||
      termIn(terms, k).text === '#' ||
      (has(terms[k], /^cue:is$/) && !has(terms[k], CLAIMS_NEXT)))
  )
    k--;
  let sign = k;
  while (/^[.°]$/.test(termIn(terms, sign).text)) sign--;
  // `barrel no. 7 300 L`: the sign of a number parts no vessel from its own.
  if (has(terms[sign], /^cue:number-sign$/) && has(terms[sign - 1], /^vessel:/)) k = sign - 1;
  return k >= 0 && has(terms[k], CLAIMS_NEXT) && !hasOwnFigure(terms, k);
}

/** `target T8 30 640 gal`: the verb before a vessel claims the figure behind it. */
function isClaimedOverVessel(terms: readonly Term[], i: number): boolean {
  const [verb, vessel, number] = [terms[i - 2], terms[i - 1], terms[i]];
  if (number?.kind !== 'number' || !has(verb, /^cue:(target|raise|add)$/)) return false;
  return has(vessel, /^vessel:/) || (vessel?.kind === 'word' && !number.gap);
}

/** `18/60 800 gal`, `18 / 60 800 gal`: the second of a pair. A stroke behind a labelled figure only parts fields. */
function isBehindSlash(terms: readonly Term[], i: number): boolean {
  const slash = termIn(terms, i - 1);
  if (slash.text !== '/') return false;
  return !slash.gap || (terms[i - 2]?.kind === 'number' && !isClaimedBefore(terms, i - 3));
}

/** `T8 900 gal`: the 8 is the vessel's, or the label's that it is glued to. */
const isGluedToWord = (terms: readonly Term[], i: number): boolean =>
  (termIn(terms, i).gap === false &&
    (terms[i - 1]?.kind === 'word' || (terms[i - 1]?.text === '-' && termIn(terms, i - 1).gap === false))) ||
  isBehindSlash(terms, i) ||
  // `pH 3. 61`: a blank inside a decimal.
  (terms[i - 1]?.text === '.' &&
    terms[i - 1]?.gap === false &&
    /^[2-4]$/.test(termIn(terms, i - 2).text) &&
    termIn(terms, i).text.length === 2);

const unitFollows = (terms: readonly Term[], i: number): boolean =>
  has(terms[i], /^unit:(L|hL|m3|gal|galUS|galUK|mL|g|kg|lb)$/) || has(terms[i], /^cue:thousand$/);

/** Whether some other bare whole number could be the free SO2, so that `21 800 gal` needs no such reading. */
function hasOtherFree(terms: readonly Term[], from: number, to: number): boolean {
  if (terms.some((term) => has(term, /^label:(free|so2)$|^unit:ppm$|^cue:(target|add)$/))) return true;
  return terms.some(
    (term, k) =>
      (k < from || k > to) &&
      isWhole(term) &&
      Number(term.text) <= 60 &&
      term.gap &&
      terms[k - 1]?.text !== "'" &&
      !unitFollows(terms, k + 1) &&
      !isClaimedBefore(terms, k - 1) &&
      terms[k + 1]?.text !== '%',
  );
}

/** `1 200 L`: a blank groups thousands, unless a label or vessel claims its first part. */
function joinBlankGroups(terms: readonly Term[]): Term[] {
  const out: Term[] = [];
  for (let i = 0; i < terms.length; i++) {
    const first = termIn(terms, i);
    let last = i;
    if (isWhole(first) && first.text.length <= 3 && !first.text.startsWith('0')) {
      while (
        terms[last + 1]?.kind === 'number' &&
        termIn(terms, last + 1).gap &&
        /^\d{3}([.,]\d{1,2})?$/.test(termIn(terms, last + 1).text)
      )
        last++;
    }
    if (
      last === i ||
      !unitFollows(terms, last + 1) ||
      isClaimedBefore(terms, i - 1) ||
      isClaimedOverVessel(terms, i - 1) ||
      isGluedToWord(terms, i)
    ) {
      out.push(first);
      continue;
    }
    const before = terms[i - 1];
    const unsure = before?.kind === 'number' && first.text.length > 1 && !hasOtherFree(terms, i, last);
    const text = terms
      .slice(i, last + 1)
      .map((term) => term.text)
      .join('');
    const end = termIn(terms, last).end;
    out.push(
      unsure
        ? { ...first, text: `${text}?`, end, value: Number.NaN }
        : { ...first, text: text.replace(',', '.'), end, value: Number(text.replace(',', '.')) },
    );
    i = last;
  }
  return out;
}

/**
 * Joins numerals that are one number: fractions before a unit, and thousands grouped by blanks.
 *
 * @param terms The terms of a message.
 * @returns The terms with such numbers as one; its `value` is NaN where the blank could also part two figures.
 * @example
 * ```ts
 * import { foldText } from './fold-text.ts';
 * import { LEXICON } from './lexicon.ts';
 * import { splitTerms } from './split-terms.ts';
 * joinNumbers(splitTerms(foldText('1 1/2 oz'), LEXICON))[0].value // => 1.5
 * joinNumbers(splitTerms(foldText('free 20 800 gal'), LEXICON)).length // => 4
 * ```
 */
export function joinNumbers(terms: readonly Term[]): Term[] {
  const out: Term[] = [];
  let line: Term[] = [];
  // Line by line: what the next tank's line holds says nothing of this one's figures.
  for (const term of joinFractions(joinSpokenDecimals(terms))) {
    if (term.kind !== 'break') line.push(term);
    else {
      out.push(...joinBlankGroups(line), term);
      line = [];
    }
  }
  return [...out, ...joinBlankGroups(line)];
}
