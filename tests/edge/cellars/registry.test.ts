import { beforeEach, expect, test } from 'vitest';
import type { CellarStore } from '../../../src/core/cellar/cellar-store.ts';
import { readRoster } from '../../../src/chat/conversation/cellar/roster.ts';
import { ROSTER_KEY } from '../../../src/chat/conversation/keys.ts';
import { createRegistry, type Registry } from '../../../src/edge/cellars/registry.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';

let store: CellarStore;
let registry: Registry;

beforeEach(() => {
  store = createMemoryCellars({ now: () => 0 });
  registry = createRegistry(store);
});

/** Something is noted in a cellar. */
async function noteIn(cellar: string): Promise<void> {
  await store.turn(cellar, async () => ({
    writes: [
      { kind: 'person', id: 'ana', number: 1, name: 'Ana' },
      {
        kind: 'entry',
        entry: { kind: 'vessel', event: 'told', vessels: ['tank 4'], key: 'k', at: 0, noted_at: 0, by: 1 },
      },
    ],
    result: undefined,
  }));
}

test('a chat of which nothing is kept is a cellar of its own', async () => {
  expect(await registry.cellarsOfChat('ana')).toEqual({ cellars: ['ana'], present: 'ana', isKept: false });
});

test('a chat whose own cellar is empty is in the one it joined alone', async () => {
  await registry.joinCellar('ben', 'ana');
  await registry.joinCellar('ben', 'ana');
  expect(await registry.cellarsOfChat('ben')).toEqual({ cellars: ['ana'], present: 'ana', isKept: true });
});

test('a chat that has a log of its own keeps it beside the one it joins', async () => {
  await noteIn('carla');
  await registry.joinCellar('carla', 'ana');
  await registry.joinCellar('carla', 'hill');
  expect(await registry.cellarsOfChat('carla')).toMatchObject({
    cellars: ['carla', 'ana', 'hill'],
    present: 'hill',
  });
  await registry.switchTo('carla', 'carla');
  await registry.switchTo('carla', 'valley');
  expect((await registry.cellarsOfChat('carla')).present).toBe('carla');
  await registry.leave('carla', 'carla');
  expect(await registry.cellarsOfChat('carla')).toMatchObject({ cellars: ['ana', 'hill'], present: 'ana' });
});

test('a chat that left the last cellar is one of its own again', async () => {
  await registry.joinCellar('ben', 'ana');
  await registry.leave('ben', 'ana');
  await registry.leave('ben', 'ana');
  expect(await registry.cellarsOfChat('ben')).toEqual({ cellars: ['ben'], present: 'ben', isKept: false });
});

test('another process finds what was kept', async () => {
  await registry.joinCellar('ben', 'ana');
  expect((await createRegistry(store).cellarsOfChat('ben')).present).toBe('ana');
});

test('a group that gets another name keeps its cellar, and the cellar lets it in', async () => {
  await noteIn('group');
  await registry.migrateChat('group', 'supergroup');
  await registry.migrateChat('group', 'supergroup');
  expect(await registry.cellarsOfChat('supergroup')).toMatchObject({ cellars: ['group'], present: 'group' });
  expect(await registry.chatNow('group')).toBe('supergroup');
  expect(await registry.chatNow('other')).toBe('other');
  const kept = await store.look('group', (view) => view.kept(ROSTER_KEY));
  expect(readRoster(kept).chats).toEqual({ supergroup: 'hand' });
});

test('a group that joined by an invitation keeps what it may do under another name', async () => {
  await store.turn('ana', async () => ({
    writes: [{ kind: 'keep', key: ROSTER_KEY, text: JSON.stringify({ chats: { group: 'guest' } }) }],
    result: undefined,
  }));
  await registry.joinCellar('group', 'ana');
  await registry.migrateChat('group', 'supergroup');
  const kept = await store.look('ana', (view) => view.kept(ROSTER_KEY));
  expect(readRoster(kept).chats).toEqual({ supergroup: 'guest' });
  expect((await registry.cellarsOfChat('group')).isKept).toBe(false);
});

test('a chat that its cellar has shut out is not let in by another name', async () => {
  await registry.joinCellar('group', 'ana');
  await registry.migrateChat('group', 'supergroup');
  expect(await store.look('ana', (view) => view.kept(ROSTER_KEY))).toBeUndefined();
});

test('changes of one chat at once all hold', async () => {
  await Promise.all(['a', 'b', 'c'].map((cellar) => registry.joinCellar('ben', cellar)));
  expect((await registry.cellarsOfChat('ben')).cellars.toSorted()).toEqual(['a', 'b', 'c']);
});
