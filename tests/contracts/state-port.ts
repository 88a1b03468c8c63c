import { describe, expect, test } from 'vitest';

import { FRESH_MEMORY, type Memory } from '../../src/chat/conversation/memory.ts';
import type { StatePort, Who, Write } from '../../src/chat/conversation/ports.ts';

const ROSA: Who = { cellar: 'cellar 1', chat: 'chat 1', person: 'person 1' };
const MEMORY: Memory = {
  remembered: [],
  nextNumber: 4,
  lastButtons: ['working:3'],
  cautionedOn: { 'potassium-metabisulfite': '2026-01-31' },
};

const write = (who: Who, memory: Memory = MEMORY): Write => ({ kind: 'memory', who, memory });

/** What every store of conversations has to do; each implementation runs it. */
export function testStatePort(name: string, create: () => StatePort): void {
  describe(`${name} as a store of conversations`, () => {
    test('has a fresh memory of whoever never wrote', async () => {
      expect(await create().load(ROSA)).toEqual(FRESH_MEMORY);
    });

    test('gives back what was committed', async () => {
      const state = create();
      await state.commit([write(ROSA)]);
      expect(await state.load({ ...ROSA })).toEqual(MEMORY);
    });

    test('keeps the later of two writes, in one commit or in two', async () => {
      const state = create();
      await state.commit([write(ROSA), write(ROSA, { ...MEMORY, nextNumber: 5 })]);
      expect((await state.load(ROSA)).nextNumber).toBe(5);
      await state.commit([write(ROSA, { ...MEMORY, nextNumber: 6 })]);
      expect((await state.load(ROSA)).nextNumber).toBe(6);
    });

    test.each<[string, Who]>([
      ['person', { ...ROSA, person: 'person 2' }],
      ['chat', { ...ROSA, chat: 'chat 2' }],
      ['cellar', { ...ROSA, cellar: 'cellar 2' }],
      [
        'name that only looks the same when it is joined',
        { cellar: 'cellar 1","chat', chat: '1', person: 'person 1' },
      ],
    ])('keeps another %s apart', async (_, other) => {
      const state = create();
      await state.commit([write(ROSA)]);
      expect(await state.load(other)).toEqual(FRESH_MEMORY);
    });

    test('is not changed by what happens to an object after it was committed or loaded', async () => {
      const state = create();
      const memory = structuredClone(MEMORY) as { nextNumber: number } & Memory;
      await state.commit([write(ROSA, memory)]);
      memory.nextNumber = 99;
      const loaded = (await state.load(ROSA)) as { nextNumber: number };
      loaded.nextNumber = 98;
      expect(await state.load(ROSA)).toEqual(MEMORY);
    });

    test('keeps nothing of a commit that cannot be kept whole', async () => {
      const state = create();
      const circle: Record<string, unknown> = {};
      circle['self'] = circle;
      const broken = { ...MEMORY, cautionedOn: circle } as unknown as Memory;
      await expect(state.commit([write(ROSA), write({ ...ROSA, chat: 'chat 2' }, broken)])).rejects.toThrow(
        TypeError,
      );
      expect(await state.load(ROSA)).toEqual(FRESH_MEMORY);
    });

    test('takes a commit without writes', async () => {
      await expect(create().commit([])).resolves.toBeUndefined();
    });
  });
}
