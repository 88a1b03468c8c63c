import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { lacking } from '../../.ci/lacking.ts';
import { localeMessages } from '../../.ci/locale-messages.ts';
import { phrasesOf } from '../../src/chat/reader/spellings.ts';
import { ALL_WORDS } from '../../src/chat/reader/words/all.ts';
import type { Words } from '../../src/chat/reader/words/words.ts';
import { SPOKEN } from '../../src/chat/replies/spoken.ts';
import { ownShares, shares } from './shared-words.ts';

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
