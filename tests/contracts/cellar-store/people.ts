import { expect, test } from 'vitest';
import type { CellarStore, Person } from '../../../src/core/cellar/cellar-store.ts';
import { note, noteIn, write, type CreateStore } from './notes.ts';

const person = (store: CellarStore, id: string): Promise<Person | undefined> =>
  store.look('cellar 1', (view) => view.person(id));
const people = (store: CellarStore): Promise<readonly Person[]> =>
  store.look('cellar 1', (view) => view.people());

/** Who is who. */
export function testPeople(create: CreateStore): void {
  test('by the id of the platform, with a name or without', async () => {
    const store = await create(() => 0);
    await write(
      store,
      { kind: 'person', id: 'id 2', number: 2 },
      { kind: 'person', id: 'id 1', number: 1, name: 'Ana' },
    );
    expect(await person(store, 'id 1')).toEqual({ number: 1, name: 'Ana' });
    expect(await person(store, 'id 2')).toEqual({ number: 2 });
    expect(await person(store, 'id 3')).toBeUndefined();
    expect(await people(store)).toEqual([{ number: 1, name: 'Ana' }, { number: 2 }]);
    expect(await store.look('cellar 2', (view) => view.people())).toEqual([]);
    await store.close();
  });

  test('by the name they have now', async () => {
    const store = await create(() => 0);
    await write(store, { kind: 'person', id: 'id 1', number: 1, name: 'Ana' });
    await write(store, { kind: 'person', id: 'id 1', number: 1, name: 'Ana B.' });
    expect(await people(store)).toEqual([{ number: 1, name: 'Ana B.' }]);
    await store.close();
  });

  test('and forgets id and name of one who asks for it: number and entries stay', async () => {
    const store = await create(() => 0);
    await write(store, { kind: 'person', id: 'id 1', number: 1, name: 'Ana' });
    await write(store, { kind: 'person', id: 'id 2', number: 2, name: 'Rui' });
    await noteIn(store, note(1));
    await write(store, { kind: 'forget-person', number: 1 });
    expect(await person(store, 'id 1')).toBeUndefined();
    expect(await people(store)).toEqual([{ number: 1 }, { number: 2, name: 'Rui' }]);
    expect(await store.look('cellar 1', (view) => view.lastEntryBy(1))).toMatchObject({ entry: 1, by: 1 });
    // Who comes back is new here.
    await write(store, { kind: 'person', id: 'id 1', number: 3, name: 'Ana' });
    expect(await person(store, 'id 1')).toEqual({ number: 3, name: 'Ana' });
    await store.close();
  });

  test('and refuses a second number for one id', async () => {
    const store = await create(() => 0);
    await write(store, { kind: 'person', id: 'id 1', number: 1 });
    await expect(write(store, { kind: 'person', id: 'id 1', number: 2 })).rejects.toThrow(RangeError);
    expect(await people(store)).toEqual([{ number: 1 }]);
    await store.close();
  });
}
