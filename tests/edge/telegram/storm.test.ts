import { expect, test } from 'vitest';

import type { Fault } from './fake-bot-api.ts';
import { SERVER_ERROR } from './fault.ts';
import { Person } from './person.ts';
import { openScene } from './scene.ts';

test('an update that comes twice is answered once', async () => {
  await using scene = await openScene();
  const { rosa, serve } = scene;
  serve();
  rosa.sends('first', { twice: true });
  await rosa.reads(1);
  rosa.sends('second');
  await rosa.reads(2);
  expect(rosa.texts).toEqual(['1: first', '2: second']);
});

test('a storm over twelve chats leaves every message answered, in order, twice only where a receipt was lost', async () => {
  await using scene = await openScene();
  const { api, serve } = scene;
  // In an order that looks like chance and is always the same.
  const kinds: readonly Fault[] = [SERVER_ERROR, 'reset', 'receipt lost', ...Array<Fault>(7).fill('none')];
  let state = 7;
  const storm = Array.from({ length: 400 }, () => {
    state = (state * 48_271) % 2_147_483_647;
    return kinds[state % kinds.length] ?? 'none';
  });
  api.fail('sendMessage', ...storm);
  api.fail('getUpdates', ...storm.slice(0, 30));
  serve();
  const people = Array.from({ length: 12 }, (_, index) => new Person(api, 8000 + index));
  for (let i = 1; i <= 10; i += 1) for (const person of people) person.sends(`m${i}`, { twice: i % 3 === 0 });
  const expected = Array.from({ length: 10 }, (_, index) => `${index + 1}: m${index + 1}`);
  await api.until(() => people.every((person) => person.texts.at(-1) === expected.at(-1)));
  for (const person of people) {
    expect([...new Set(person.texts)]).toEqual(expected);
    expect(person.texts).toEqual(person.texts.toSorted((a, b) => parseInt(a) - parseInt(b)));
  }
  const lost = storm
    .slice(0, api.callsOf('sendMessage').length)
    .filter((fault) => fault === 'receipt lost').length;
  expect(lost).toBeGreaterThan(0);
  expect(api.delivered.length - people.length * 10).toBeLessThanOrEqual(lost);
});
