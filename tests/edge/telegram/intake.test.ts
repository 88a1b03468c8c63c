import { describe, expect, test } from 'vitest';

import { createMemoryIntake } from '../../../src/edge/telegram/intake.ts';

const batch = (...numbers: number[]): { update_id: number }[] => numbers.map((update_id) => ({ update_id }));

describe('the intake', () => {
  test('gives back what is new, once, in order', async () => {
    const intake = createMemoryIntake();
    expect(await intake.offer(batch(1, 2, 2))).toEqual(batch(1, 2));
    expect(await intake.offer(batch(2, 3, 1))).toEqual(batch(3));
  });

  test('does not take an answered update for a new one', async () => {
    const intake = createMemoryIntake();
    await intake.offer(batch(1));
    await intake.done(1);
    expect(await intake.offer(batch(1))).toEqual([]);
  });

  test('knows what is not done, the lowest first', async () => {
    const intake = createMemoryIntake();
    await intake.offer(batch(12, 10, 11));
    await intake.done(11);
    expect(await intake.unfinished()).toEqual([10, 12]);
  });

  test('forgets the oldest of many that are done, and none that is not', async () => {
    const intake = createMemoryIntake();
    const many = Array.from({ length: 12_000 }, (_, index) => index + 1);
    for (const number of many) {
      await intake.offer(batch(number));
      await intake.done(number);
    }
    expect(await intake.offer(batch(11_999, 1))).toEqual(batch(1));
    const open = createMemoryIntake();
    await open.offer(batch(...many));
    expect(await open.offer(batch(1))).toEqual([]);
  });
});
