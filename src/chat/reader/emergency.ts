import { LEXICON } from './lexicon.ts';
import type { Language } from './understood.ts';
import { ALL_WORDS } from './words/all.ts';
import type { DangerId, Words } from './words/words.ts';

/** What an emergency is about: it decides which line of the reply comes first. */
export type Danger = 'person' | 'eyes' | 'swallowed' | 'skin' | 'gas';

/** An emergency: in which language it was recognised, and what it is about. */
export interface Emergency {
  readonly language: Language;
  readonly danger: Danger;
}

/** Where a group of words stands: the indices of its first and last word. */
interface Hit {
  readonly from: number;
  readonly to: number;
}

type Hits = ReadonlyMap<DangerId, readonly Hit[]>;

/** A phrase of one language that belongs to a group. */
interface Phrase {
  readonly language: Language;
  readonly words: readonly string[];
  readonly id: DangerId;
}

/** The phrases of all languages by their first word, so that a message is looked through once. */
function indexOf(lists: readonly Words[]): ReadonlyMap<string, readonly Phrase[]> {
  const index = new Map<string, Phrase[]>();
  for (const { language, danger } of lists) {
    for (const [id, phrases] of Object.entries(danger) as [DangerId, readonly string[]][]) {
      for (const phrase of phrases) {
        const words = phrase.split(' ');
        const first = words[0] ?? '';
        const same = index.get(first) ?? [];
        same.push({ language, words, id });
        index.set(first, same);
      }
    }
  }
  return index;
}

const INDEX = indexOf(ALL_WORDS);

/** The words that lead to a level in any language. */
const TO_WORDS: ReadonlySet<string> = new Set(
  ALL_WORDS.flatMap(({ says }) => [...(says['cue:to'] ?? []), ...(says['cue:joined'] ?? [])]),
);

/** The groups that make an emergency or open one; without any of them nothing further is looked at. */
const OPENERS: ReadonlySet<DangerId> = new Set<DangerId>([
  'down',
  'breathless',
  'hurt-eye',
  'swallowed',
  'drank',
  'burnt',
  'leak',
  'alarm',
  'fell',
  'silent',
  'unwell',
  'mixed',
  'skin',
  'smell',
]);

function hitsByLanguage(words: readonly string[]): Map<Language, Map<DangerId, Hit[]>> {
  const found = new Map<Language, Map<DangerId, Hit[]>>();
  for (let i = 0; i < words.length; i++) {
    for (const { language, words: phrase, id } of INDEX.get(words[i] ?? '') ?? []) {
      if (!phrase.every((word, k) => words[i + k] === word)) continue;
      const hits = found.get(language) ?? new Map<DangerId, Hit[]>();
      const hit = { from: i, to: i + phrase.length - 1 };
      const same = hits.get(id);
      if (same) same.push(hit);
      else hits.set(id, [hit]);
      found.set(language, hits);
    }
  }
  // A manner of speaking in one language is none of the danger that another reads in the same words.
  const idioms = [...found.values()].flatMap((hits) => hits.get('idiom') ?? []);
  if (idioms.length > 0) for (const hits of found.values()) hits.set('idiom', idioms);
  return found;
}

const all = (hits: Hits, id: DangerId): readonly Hit[] => hits.get(id) ?? [];
const has = (hits: Hits, id: DangerId): boolean => hits.has(id);

/** Whether what fell or cannot breathe is a thing named up to three words before: `foam collapsed`. */
function isThing(hits: Hits, words: readonly string[], { from }: Hit): boolean {
  const isBeside = (at: number): boolean =>
    all(hits, 'beside').some((hit) => hit.from < at && at - hit.from <= 2);
  const near = (at: number): boolean => {
    const between = words.slice(at + 1, from);
    const joined = from - at <= 2 || (from - at <= 5 && !between.some(isName));
    return at < from && joined && !between.some(isStop) && !isBeside(at);
  };
  const person = all(hits, 'person').some((hit) => hit.to < from && from - hit.to <= 3);
  const vessel = words.some((word, at) => near(at) && /^(t|fv|b)\d+$/.test(word));
  return (vessel || all(hits, 'thing').some((hit) => near(hit.to))) && !person;
}

/** A word that no list knows: between a thing and a fall it may be who fell (`free 20 Marco fainted`). */
const isName = (word: string): boolean =>
  word.length > 3 && !/[\d']/.test(word) && !LEXICON.phrases.has(word) && !INDEX.has(word);

/** A comma or a full stop: what stands before it is no subject of what follows. */
const isStop = (word: string): boolean => /^[,.;!?\n]$/.test(word);

/** A group of words of the message, without those that are only a manner of speaking. */
const literal = (hits: Hits, id: DangerId): readonly Hit[] =>
  all(hits, id).filter(
    ({ from, to }) => !all(hits, 'idiom').some((idiom) => idiom.from <= from && idiom.to >= to),
  );

/** A gas and a leak within four words; free and total SO2 are no gas. */
function isGasLeak(hits: Hits, words: readonly string[]): boolean {
  const gases = all(hits, 'gas').filter(
    ({ from }) =>
      !['free', 'total', 'libre', 'livre', 'libera', 'mol', 'molecular'].includes(words[from - 1] ?? ''),
  );
  return gases.some((gas) => literal(hits, 'leak').some((leak) => Math.abs(leak.from - gas.from) <= 8));
}

/** `Kollege in Tank 4 gefallen`: what stands behind "in" is where, and not what fell. */
const isPlace = (hits: Hits, { from }: Hit): boolean =>
  all(hits, 'beside').some((hit) => hit.from < from && from - hit.from <= 2);

/** `he dropped a hose, it fell into the tank`: a thing stands between the person and the fall. */
const isDropped = (hits: Hits): boolean =>
  all(hits, 'fell').every((fall) =>
    all(hits, 'thing').some(
      (thing) =>
        thing.to < fall.from &&
        !isPlace(hits, thing) &&
        all(hits, 'person').every((person) => person.to < thing.from || person.from > fall.to),
    ),
  );

const isGas = (hits: Hits): boolean => has(hits, 'gas') && has(hits, 'smell') && has(hits, 'place');

/** `von 30 auf 20 gefallen`, `fell to 14`: it is a figure that fell. */
function isFigure(words: readonly string[], { from, to }: Hit): boolean {
  const leads = (k: number): boolean => TO_WORDS.has(words[k] ?? '');
  const number = (k: number): boolean => /^\d+([.,]\d+)?$/.test(words[k] ?? '');
  const before = [1, 2, 3].find((back) => number(from - back));
  if (before !== undefined && leads(from - before - 1)) return true;
  return leads(to + 1) && number(to + 2);
}

/** What the danger is, where there is one; the matter that the reply begins with. */
function dangerOf(hits: Hits, words: readonly string[]): Danger | undefined {
  if (all(hits, 'hurt-eye').some(({ to }) => !(words[to] === 'eyes' && words[to + 1] === 'of')))
    return 'eyes';
  if (literal(hits, 'swallowed').some((hit) => !isThing(hits, words, hit))) return 'swallowed';
  if (has(hits, 'drank') && has(hits, 'chemical')) return 'swallowed';
  const isPerson = (['down', 'breathless'] as const).some((id) =>
    literal(hits, id).some((hit) => !isThing(hits, words, hit)),
  );
  if (isPerson) return 'person';
  if ((has(hits, 'burnt') || has(hits, 'skin')) && has(hits, 'chemical')) return 'skin';
  if (isGasLeak(hits, words) || isGas(hits)) return 'gas';
  const vessel = has(hits, 'vessel') || words.some((word) => /^(t|fv)\d{1,3}$/.test(word));
  if (
    has(hits, 'unwell') &&
    (vessel || has(hits, 'gas') || has(hits, 'chemical')) &&
    !isOnlyThing(hits, words)
  )
    return 'gas';
  if (has(hits, 'mixed') && has(hits, 'chemical') && has(hits, 'reactive') && isChlorine(hits, words))
    return 'gas';
  if (literal(hits, 'alarm').length > 0 && !has(hits, 'elsewhere')) return 'person';
  const isFall = all(hits, 'fell').some(
    (hit) => !isThing(hits, words, hit) && (has(hits, 'person') || !isFigure(words, hit)),
  );
  if (isFall && vessel && !isDropped(hits)) return 'person';
  if (!has(hits, 'silent')) return undefined;
  const inside = all(hits, 'went-in').some((hit) => !isThing(hits, words, hit));
  const isLost =
    (inside && (has(hits, 'person') || !has(hits, 'elsewhere'))) ||
    (has(hits, 'person') && vessel && !has(hits, 'elsewhere'));
  return isLost ? 'person' : undefined;
}

const isOnlyThing = (hits: Hits, words: readonly string[]): boolean =>
  all(hits, 'unwell').every((hit) => isThing(hits, words, hit));

/** Sulfite with citric acid is a holding solution; with bleach it is poison gas. */
const isChlorine = (hits: Hits, words: readonly string[]): boolean =>
  all(hits, 'reactive').some(({ from }) => !ACIDS.test(words[from] ?? ''));

const ACIDS = /^(ac[iy]d|saure|citric|phosphoric|cleaner|pbw)/;

/**
 * Recognises somebody in danger, in all six languages whatever the chat's.
 *
 * @param text A folded message.
 * @param chat The chat's language, which is looked at first.
 * @returns The language in which it was recognised and what it is about, or undefined.
 * @example
 * ```ts
 * recogniseEmergency('the new guy collapsed', 'en') // => { language: 'en', danger: 'person' }
 * recogniseEmergency('eyes on t4 please', 'en') // => undefined
 * recogniseEmergency('ne respire plus', 'en') // => { language: 'fr', danger: 'person' }
 * ```
 */
export function recogniseEmergency(text: string, chat: Language): Emergency | undefined {
  const words = text.match(/[\p{L}\d]+(?:'\p{L}+)*|[,.;!?\n](?!\d)/gu);
  if (!words) return undefined;
  const found = hitsByLanguage(words);
  const languages = [...found].filter(([, hits]) => [...hits.keys()].some((id) => OPENERS.has(id)));
  const ordered = languages.toSorted(([a], [b]) => Number(b === chat) - Number(a === chat));
  for (const [language, hits] of ordered) {
    const danger = dangerOf(hits, words);
    if (danger) return { language, danger };
  }
  return undefined;
}
