import { beforeEach, expect, test } from 'vitest';
import type { CellarStore } from '../../../src/core/cellar/cellar-store.ts';
import { handle } from '../../../src/chat/conversation/conversation.ts';
import type { Content, IncomingMessage } from '../../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import type { AllowRule } from '../../../src/edge/cellars/allow-rule.ts';
import { makeDoor } from '../../../src/edge/cellars/door.ts';
import { createRateLimit } from '../../../src/edge/cellars/rate-limit.ts';
import { createRegistry } from '../../../src/edge/cellars/registry.ts';
import { makeServeDue } from '../../../src/edge/serve-due.ts';
import { makeServeTurn, type ServeTurn } from '../../../src/edge/serve-message.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { MORNING, say } from '../../chat/conversation/talk.ts';

const settings = DEFAULT_SETTINGS;
let store: CellarStore;
let serve: ServeTurn;
let count: number;

function begin(rule: AllowRule = { is: 'open' }): ReturnType<typeof makeDoor> {
  const registry = createRegistry(store);
  const door = makeDoor({ store, registry, rule, paceOf: createRateLimit(), handle });
  serve = makeServeTurn({ handle, say, store, settings, door });
  return door;
}

beforeEach(() => {
  store = createMemoryCellars({ now: () => MORNING });
  count = 0;
  begin();
});

/** What somebody writes in a private chat of their own, unless it says otherwise. */
function from(person: string, text: string, more: Partial<IncomingMessage> = {}): IncomingMessage {
  count += 1;
  const content: Content = { kind: 'text', text };
  const nonce = String(count).padStart(16, '0');
  const who = { cellar: person, chat: person, person, name: person };
  return { ...who, id: String(count), at: MORNING, language: 'en', content, nonce, ...more };
}

const textOf = async (message: IncomingMessage): Promise<string> =>
  (await serve(message)).said.map(({ text }) => text).join('\n');

const codeFrom = async (person: string, text: string): Promise<string> =>
  /\w+-\d{16}/.exec(await textOf(from(person, text)))?.[0] ?? '';

test('of two who use a code at once one is in, however often both are delivered', async () => {
  await textOf(from('Ana', 'T4 5200 L red pH 3.6 free 20, ML done'));
  const code = await codeFrom('Ana', 'invite hand');
  const [ben, carla] = [from('Ben', `join ${code}`), from('Carla', `/start ${code}`)];
  const all = await Promise.all([ben, carla, ben, carla, ben].map(textOf));
  expect(all.map((text) => text.includes('You are in'))).toEqual([true, false, true, false, true]);
  expect(await textOf(from('Ben', 'T4?'))).toContain('5 200 L'.replace(' ', '\u202f'));
  expect(await textOf(from('Carla', 'T4?'))).toContain('I know nothing of T4');
});

test('a failure after the chat was moved is made good by the same message again', async () => {
  const code = await codeFrom('Ana', 'invite hand');
  const message = from('Ben', `join ${code}`);
  let isBroken = true;
  const failing: CellarStore['turn'] = (cellar, work) =>
    store.turn(cellar, async (view) => {
      const done = await work(view);
      if (isBroken && cellar === 'Ana') throw new Error('the disk is full');
      return done;
    });
  const registry = createRegistry(store);
  const door = makeDoor({ store, registry, rule: { is: 'open' }, paceOf: () => 'fine', handle });
  serve = makeServeTurn({ handle, say, store: { turn: failing }, settings, door });
  await expect(serve(message)).rejects.toThrow('the disk is full');
  isBroken = false;
  expect(await textOf(message)).toContain('You are in Ana');
  expect(await textOf(from('Ben', 'people'))).toContain('Ben: hand (you)');
});

test('a chat that was moved and never let in finds itself outside, and goes home', async () => {
  await textOf(from('Ana', 'T4 5200 L red pH 3.6 free 20, ML done'));
  const door = begin();
  await door.move('Mal', { does: 'enter', cellar: 'Ana' });
  expect(await textOf(from('Mal', 'T4?'))).toContain('You are not of this cellar');
  expect(await textOf(from('Mal', 'T4?'))).toContain('I know nothing of T4');
});

test.each([
  'join Ana-0000000000000000',
  'join chats-0000000000000002',
  'join nowhere-0000000000000002',
  'join _ZZ-0000000000000002',
  'join Ana-0000000000000002x',
])('a forged code lets nobody in and makes no cellar: %s', async (text) => {
  await textOf(from('Ana', 'T4 5200 L red pH 3.6 free 20, ML done'));
  await textOf(from('Ana', 'invite guest'));
  const before = await store.cellars();
  expect(await textOf(from('Mal', text))).not.toContain('You are in');
  expect((await store.cellars()).filter((one) => one !== 'Mal')).toEqual(before);
  expect(await textOf(from('Mal', 'T4?'))).toContain('I know nothing of T4');
});

test('nothing of a stranger is kept but that they were told', async () => {
  begin({ is: 'invited', ids: ['Ana'] });
  await textOf(from('Ana', 'hello'));
  expect(await textOf(from('Mal', 'T4 5200 L pH 3.6 free 20'))).toContain('invited people');
  expect(await textOf(from('Mal', 'T4 5200 L pH 3.6 free 20'))).toBe('');
  expect(await textOf(from('Mal', 'Luis collapsed next to the tank'))).toContain('EVERYBODY OUT');
  expect(await textOf(from('Mal', '', { content: { kind: 'press', key: 'a:1.1' } }))).toBe('');
  expect(await store.cellars()).toEqual(['Ana', 'chats']);
  expect(await store.look('chats', (view) => view.people())).toEqual([]);
});

test('whoever is named by the rule begins a group for all who are in it', async () => {
  begin({ is: 'invited', ids: ['Ana'] });
  const group = { chat: 'group', cellar: 'group', addressed: 'called' } as const;
  expect(await textOf(from('Ben', 'help', group))).toContain('invited people');
  await textOf(from('Ana', 'hello', group));
  expect(await textOf(from('Eva', 'T4 5200 L red pH 3.6 free 20, ML done', group))).toContain('T4: weigh');
});

test('whoever has the machine is a keeper in every cellar', async () => {
  await textOf(from('Ana', 'hello'));
  const trusted = { cellar: 'Ana', chat: 'terminal', trusted: true } as const;
  expect(await textOf(from('operator', 'we work in gallons', trusted))).toContain('US gallons');
  expect(await textOf(from('operator', 'invite keeper', trusted))).toContain('Code for one keeper');
});

test.each([
  ['names its cellar where the chat has several', false],
  ['is not said where the chat was shut out', true],
])('what falls due %s', async (_title, isRemoved) => {
  await textOf(from('Ana', 'cellar name Blanca'));
  await textOf(from('Ana', 'T4 5200 L red pH 3.6 free 20, ML done'));
  await textOf(from('Ben', 'T9 900 L red pH 3.6 free 20, ML done'));
  const code = await codeFrom('Ana', 'invite hand');
  await textOf(from('Ben', `join ${code}`));
  await textOf(from('Ben', 'T4 free 8'));
  const door = begin();
  const serveDue = makeServeDue({ say, store, settings, door });
  const day_ms = 86_400_000;
  const later = MORNING + 40 * day_ms;
  const due = await store.takeDue(later, { lease_ms: 1, most: 9 });
  const ofBlanca = due.filter(({ cellar, chat }) => cellar === 'Ana' && chat === 'Ben');
  expect(ofBlanca).toHaveLength(1);
  const sayAll = async (): Promise<string[]> =>
    (await Promise.all(ofBlanca.map((one) => serveDue(one, later)))).flatMap(({ said }) =>
      said.map(({ text }) => text),
    );
  if (isRemoved) await textOf(from('Ana', 'remove Ben'));
  expect((await sayAll()).map((text) => text.split('\n')[0])).toEqual(isRemoved ? [] : ['Blanca:']);
});
