import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { readMessage } from '../../src/chat/reader/read-message.ts';
import { isQuestion } from '../../src/chat/reader/question-topic.ts';
import { READER_DEFAULTS } from '../../src/chat/reader/reader-defaults.ts';
import type { Language } from '../../src/chat/reader/understood.ts';

interface Question {
  readonly text: string;
  readonly topic?: string;
}

const rowsOf = (name: string): Question[] =>
  readFileSync(new URL(name, import.meta.url), 'utf8')
    .split('\n')
    .filter((row) => row !== '')
    .map((row) => JSON.parse(row) as Question);

/** The languages whose questions are tried: a language is added when all of its rows hold. */
const TRIED: readonly Language[] = ['en', 'es', 'fr', 'it', 'de'];

describe.each(TRIED)('plain questions in %s', (language) => {
  const readingOf = (text: string) => readMessage(text, { ...READER_DEFAULTS, language }).readings[0];

  test.each(rowsOf(`questions.${language}.jsonl`))('$text: $topic, and no dose', ({ text, topic }) => {
    expect(readingOf(text)).toMatchObject({ intent: 'chat', topic, asks: [], problems: [] });
  });

  test.each(rowsOf(`no-questions.${language}.jsonl`))('$text is no question about the trade', ({ text }) => {
    expect(isQuestion(readingOf(text)?.topic)).toBe(false);
  });
});
