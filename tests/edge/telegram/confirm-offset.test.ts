import type { Api } from 'grammy';
import { expect, test } from 'vitest';

import { createLog } from '../../../src/edge/logging.ts';
import { confirmOffset } from '../../../src/edge/telegram/confirm-offset.ts';

/** The offsets that the platform is told, while its call ends as `answer` does. */
async function told(offset: number, answer: () => Promise<never[]>): Promise<unknown[]> {
  const offsets: unknown[] = [];
  const getUpdates = async (asked: unknown): Promise<never[]> => {
    offsets.push(asked);
    return answer();
  };
  await confirmOffset(offset, {
    api: { getUpdates } as unknown as Api,
    clock: { now: () => 0, wait: () => new Promise(() => undefined) },
    log: createLog({ level: 'silent', to: { write: () => undefined } }),
    within_s: 1,
  });
  return offsets;
}

test('what was received is confirmed by the number after it, in one call that takes nothing away', async () => {
  expect(await told(42, async () => [])).toEqual([
    expect.objectContaining({ offset: 42, limit: 1, timeout: 0 }),
  ]);
});

test('where nothing was received the platform is told nothing', async () => {
  expect(await told(0, async () => [])).toEqual([]);
});

test('a platform that does not answer is no fault: it delivers again', async () => {
  await expect(told(42, () => Promise.reject(new Error('gone')))).resolves.toHaveLength(1);
});
