import { describe, expect, test } from 'vitest';
import { judge, labelledIn } from './judge.ts';

for (const file of [
  'en.jsonl',
  'en-more.jsonl',
  'en-hard.jsonl',
  'en-floor.jsonl',
  'en-words.jsonl',
  'en-marks.jsonl',
  'en-solutions.jsonl',
  'en-must.jsonl',
  'refused.en.jsonl',
  'emergency.jsonl',
  'en-commands.jsonl',
]) {
  describe(`messages of ${file} are read as their labels say`, () => {
    test.each(labelledIn(file))('$id reads as it was meant: $text', (labelled) => {
      const { read, wanted } = judge(labelled);
      expect(read).toEqual(wanted);
    });
  });
}

describe('the own words, statements, moments, lots and remarks of a message are read as its label says', () => {
  test.each(labelledIn('en-commands.jsonl'))('$id reads as it was meant: $text', (labelled) => {
    const { beside } = judge(labelled);
    expect(beside.read).toEqual(beside.wanted);
  });
});
