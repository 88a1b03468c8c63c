import { describe, expect, test } from 'vitest';
import type { CellarStore } from '../../../src/core/cellar/cellar-store.ts';
import { handle } from '../../../src/chat/conversation/conversation.ts';
import type { Handle } from '../../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { makeAnswerLine } from '../../../src/edge/ask/answer-line.ts';
import { placeInFile } from '../../../src/edge/ask/place-in-file.ts';
import { placeInMemory } from '../../../src/edge/ask/place-in-memory.ts';
import { sayDue } from '../../../src/edge/ask/say-due.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { StoreError } from '../../../src/edge/store/store-error.ts';

interface Output {
  readonly id: unknown;
  readonly error?: string;
  readonly understood: { intent: string; topic?: string; fields: object; assumed: object; asks: string[] }[];
  readonly answers: ({ measure?: object } | null)[];
  readonly reply: string;
  readonly buttons: { key: string; label: string }[];
  readonly sends?: { chat: string; reply: string; buttons: object[] }[];
}

const say = makeSay(loadLocales());
const NOON = Date.parse('2026-10-05T12:00:00Z');

interface Run {
  readonly store?: CellarStore;
  readonly handle?: Handle;
}

/** A run that keeps nothing, as `ask` without a file; with a store, as on a file. */
const start = ({ store, handle: handled = handle }: Run = {}) => {
  const clock = { at: NOON };
  const held = { now: () => clock.at };
  const memory = createMemoryCellars(held);
  const answer = makeAnswerLine({
    handle: handled,
    say,
    settings: DEFAULT_SETTINGS,
    placeOf: store ? placeInFile(store, 'run') : placeInMemory(memory, held),
    sayDue: (at) => sayDue(at, { store: store ?? memory, say, settings: DEFAULT_SETTINGS }),
    language: 'en',
    run: 'run',
    now: () => NOON,
    setClock: (at) => (clock.at = at),
  });
  return async (input: object | string): Promise<Output> =>
    JSON.parse(
      JSON.stringify(await answer(typeof input === 'string' ? input : JSON.stringify(input))),
    ) as Output;
};

test('a line of output says what was understood, the figures, the text and the buttons', async () => {
  const output = await start()({ id: 'a1', language: 'en', text: 'tank 4 1450 gal pH 3.58 free 21 TA 5.9' });
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
  const { understood, answers } = await start()({ id: 1, text });
  expect([understood[0]?.intent, answers]).toEqual([intent, [null]]);
});

test('a round has an element a reading, shared facts apart', async () => {
  const { understood, answers } = await start()({
    id: 'r',
    text: 'kmbs, target 0.6 mol\nT1 20 hl pH 3.4 free 15\nT2 30 hl pH 3.5 free 10',
  });
  expect([understood.length, answers.length]).toEqual([2, 2]);
  expect(understood[1]?.fields).toEqual({ vessel: 'tank 2', volume_L: 3000, ph: 3.5, free_mg_L: 10 });
});

describe('lines are chats of their own', () => {
  test('unless chat joins them', async () => {
    const answer = start();
    await answer({ id: 1, text: 'T4 pH 3.5 free 20' });
    expect((await answer({ id: 2, text: '40 hl' })).answers).toEqual([null]);
    await answer({ id: 3, chat: 'c', text: 'T4 pH 3.5 free 20' });
    const { answers } = await answer({ id: 4, chat: 'c', text: '40 hl' });
    expect(answers[0]?.measure).toEqual({ value: 139, unit: 'g' });
  });

  test('and persons in one chat are kept apart', async () => {
    const answer = start();
    await answer({ id: 1, chat: 'c', person: 'Ana', text: 'T4 pH 3.5 free 20' });
    expect((await answer({ id: 2, chat: 'c', person: 'Ben', text: '40 hl' })).answers).toEqual([null]);
  });

  test('and at sets the clock: a question lapses after half an hour', async () => {
    const answer = start();
    await answer({ id: 1, chat: 'c', at: '2026-10-05T08:00:00Z', text: 'T4 pH 3.5 free 20' });
    const late = { id: 2, chat: 'c', at: '2026-10-05T10:31:00+02:00', text: '40 hl' };
    expect((await answer(late)).answers).toEqual([null]);
  });

  test('and without a file each chat is a cellar, which knows nothing of another one', async () => {
    const answer = start();
    await answer({ id: 1, chat: 'c', text: 'T4 1450 gal pH 3.5 free 20' });
    expect((await answer({ id: 2, chat: 'd', text: 'T4 free 20' })).understood[0]?.asks).toContain(
      'volume_L',
    );
    expect((await answer({ id: 3, text: 'T4 free 20' })).understood[0]?.asks).toContain('volume_L');
  });
});

test('what is filled in from what is known of a vessel is assumed, and no field of the message', async () => {
  const answer = start();
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
  const answer = start();
  const { buttons } = await answer({ id: 1, chat: 'c', text: '1450 gal pH 3.58 free 21' });
  const red = buttons.find(({ label }) => label === 'Red');
  expect((await answer({ id: 2, chat: 'c', press: red?.key })).reply).toContain('142 g');
});

describe('a tick', () => {
  test('has nothing to send where nothing is due', async () => {
    const tick = { id: 't', tick: true, at: '2026-10-05T08:00:00Z' };
    expect(await start()(tick)).toEqual({ id: 't', sends: [] });
  });

  test('brings what falls due by its moment, once, with the chat that it goes to', async () => {
    const answer = start();
    await answer({ id: 1, chat: 'c', at: '2026-10-05T08:00:00Z', text: 'added 137 g kmbs T12' });
    const { sends } = await answer({ id: 2, tick: true, at: '2026-10-07T08:00:00Z' });
    expect(sends).toEqual([{ chat: 'c', reply: expect.stringContaining('T12') as string, buttons: [] }]);
    expect((await answer({ id: 3, tick: true, at: '2026-10-07T08:01:00Z' })).sends).toEqual([]);
  });
});

describe('on a file', () => {
  const masses_g = (store: CellarStore): Promise<unknown[]> =>
    store.look('cellar', async (view) =>
      (await view.entries({})).map((entry) => 'mass_g' in entry && entry.mass_g),
    );
  const ADDED = { id: 7, chat: 'c', text: 'added 137 g kmbs T12' };

  test('a chat and an id make an entry once, in whatever run they come', async () => {
    const store = createMemoryCellars({ now: () => NOON });
    await start({ store })(ADDED);
    const { reply } = await start({ store })(ADDED);
    expect(reply).toMatch(/already noted/i);
    expect(await masses_g(store)).toEqual([137]);
    await start({ store })({ ...ADDED, chat: 'd' });
    await start({ store })({ ...ADDED, id: 8 });
    expect(await masses_g(store)).toEqual([137, 137, 137]);
  });

  test('a line without a chat or without an id is another one every time', async () => {
    const store = createMemoryCellars({ now: () => NOON });
    const answer = start({ store });
    for (const line of [{ chat: 'c' }, { id: 7 }, {}])
      for (const text of ['added 1 g kmbs T1', 'added 1 g kmbs T1']) await answer({ ...line, text });
    expect(await masses_g(store)).toHaveLength(6);
  });

  test('all lines are in one cellar, and the person is who notes it', async () => {
    const store = createMemoryCellars({ now: () => NOON });
    const answer = start({ store });
    await answer({ id: 1, chat: 'c', person: 'Ana', text: 'T4 40 hl pH 3.5 red' });
    const { understood } = await answer({ id: 1, person: 'Luis\n', text: 'T4 free 20' });
    expect(understood[0]?.assumed).toMatchObject({ volume_L: 4000, ph: 3.5 });
    expect(await store.look('cellar', (view) => view.people())).toEqual([
      { number: 1, name: 'Ana' },
      { number: 2, name: 'Luis' },
    ]);
  });

  test('nothing is kept for a chat that nobody comes back to, but what it noted', async () => {
    const store = createMemoryCellars({ now: () => NOON });
    await start({ store })({ text: 'added 137 g kmbs T12' });
    await start({ store })({ text: 'T13 40 hl pH 3.4 free 15' });
    const [kept, due] = await store.look('cellar', async (view) => [
      await view.keptUnder(''),
      await view.allDue(),
    ]);
    expect(kept.map(({ key }) => key).filter((key) => /^(memory|reading|daily)/.test(key))).toEqual([]);
    expect(due).toEqual([]);
    expect(await masses_g(store)).toContain(137);
  });

  test('where nothing could be written, the line says so to the person and to the program', async () => {
    const full = new StoreError('full', { cause: new Error('planted') });
    const store = { ...createMemoryCellars({ now: () => NOON }), turn: () => Promise.reject(full) };
    const { reply, error, answers } = await start({ store })(ADDED);
    expect(reply).toMatch(/^Not noted/);
    expect(error).toBe('the store failed: full (planted)');
    expect(answers).toEqual([]);
  });
});

test('a fault of ours costs one line its answer, and the run goes on', async () => {
  const answer = start({
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
  const answer = start();
  expect(await answer(line)).toEqual({ id: null, error: expect.any(String) as string });
  expect((await answer({ id: 'y', text: 'hi' })).id).toBe('y');
});

test.each(['', ' ', '\u0000\u202e', '💥'.repeat(3000), 'a\nb\r\nc', '9'.repeat(4096)])(
  'any text gets a line: %j',
  async (text) => {
    expect(await start()({ id: 'z', text })).toMatchObject({ id: 'z', reply: expect.any(String) as string });
  },
);
