import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { localeMessages } from '../../.ci/locale-messages.ts';
import { phrasesOf } from '../../src/chat/reader/spellings.ts';
import { ALL_WORDS } from '../../src/chat/reader/words/all.ts';
import { EVERYWHERE } from '../../src/chat/reader/words/everywhere.ts';
import type { Words } from '../../src/chat/reader/words/words.ts';
import { SPOKEN } from '../../src/chat/replies/spoken.ts';
import { ownShares, shares } from './shared-words.ts';

/** What the lists of a language may hold: each with the concepts under it that have words. */
function conceptsOf({
  says,
  own = {},
  danger,
  months = [],
  weekdays = [],
  languages = {},
  ...rest
}: Words): string[] {
  const named = (room: string, lists: object): string[] =>
    Object.entries(lists).flatMap(([id, words]) =>
      (words as readonly unknown[]).length > 0 ? [`${room} ${id}`] : [],
    );
  const more = Object.entries(rest).flatMap(([room, lists]) =>
    typeof lists === 'object' && !Array.isArray(lists) ? named(room, lists as object) : [],
  );
  const whole = [...(months.length === 12 ? ['months'] : []), ...(weekdays.length === 7 ? ['weekdays'] : [])];
  return [
    ...named('says', says),
    ...named('own', own),
    ...named('danger', danger),
    ...named('languages', languages),
    ...more,
    ...whole,
  ];
}

/** Concepts that a language may have no word of: it says them by its grammar, or has them in common with all. */
const MAY_LACK = new Set([
  'says cue:rises-too', 'says cue:tap-too', 'says cue:put', 'says cue:one', 'says cue:many', 'says cue:from-too', 'says cue:also-at', 'says cue:add-behind',
  'says cue:past-if-accented', 'says cue:is-if-accented', 'says cue:size', 'own ordinal', 'own ago', 'own ago-before', 'own over', 'danger idiom',
]); // prettier-ignore

function lacking(language: Words, all: readonly Words[]): string[] {
  const has = new Set([...conceptsOf(language), ...Object.keys(EVERYWHERE).map((tag) => `says ${tag}`)]);
  const wanted = new Set(all.flatMap(conceptsOf));
  return [...wanted].filter((concept) => !has.has(concept) && !MAY_LACK.has(concept));
}

const english = localeMessages(readFileSync('locales/en.ftl', 'utf8'));
const spoken = ALL_WORDS.filter(({ language }) => SPOKEN.includes(language));

describe('a language that is spoken is whole', () => {
  test.each(SPOKEN)('%s has every sentence, so that no reply is in two languages', (language) => {
    const own = localeMessages(readFileSync(`locales/${language}.ftl`, 'utf8'));
    expect([...english.keys()].filter((key) => !own.has(key))).toEqual([]);
  });

  test.each(spoken)('$language has words for whatever another language has words for', (language) => {
    expect(lacking(language, spoken)).toEqual([]);
  });
});

describe('a word means one thing in its language', () => {
  test.each(ALL_WORDS)('no word of $language names two things of one kind', (language) => {
    expect(shares(language)).toEqual([]);
  });

  test.each(ALL_WORDS)('no word of $language tells the bot to do two things', (language) => {
    expect(ownShares(language)).toEqual([]);
  });

  test.each(ALL_WORDS)(
    'the entries of $language are written as they are looked up: in small letters',
    (language) => {
      const all = [...Object.values(language.says), ...Object.values(language.own ?? {})].flat();
      expect(all.filter((entry) => entry !== entry.toLowerCase() || entry.trim() !== entry)).toEqual([]);
    },
  );
});

describe('the rules find what is planted', () => {
  const [first] = ALL_WORDS as [Words];
  const planted = (says: Words['says'], own: Words['own'] = {}): Words => ({
    language: 'en',
    groups: ',',
    says,
    own,
    danger: {},
  });

  test('a word for free and total', () => {
    expect(shares(planted({ 'label:free': ['fr'], 'label:total': ['fr'] }))).toHaveLength(1);
  });

  test('a word for a level and for what was done', () => {
    expect(shares(planted({ 'cue:target': ['bring to'], 'cue:past': ['bring to'] }))).toHaveLength(1);
  });

  test('a word that undoes and exports', () => {
    expect(ownShares(planted({}, { undo: ['back'], export: ['back'] }))).toHaveLength(1);
  });

  test('a list without a concept', () => {
    const { says, ...rest } = first;
    const { 'cue:past': _past, ...without } = says;
    expect(lacking({ ...rest, says: without }, [first])).toEqual(['says cue:past']);
  });

  test('an umlaut has two spellings', () => {
    expect(phrasesOf('hälfte', { umlauts: true })).toEqual(['halfte', 'haelfte']);
  });
});
