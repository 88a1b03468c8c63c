import { HttpError } from 'grammy';
import { expect, test } from 'vitest';

import { createLog } from '../../../src/edge/logging.ts';
import { createBackOff } from '../../../src/edge/telegram/back-off.ts';
import { greet } from '../../../src/edge/telegram/greet.ts';
import type { Platform } from '../../../src/edge/telegram/platform.ts';

test('once it is reached the operator hears so, and the next failure is a first one again', async () => {
  const told: string[] = [];
  const waits_s: number[] = [];
  const { signal } = new AbortController();
  const log = createLog({ level: 'silent', to: { write: () => undefined } });
  const tell = (sentence: string): void => void told.push(sentence);
  const clock = { now: () => 0, wait: async (ms: number) => void waits_s.push(ms / 1000) };
  const backOff = createBackOff({ root: 'https://bot-api.example', clock, log, tell, signal });
  const failure = new HttpError('failed', new Error('no way'));
  let failures = 2;
  const getMe = async (): Promise<{ id: number; username: string }> => {
    if (failures > 0) {
      failures -= 1;
      throw failure;
    }
    return { id: 1, username: 'harbour_cellar_bot' };
  };
  const platform = { calls: { getMe } } as unknown as Platform;
  expect(await greet(platform, { backOff, log, tell, signal })).toEqual({
    id: 1,
    username: 'harbour_cellar_bot',
  });
  await backOff.failed(failure);
  expect(told.slice(2, 4)).toEqual([
    'The Bot API answers again.',
    'Serving Telegram as @harbour_cellar_bot.',
  ]);
  expect(waits_s).toEqual([1, 2, 1]);
});
