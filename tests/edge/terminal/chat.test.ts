import { PassThrough } from 'node:stream';
import { expect, test } from 'vitest';
import { handle } from '../../../src/chat/conversation/conversation.ts';
import type { Handle } from '../../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import type { CellarStore } from '../../../src/core/cellar/cellar-store.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { makeServe } from '../../../src/edge/serve-message.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { StoreError } from '../../../src/edge/store/store-error.ts';
import { runTerminal } from '../../../src/edge/terminal/chat.ts';

const say = makeSay(loadLocales());
const NOON = Date.parse('2026-10-05T12:00:00Z');

const fail = (fault: unknown): never => {
  throw fault;
};

const memory = (): CellarStore => createMemoryCellars({ now: () => NOON });

interface Typed {
  readonly interactive?: boolean;
  readonly handle?: Handle;
  readonly store?: CellarStore;
  readonly name?: string;
  readonly at?: number;
  readonly report?: (fault: unknown) => void;
  /** Written one after the other, with a pause between them that is longer than any paste. */
  readonly pieces: readonly string[];
}

async function chat({
  interactive = false,
  pieces,
  handle: handled = handle,
  store = memory(),
  report = fail,
  at: begun = NOON,
  name,
}: Typed): Promise<string> {
  const input = new PassThrough();
  const output = new PassThrough({ encoding: 'utf8' });
  const ended = runTerminal({
    serve: makeServe({ handle: handled, say, store, settings: DEFAULT_SETTINGS, report }),
    say,
    input,
    output,
    now: () => begun,
    language: 'en',
    interactive,
    ...(name !== undefined && { name }),
  });
  for (const [at, piece] of pieces.entries()) {
    if (at > 0) await new Promise((resolve) => setTimeout(resolve, interactive ? 80 : 400));
    input.write(piece);
  }
  input.end();
  await ended;
  output.end();
  let text = '';
  for await (const chunk of output) text += String(chunk);
  return text.replaceAll('\u202f', ' ');
}

test('a line through a pipe prints its answer and ends, without greeting or prompt', async () => {
  const text = await chat({ pieces: ['T4 1450 gal pH 3.58 free 21\n'] });
  expect(text).toMatch(/^T4: weigh 256 g potassium metabisulfite\n/);
  expect(text).not.toContain('> ');
});

test('a last line without an end is answered too', async () => {
  expect(await chat({ pieces: ['T4 1450 gal pH 3.58 free 21'] })).toContain('256 g');
});

test('lines that arrive together are one message: a round', async () => {
  const text = await chat({ pieces: ['T1 20 hl pH 3.4 free 15\nT2 30 hl pH 3.4 free 15\n'] });
  expect(text).toMatch(/^Weigh potassium metabisulfite:\nT1 \(.*: \d+ g\nT2 \(.*: \d+ g$/m);
  expect(text.match(/never lean into a tank/gi)).toHaveLength(1);
});

test('a blank line ends a message', async () => {
  const text = await chat({ pieces: ['T4 pH 3.5 free 20\n\n40 hl\n\n'] });
  expect(text).toContain('what volume?');
  expect(text).toContain('T4: weigh 139 g');
});

test('lines with a pause between them are a message each', async () => {
  const text = await chat({ pieces: ['T4 pH 3.5 free 20\n', '40 hl\n'] });
  expect(text).toContain('what volume?');
  expect(text).toContain('T4: weigh 139 g');
});

test('buttons stand under the answer with their numbers, and a number presses one', async () => {
  const text = await chat({ pieces: ['40 hl pH 3.4 free 15\n\n2\n'] });
  expect(text).toContain('[1 Not finished  2 Working  3 Another target  4 More]');
  expect(text).toMatch(/^The working$/m);
});

test('a person is greeted and told how to begin, and the end of the input is a clean end', async () => {
  const text = await chat({ interactive: true, pieces: ['hi\n', '?\n'] });
  expect(text).toMatch(/^Brimnote reckons SO2 additions/);
  expect(text.match(/^> /gm)).toHaveLength(3);
  expect(text.endsWith('> \n')).toBe(true);
});

test('nothing but blank lines is no message', async () => {
  expect(await chat({ pieces: ['\n\n  \n'] })).toBe('');
});

test('the chat ends when it is told to', async () => {
  const stop = new AbortController();
  const input = new PassThrough();
  const ended = runTerminal({
    serve: makeServe({ handle, say, store: memory(), settings: DEFAULT_SETTINGS, report: fail }),
    say,
    input,
    output: new PassThrough(),
    now: () => NOON,
    language: 'en',
    interactive: false,
    signal: stop.signal,
  });
  stop.abort();
  await expect(ended).resolves.toBeUndefined();
});

test('a fault of ours costs one answer, not the chat, and whoever runs it is told', async () => {
  const reported: unknown[] = [];
  const broken = new RangeError('planted');
  const text = await chat({
    handle: async (message, view, settings) => {
      if (message.content.kind === 'text' && message.content.text.includes('T4')) throw broken;
      return handle(message, view, settings);
    },
    report: (fault) => reported.push(fault),
    pieces: ['T4 20 hl pH 3.4 free 15\n\n', 'thanks\n'],
  });
  expect(text).toMatch(/^That failed on my side, and nothing was worked out/);
  expect(text).toContain('You are welcome');
  expect(reported).toEqual([broken]);
});

test('what is noted is in the cellar, under the name of whoever sits there', async () => {
  const store = memory();
  await chat({ store, name: 'ana', pieces: ['added 137 g kmbs T12\n'] });
  const [entries, people] = await store.look('cellar', async (view) => [
    await view.entries({}),
    await view.people(),
  ]);
  expect(entries).toEqual([
    expect.objectContaining({ kind: 'addition', vessels: ['tank 12'], mass_g: 137, at: NOON, by: 1 }),
  ]);
  expect(people).toEqual([{ number: 1, name: 'ana' }]);
});

test('the same words in another run are another entry', async () => {
  const store = memory();
  const pieces = ['added 137 g kmbs T12\n'];
  for (const at of [NOON, NOON + 1]) await chat({ store, at, pieces });
  expect(await store.look('cellar', (view) => view.entries({}))).toHaveLength(2);
});

test('where nothing could be written, the person is told that it is not noted, and the operator why', async () => {
  const full = new StoreError('full', { cause: new Error('planted') });
  const reported: unknown[] = [];
  const text = await chat({
    store: { ...memory(), turn: async () => fail(full) },
    report: (fault) => reported.push(fault),
    pieces: ['added 137 g kmbs T12\n'],
  });
  expect(text).toMatch(/not noted/i);
  expect(text).not.toContain('137');
  expect(reported).toEqual([full]);
});
