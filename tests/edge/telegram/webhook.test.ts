import { request } from 'node:http';
import { expect, test } from 'vitest';

import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { StoreError } from '../../../src/edge/store/store-error.ts';
import type { DoorAddress } from '../../../src/edge/telegram/open-door.ts';
import { ALLOWED_UPDATES } from '../../../src/edge/telegram/update.ts';
import { bringUpdates, type BringFault } from './bring-updates.ts';
import type { FakeBotApi } from './fake-bot-api.ts';
import { openScene } from './scene.ts';
import { hastyClock } from './served-bot.ts';

const SECRET = 'a-made-up-secret';

/** A door on a free port, with a webhook or without, and where it is. */
const aDoor = (webhook = true): { door: DoorAddress; opened: Promise<string> } => {
  const { promise: opened, resolve } = Promise.withResolvers<string>();
  const onOpen = (port: number): void => resolve(`http://127.0.0.1:${port}`);
  const hook = { url: 'https://bot.example/a-word', secret: SECRET };
  return { door: { port: 0, onOpen, ...(webhook && { webhook: hook }) }, opened };
};

const bring = async (
  root: string,
  { path = '/a-word', method = 'POST', secret = SECRET, body = '{"update_id":1}' } = {},
): Promise<number> => {
  const headers = { 'x-telegram-bot-api-secret-token': secret };
  const { status } = await fetch(root + path, { method, headers, ...(method === 'POST' && { body }) });
  return status;
};

const whenAsked = (api: FakeBotApi): Promise<void> => api.until(() => api.webhook !== undefined);

test('with a webhook the platform brings updates: each is answered once, also when it is brought again', async () => {
  await using scene = await openScene();
  const { api, rosa, serve } = scene;
  const { door, opened } = aDoor();
  api.fail('setWebhook', 'reset');
  const bot = serve({ door });
  const root = await opened;
  const faults: BringFault[] = ['none', 'cut', 'receipt lost', 'none', 'receipt lost'];
  const bringing = bringUpdates(api, { root: () => root, faults });
  for (const text of ['a', 'b', 'c', 'd']) rosa.sends(text);
  await rosa.reads(4);
  await bringing.stop();
  await bot.stop();
  expect(rosa.texts).toEqual(['1: a', '2: b', '3: c', '4: d']);
  expect(bringing.statuses).toEqual([200, 200, 200, 200]);
  expect(api.callsOf('getUpdates')).toEqual([]);
  expect(api.callsOf('setWebhook').at(-1)).toMatchObject({
    url: 'https://bot.example/a-word',
    secret_token: SECRET,
    allowed_updates: [...ALLOWED_UPDATES],
  });
});

test.each<[string, Parameters<typeof bring>[1], number]>([
  ['a wrong secret', { secret: 'a-made-up-secreT' }, 401],
  ['a secret of another length', { secret: '' }, 401],
  ['another path', { path: '/another' }, 404],
  ['a path above', { path: '/a-word/..' }, 404],
  ['a name that every object has', { path: '/constructor' }, 404],
  ['the right path to be read', { method: 'GET' }, 404],
  ['what is no JSON', { body: '{' }, 400],
  ['what is no update', { body: '"x"' }, 400],
  ['a body of more than a million bytes', { body: `"${'x'.repeat(1_000_001)}"` }, 413],
  ['an update that needs no answer', {}, 200],
])('%s gets its status and changes nothing', async (_, forged, status) => {
  await using scene = await openScene();
  const { api, serve } = scene;
  const { door, opened } = aDoor();
  const bot = serve({ door });
  const root = await opened;
  await whenAsked(api);
  expect(await bring(root, forged)).toBe(status);
  await bot.stop();
  expect(api.delivered).toEqual([]);
});

test('without the secret nothing is taken at all', async () => {
  await using scene = await openScene();
  const { api, serve } = scene;
  const { door, opened } = aDoor();
  serve({ door });
  const root = await opened;
  await whenAsked(api);
  const response = await fetch(`${root}/a-word`, { method: 'POST', body: '{"update_id":1}' });
  expect(response.status).toBe(401);
});

test('an update that cannot be kept is not taken, so that the platform brings it again', async () => {
  await using scene = await openScene();
  const { api, rosa, serve } = scene;
  const { door, opened } = aDoor();
  const store = createMemoryCellars({ now: hastyClock.now });
  let full = true;
  serve({
    door,
    store: {
      ...store,
      receive: async (arrived, onWritten) => {
        if (full) throw new StoreError('full', { cause: new Error('planted') });
        return store.receive(arrived, onWritten);
      },
    },
  });
  const root = await opened;
  await whenAsked(api);
  const bringing = bringUpdates(api, { root: () => root });
  rosa.sends('a');
  await expect.poll(() => bringing.statuses).toContain(503);
  full = false;
  expect(await rosa.reads(1)).toBe('1: a');
  await bringing.stop();
});

test('the pages for whoever runs it: alive, ready or what is missing, and figures by their names', async () => {
  await using scene = await openScene();
  const { api, rosa, serve } = scene;
  const { door, opened } = aDoor(false);
  api.fail('sendMessage', { error_code: 403, description: 'Forbidden: bot was blocked by the user' });
  serve({ door });
  const root = await opened;
  const page = async (path: string): Promise<string> => {
    const response = await fetch(root + path);
    return `${response.status} ${await response.text()}`;
  };
  expect(await page('/healthz')).toBe('200 alive\n');
  rosa.sends('lost');
  await api.until(() => api.callsOf('sendMessage').length === 1);
  rosa.sends('b');
  await rosa.reads(1);
  expect(await page('/readyz')).toBe('200 ready\n');
  const figures = await page('/metrics');
  expect(figures).toContain('\nbrimnote_updates_received_total 2\n');
  expect(figures).toContain('\nbrimnote_updates_handled_total{outcome="answered"} 2\n');
  expect(figures).toContain('\nbrimnote_sends_refused_total{reason="closed"} 1\n');
  expect(figures).toContain('\nbrimnote_inbox_updates 0\n');
  expect(figures).toContain('\nbrimnote_outbox_oldest_age_seconds 0\n');
  expect(figures).toMatch(/\nbrimnote_handling_seconds_count 2\n/);
  expect(figures).not.toMatch(/"[^"\n]*\b7001\b[^"\n]*"|Rosa/);
});

test('is not ready while store or platform cannot be reached', async () => {
  await using scene = await openScene();
  const { api, serve } = scene;
  const { door, opened } = aDoor(false);
  const store = createMemoryCellars({ now: hastyClock.now });
  const broken = new StoreError('locked', { cause: new Error('planted') });
  serve({ door, store: { ...store, nextDue: () => Promise.reject(broken) } });
  const root = await opened;
  await api.until(() => api.callsOf('getUpdates').length > 0);
  api.fail('getMe', 'reset', 'reset');
  const response = await fetch(`${root}/readyz`);
  expect(`${response.status} ${await response.text()}`).toBe('503 not ready: store, platform\n');
});

test('a port that another program has ends the start with a sentence', async () => {
  await using scene = await openScene();
  const { serve } = scene;
  const { door, opened } = aDoor(false);
  serve({ door });
  const port = Number(new URL(await opened).port);
  await expect(serve({ door: { port } }).ended).rejects.toThrow(`PORT ${port} cannot be had (EADDRINUSE)`);
});

test('a body that is never sent to its end holds nobody up', async () => {
  await using scene = await openScene();
  const { api, rosa, serve } = scene;
  const { door, opened } = aDoor();
  const bot = serve({ door });
  const root = await opened;
  await whenAsked(api);
  const headers = { 'x-telegram-bot-api-secret-token': SECRET, 'content-length': 100 };
  const slow = request(`${root}/a-word`, { method: 'POST', headers }).on('error', () => undefined);
  slow.write('{"update_id":');
  const bringing = bringUpdates(api, { root: () => root });
  rosa.sends('a');
  expect(await rosa.reads(1)).toBe('1: a');
  await bringing.stop();
  slow.destroy();
  await bot.stop();
});
