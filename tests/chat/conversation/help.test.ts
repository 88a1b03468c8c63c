import { describe, expect, test } from 'vitest';
import { HELP_KEYS } from '../../../src/chat/replies/help-keys.ts';
import { en } from '../../../src/chat/reader/words/en.ts';
import { startTalk, textOf } from './talk.ts';

const TOPICS = Object.keys(HELP_KEYS);

/** A phone shows 45 letters in a row, and 25 rows; own threshold. */
const rowsOf = (text: string): number =>
  text.split('\n').reduce((rows, line) => rows + Math.ceil(line.length / 45), 0);

/** Words of the bot that need something before them: a dialogue has each. */
const NEEDS_MORE = new Set(['undo', 'strike 17 typo', 'forget me']);

describe.each(TOPICS)('help %s', (topic) => {
  test('is one screen of a phone, and there are words that ask for it', async () => {
    const text = textOf(await startTalk().write(`help ${topic}`));
    expect(text.split('\n')[0]).not.toBe('Send a reading, get the SO2 addition.');
    expect(rowsOf(text)).toBeLessThanOrEqual(25);
    expect(Object.keys(en.topics ?? {})).toContain(topic);
  });

  test('what it suggests to send is understood when it is sent', async () => {
    const text = textOf(await startTalk().write(`help ${topic}`));
    const examples = text.split('\n').flatMap((line) => {
      const [example, meaning] = line.split(' → ');
      return meaning === undefined || example === undefined ? [] : [example];
    });
    expect(examples.length).toBeGreaterThan(0);
    for (const example of examples.filter((one) => !NEEDS_MORE.has(one.toLowerCase()))) {
      const { understood } = await startTalk().write(example);
      const readings = (understood?.readings ?? []).map(({ intent, problems }) => ({ intent, problems }));
      expect([example, readings.filter((one) => one.intent === 'chat' || one.problems.length > 0)]).toEqual([
        example,
        [],
      ]);
    }
  });
});

test('every topic that there are words for has sentences', () => {
  expect(Object.keys(en.topics ?? {}).filter((topic) => !TOPICS.includes(topic))).toEqual([]);
});

test('help is one screen, and lists each topic there is', async () => {
  const text = textOf(await startTalk().write('help'));
  expect(rowsOf(text)).toBeLessThanOrEqual(16);
  for (const topic of TOPICS) expect(text).toMatch(new RegExp(`\\b${topic}\\b`));
});
