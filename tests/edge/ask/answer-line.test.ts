import { describe, expect, test } from 'vitest';
import { handle } from '../../../src/chat/conversation/conversation.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { makeAnswerLine } from '../../../src/edge/ask/answer-line.ts';
import { loadLocales } from '../../../src/edge/locales.ts';

interface Output {
  readonly id: unknown;
  readonly error?: string;
  readonly understood: { intent: string; topic?: string; fields: object; asks: string[] }[];
  readonly answers: ({ measure?: object } | null)[];
  readonly reply: string;
  readonly buttons: { key: string; label: string }[];
  readonly sends?: unknown[];
}

const say = makeSay(loadLocales());
const start = () => {
  const answer = makeAnswerLine({
    handle: (message, memory) => handle(message, memory, DEFAULT_SETTINGS),
    say,
    language: 'en',
    now: () => Date.parse('2026-10-05T12:00:00Z'),
  });
  return (input: object | string): Output =>
    JSON.parse(JSON.stringify(answer(typeof input === 'string' ? input : JSON.stringify(input)))) as Output;
};

test('a line of output says what was understood, the figures, the text and the buttons', () => {
  const output = start()({ id: 'a1', language: 'en', text: 'tank 4 1450 gal pH 3.58 free 21 TA 5.9' });
  expect(output).toMatchObject({
    id: 'a1',
    understood: [
      {
        intent: 'dose',
        fields: { vessel: 'tank 4', ph: 3.58, free_mg_L: 21 },
        assumed: {
          additive: 'potassium-metabisulfite',
          target: { molecular_mg_L: 0.8 },
          stage: 'finished',
          gallon: 'US',
        },
        asks: [],
        problems: [],
        setAside: ['TA 5.9'],
      },
    ],
    shared: {},
    answers: [{ measure: { value: 256, unit: 'g' }, pK: 1.81, basis: 'pk-1.81' }],
  });
  expect(output.understood[0]?.fields).toHaveProperty('volume_L', expect.closeTo(5488.8470868, 6));
  expect(Object.keys(output)).toEqual(['id', 'understood', 'shared', 'answers', 'reply', 'buttons']);
  expect(Object.keys(output.understood[0] ?? {})).toEqual([
    'intent',
    'fields',
    'assumed',
    'asks',
    'problems',
    'setAside',
  ]);
  expect(output.buttons[0]).toEqual({ key: 'nf:1', label: 'Not finished' });
});

test.each([
  ['hi', 'chat'],
  ['gas leak, he cant breathe', 'emergency'],
  ['ph 36 1,450 gal free 22', 'dose'],
  ['reading tank 9 free 31 pH 3.52', 'reading'],
  ['free 21 ppm', 'dose'],
])('where nothing may be said the answer is null: %s', (text, intent) => {
  const { understood, answers } = start()({ id: 1, text });
  expect([understood[0]?.intent, answers]).toEqual([intent, [null]]);
});

test('a round has an element a reading, shared facts apart', () => {
  const { understood, answers } = start()({
    id: 'r',
    text: 'kmbs, target 0.6 mol\nT1 20 hl pH 3.4 free 15\nT2 30 hl pH 3.5 free 10',
  });
  expect([understood.length, answers.length]).toEqual([2, 2]);
  expect(understood[1]?.fields).toEqual({ vessel: 'tank 2', volume_L: 3000, ph: 3.5, free_mg_L: 10 });
});

describe('lines are chats of their own', () => {
  test('unless chat joins them', () => {
    const answer = start();
    answer({ id: 1, text: 'T4 pH 3.5 free 20' });
    expect(answer({ id: 2, text: '40 hl' }).answers).toEqual([null]);
    answer({ id: 3, chat: 'c', text: 'T4 pH 3.5 free 20' });
    expect(answer({ id: 4, chat: 'c', text: '40 hl' }).answers[0]?.measure).toEqual({
      value: 139,
      unit: 'g',
    });
  });

  test('and persons in one chat are kept apart', () => {
    const answer = start();
    answer({ id: 1, chat: 'c', person: 'Ana', text: 'T4 pH 3.5 free 20' });
    expect(answer({ id: 2, chat: 'c', person: 'Ben', text: '40 hl' }).answers).toEqual([null]);
  });

  test('and at sets the clock: a question lapses after half an hour', () => {
    const answer = start();
    answer({ id: 1, chat: 'c', at: '2026-10-05T08:00:00Z', text: 'T4 pH 3.5 free 20' });
    expect(answer({ id: 2, chat: 'c', at: '2026-10-05T10:31:00+02:00', text: '40 hl' }).answers).toEqual([
      null,
    ]);
  });
});

test('press stands for a text, with a button of an earlier line', () => {
  const answer = start();
  const { buttons } = answer({ id: 1, chat: 'c', text: 'T4 1450 gal pH 3.58 free 21' });
  const red = buttons.find(({ label }) => label === 'Red');
  expect(answer({ id: 2, chat: 'c', press: red?.key }).reply).toContain('T4: weigh 142 g');
});

test('a tick has nothing to send yet', () => {
  expect(start()({ id: 't', tick: true, at: '2026-10-05T08:00:00Z' })).toEqual({ id: 't', sends: [] });
});

test.each([
  'not json',
  '[]',
  '"text"',
  'null',
  '{}',
  '{"id":"x"}',
  '{"id":"x","text":5}',
  '{"id":"x","text":"hi","press":"w:1"}',
  '{"id":"x","text":"hi","language":"xx"}',
  '{"id":"x","text":"hi","at":"yesterday"}',
  '{"id":"x","tick":true}',
])('a line that is no message says so, and the run goes on: %s', (line) => {
  const answer = start();
  expect(answer(line)).toEqual({ id: null, error: expect.any(String) as string });
  expect(answer({ id: 'y', text: 'hi' }).id).toBe('y');
});

test.each(['', ' ', '\u0000\u202e', '💥'.repeat(3000), 'a\nb\r\nc', '9'.repeat(4096)])(
  'any text gets a line: %j',
  (text) => {
    expect(start()({ id: 'z', text })).toMatchObject({ id: 'z', reply: expect.any(String) as string });
  },
);
