import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { handle } from '../../src/chat/conversation/conversation.ts';
import type { Content, IncomingMessage } from '../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../src/chat/conversation/settings.ts';
import type { CellarStore } from '../../src/core/cellar/cellar-store.ts';
import { makeServe } from '../../src/edge/serve-message.ts';
import { createMemoryCellars } from '../../src/edge/store/memory-cellars.ts';
import { say } from '../fuzz/say.ts';
import { open } from './store/sqlite/open.ts';
import { temporaryFolder } from './store/sqlite/temporary-folder.ts';

const TAPS = 20;
const NOON = Date.parse('2026-10-05T12:00:00Z');

const STORES: readonly (readonly [string, () => Promise<CellarStore>])[] = [
  ['in memory', async () => createMemoryCellars({ now: () => NOON })],
  ['in a file', () => open(join(temporaryFolder(), 'cellar.db'))],
];

/** Serves messages, each of somebody else. */
function startCellar(store: CellarStore) {
  const report = (fault: unknown): never => {
    throw fault;
  };
  const serve = makeServe({ handle, say, store, settings: DEFAULT_SETTINGS, report });
  return async (nth: number, content: Content): Promise<string> => {
    const who = { cellar: 'c', chat: 'c', person: `person ${nth}`, name: `Hand ${nth}` };
    const message: IncomingMessage = { ...who, id: `event ${nth}`, at: NOON, language: 'en', content };
    const { said } = await serve(message);
    return said[0]?.text.split('\n')[0] ?? '';
  };
}

describe.each(STORES)('with a cellar %s', (_, create) => {
  test.each([
    ['I added it', 'T4 4000 L white pH 3.4 free 15 ML done', 'a:1.1'],
    ['an order is done', 'order T4 90 g kmbs', 'd:1'],
    ['note it', 'added 26 ppm T4, 4000 L', 'n:1.1'],
  ])(`${TAPS} people who tap on "%s" at once make one entry`, async (_name, text, key) => {
    const store = await create();
    const send = startCellar(store);
    await send(0, { kind: 'text', text });
    const answers = await Promise.all(
      Array.from({ length: TAPS }, (_one, at) => send(at + 1, { kind: 'press', key })),
    );
    const log = await store.look('c', (view) => view.entries({}));
    expect(log.filter(({ kind }) => kind === 'addition')).toHaveLength(1);
    expect(answers.filter((answer) => answer.startsWith('Noted'))).toHaveLength(1);
    expect(answers.filter((answer) => answer.startsWith('Already noted as'))).toHaveLength(TAPS - 1);
    await store.close();
  });
});
