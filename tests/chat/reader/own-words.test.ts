import { expect, test } from 'vitest';
import { readMessage } from '../../../src/chat/reader/read-message.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';
import type { Reading } from '../../../src/chat/reader/understood.ts';
import { labelledIn } from '../../messages/judge.ts';

const readOne = (text: string): Reading | undefined => readMessage(text, READER_DEFAULTS).readings[0];

/** Every labelled message of the bot's own words and statements; in a reason or a remark anything may stand. */
const OWN = labelledIn('en-commands.jsonl')
  .map(({ text }) => ({ text, reading: readOne(text) }))
  .filter(({ text, reading }) => {
    const isOpen = reading?.command?.name === 'strike' || reading?.remark !== undefined;
    return reading?.intent === 'command' && !isOpen && !text.includes('\n');
  })
  .map(({ text }) => text);

test('there are some two hundred own words and statements to try', () => {
  expect(OWN.length).toBeGreaterThan(200);
});

test.each([' pH 3.5 free 20', ', pH 3.5, free 20', ', 3.52', ' free 20', ' target 35'])(
  'none of them is one with %j behind it: it never takes a reading for its own',
  (reading) => {
    const taken = OWN.filter((text) => readOne(`${text}${reading}`)?.intent === 'command');
    expect(taken).toEqual([]);
  },
);

test('none of them is one with a reading before it', () => {
  const taken = OWN.filter((text) => readOne(`T4 pH 3.5 free 20, ${text}`)?.intent === 'command');
  expect(taken).toEqual([]);
});

test('none of them states or does anything behind an "if"', () => {
  const done = OWN.map((text) => readOne(`if ${text}`)?.command?.name).filter(Boolean);
  expect(done).toEqual([]);
});

const WRITES = ['undo', 'unwatch', 'watch', 'later', 'order', 'set', 'set-wrong', 'forget', 'forget-me', 'backup', 'told', 'capacity', 'racked', 'topped', 'acid', 'moved', 'blended', 'emptied', 'lot', 'added-it', 'invite', 'remove-person', 'make-person', 'name-cellar', 'read-along']; // prettier-ignore

test('a question changes nothing, unless it asks the bot to do it', () => {
  const done = OWN.filter((text) => !text.startsWith('can you')).filter((text) =>
    WRITES.includes(readOne(`${text}?`)?.command?.name ?? ''),
  );
  expect(done).toEqual([]);
});

test.each(['/', ''])('a command with %j before it and the name of the bot behind is the same', (stroke) => {
  for (const word of ['today', 'vessels', 'due', 'open', 'settings', 'undo', 'backup', 'export']) {
    const addressed = stroke === '' ? word : `${stroke}${word}@some_bot`;
    expect(readOne(addressed)?.command).toEqual(readOne(word)?.command);
    expect(readOne(addressed.toUpperCase())?.command).toEqual(readOne(word)?.command);
  }
});
