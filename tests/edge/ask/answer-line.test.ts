import { describe, expect, test } from 'vitest';
import { handle } from '../../../src/chat/conversation/conversation.ts';
import { startRun } from './start-run.ts';

test('a line of output says what was understood, the figures, the text and the buttons', async () => {
  const output = await startRun()({
    id: 'a1',
    language: 'en',
    text: 'tank 4 1450 gal pH 3.58 free 21 TA 5.9',
  });
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
  expect(output.buttons).toContainEqual({ key: 'nf:1.1', label: 'Not finished' });
});

test.each([
  ['hi', 'chat'],
  ['gas leak, he cant breathe', 'emergency'],
  ['ph 36 1,450 gal free 22', 'dose'],
  ['reading tank 9 free 31 pH 3.52', 'reading'],
  ['free 21 ppm', 'dose'],
])('where nothing may be said the answer is null: %s', async (text, intent) => {
  const { understood, answers } = await startRun()({ id: 1, text });
  expect([understood[0]?.intent, answers]).toEqual([intent, [null]]);
});

test('a round has an element a reading, shared facts apart', async () => {
  const { understood, answers } = await startRun()({
    id: 'r',
    text: 'kmbs, target 0.6 mol\nT1 20 hl pH 3.4 free 15\nT2 30 hl pH 3.5 free 10',
  });
  expect([understood.length, answers.length]).toEqual([2, 2]);
  expect(understood[1]?.fields).toEqual({ vessel: 'tank 2', volume_L: 3000, ph: 3.5, free_mg_L: 10 });
});

describe('lines are chats of their own', () => {
  test('unless chat joins them', async () => {
    const answer = startRun();
    await answer({ id: 1, text: 'T4 pH 3.5 free 20' });
    expect((await answer({ id: 2, text: '40 hl' })).answers).toEqual([null]);
    await answer({ id: 3, chat: 'c', text: 'T4 pH 3.5 free 20' });
    const { answers } = await answer({ id: 4, chat: 'c', text: '40 hl' });
    expect(answers[0]?.measure).toEqual({ value: 139, unit: 'g' });
  });

  test('and persons in one chat are kept apart', async () => {
    const answer = startRun();
    await answer({ id: 1, chat: 'c', person: 'Ana', text: 'T4 pH 3.5 free 20' });
    expect((await answer({ id: 2, chat: 'c', person: 'Ben', text: '40 hl' })).answers).toEqual([null]);
  });

  test('and at sets the clock: a question lapses after half an hour', async () => {
    const answer = startRun();
    await answer({ id: 1, chat: 'c', at: '2026-10-05T08:00:00Z', text: 'T4 pH 3.5 free 20' });
    const late = { id: 2, chat: 'c', at: '2026-10-05T10:31:00+02:00', text: '40 hl' };
    expect((await answer(late)).answers).toEqual([null]);
  });

  test('and without a file each chat is a cellar, which knows nothing of another one', async () => {
    const answer = startRun();
    await answer({ id: 1, chat: 'c', text: 'T4 1450 gal pH 3.5 free 20' });
    expect((await answer({ id: 2, chat: 'd', text: 'T4 free 20' })).understood[0]?.asks).toContain(
      'volume_L',
    );
    expect((await answer({ id: 3, text: 'T4 free 20' })).understood[0]?.asks).toContain('volume_L');
  });
});

test('what is filled in from what is known of a vessel is assumed, and no field of the message', async () => {
  const answer = startRun();
  await answer({ id: 1, chat: 'c', at: '2026-10-05T08:00:00Z', text: 'T4 40 hl pH 3.5 red' });
  const next = { id: 2, chat: 'c', at: '2026-10-06T08:00:00Z', text: 'T4 free 20' };
  const { understood } = await answer(next);
  expect(understood[0]).toMatchObject({
    fields: { vessel: 'tank 4', free_mg_L: 20 },
    assumed: { volume_L: 4000, ph: 3.5, style: 'red', stage: 'finished' },
    asks: [],
  });
  expect(Object.keys(understood[0]?.fields ?? {})).toEqual(['vessel', 'free_mg_L']);
});

test('press stands for a text, with a button of an earlier line', async () => {
  const answer = startRun();
  const { buttons } = await answer({ id: 1, chat: 'c', text: '1450 gal pH 3.58 free 21' });
  const red = buttons.find(({ label }) => label === 'Red');
  expect((await answer({ id: 2, chat: 'c', press: red?.key })).reply).toContain('142 g');
});

describe('a tick', () => {
  test('has nothing to send where nothing is due', async () => {
    const tick = { id: 't', tick: true, at: '2026-10-05T08:00:00Z' };
    expect(await startRun()(tick)).toEqual({ id: 't', sends: [] });
  });

  test('brings what falls due by its moment, once, with the chat that it goes to', async () => {
    const answer = startRun();
    await answer({ id: 1, chat: 'c', at: '2026-10-05T08:00:00Z', text: 'added 137 g kmbs T12' });
    const { sends } = await answer({ id: 2, tick: true, at: '2026-10-07T08:00:00Z' });
    expect(sends).toEqual([{ chat: 'c', reply: expect.stringContaining('T12') as string, buttons: [] }]);
    expect((await answer({ id: 3, tick: true, at: '2026-10-07T08:01:00Z' })).sends).toEqual([]);
  });
});

test('a fault of ours costs one line its answer, and the run goes on', async () => {
  const answer = startRun({
    handle: async (message, ...rest) => {
      if (message.id === 'bad') throw new TypeError('planted');
      return handle(message, ...rest);
    },
  });
  expect(await answer({ id: 'bad', text: 'hi' })).toMatchObject({ id: 'bad', error: 'planted' });
  expect((await answer({ id: 'y', text: 'hi' })).error).toBeUndefined();
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
  `{"id":"${'x'.repeat(79)}","text":"hi"}`,
  String.raw`{"chat":"${'\\u0000'.repeat(14)}","text":"hi"}`,
])('a line that is no message says so, and the run goes on: %s', async (line) => {
  const answer = startRun();
  expect(await answer(line)).toEqual({ id: null, error: expect.any(String) as string });
  expect((await answer({ id: 'y', text: 'hi' })).id).toBe('y');
});

test.each(['', ' ', '\u0000\u202e', '💥'.repeat(3000), 'a\nb\r\nc', '9'.repeat(4096)])(
  'any text gets a line: %j',
  async (text) => {
    expect(await startRun()({ id: 'z', text })).toMatchObject({
      id: 'z',
      reply: expect.any(String) as string,
    });
  },
);
