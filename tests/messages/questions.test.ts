import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { readMessage } from '../../src/chat/reader/read-message.ts';
import { isQuestion } from '../../src/chat/reader/question-topic.ts';
import { READER_DEFAULTS } from '../../src/chat/reader/reader-defaults.ts';

interface Question {
  readonly text: string;
  readonly topic?: string;
}

const rowsOf = (name: string): Question[] =>
  readFileSync(new URL(name, import.meta.url), 'utf8')
    .split('\n')
    .filter((row) => row !== '')
    .map((row) => JSON.parse(row) as Question);

const readingOf = (text: string) => readMessage(text, READER_DEFAULTS).readings[0];

test.each(rowsOf('questions.en.jsonl'))('$text: $topic, and no dose', ({ text, topic }) => {
  expect(readingOf(text)).toMatchObject({ intent: 'chat', topic, asks: [], problems: [] });
});

test.each(rowsOf('no-questions.en.jsonl'))('$text is no question about the trade', ({ text }) => {
  expect(isQuestion(readingOf(text)?.topic)).toBe(false);
});
