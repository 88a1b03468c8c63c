import { readdirSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { LANGUAGES } from '../../src/chat/reader/words/languages.ts';
import { judge, labelledIn } from './judge.ts';

/** Each language but English has a folder of its own: every file in it is read. */
const ofLanguages = LANGUAGES.filter((language) => language !== 'en').flatMap((language) =>
  readdirSync(new URL(language, import.meta.url)).map((name) => `${language}/${name}`),
);

for (const file of [
  'en.jsonl',
  'en-more.jsonl',
  'en-hard.jsonl',
  'en-floor.jsonl',
  'en-words.jsonl',
  'en-marks.jsonl',
  'en-solutions.jsonl',
  'en-rounds.jsonl',
  'en-must.jsonl',
  'en-bottling.jsonl',
  'en-law.jsonl',
  'en-vintage.jsonl',
  'refused.en.jsonl',
  'emergency.jsonl',
  'en-commands.jsonl',
  'en-lab.jsonl',
  'en-hunt.jsonl',
  ...ofLanguages,
]) {
  describe(`messages of ${file} are read as their labels say`, () => {
    test.each(labelledIn(file))('$id reads as it was meant: $text', (labelled) => {
      const { read, wanted } = judge(labelled);
      expect(read).toEqual(wanted);
    });
  });
}

describe('the own words, statements, moments, lots and remarks of a message are read as its label says', () => {
  test.each(
    [
      'en-commands.jsonl',
      'en-law.jsonl',
      'en-lab.jsonl',
      'it/cellar.jsonl',
      'it/more.jsonl',
      'es/cellar.jsonl',
      'es/floor.jsonl',
      'fr/cellar.jsonl',
    ].flatMap((file) => labelledIn(file)),
  )('$id reads as it was meant: $text', (labelled) => {
    const { beside } = judge(labelled);
    expect(beside.read).toEqual(beside.wanted);
  });
});
