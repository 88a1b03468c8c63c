import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { GrammyError, HttpError } from 'grammy';
import { describe, expect, test } from 'vitest';

import { clientSignal, openPlatform } from '../../../src/edge/telegram/platform.ts';
import { retryUnreached } from '../../../src/edge/telegram/retry-unreached.ts';

/** A platform whose waits take no time, and how long they were meant to be. */
const stage = (root: string) => {
  const waits_s: number[] = [];
  const clock = { now: () => 0, wait: async (ms: number) => void waits_s.push(ms / 1000) };
  return { waits_s, platform: openPlatform({ token: '1:planted', root, callTimeout_s: 5, clock }) };
};

const TWO_MINUTES_s = [1, 2, 4, 8, 15, 30, 30, 30];

describe('what a person waits for is tried for two minutes and then given up', () => {
  test('where nobody listens', async () => {
    const server = createServer().listen(0, '127.0.0.1');
    await new Promise((resolve) => server.once('listening', resolve));
    const { port } = server.address() as AddressInfo;
    await new Promise((resolve) => server.close(resolve));
    const { waits_s, platform } = stage(`http://127.0.0.1:${port}`);
    await expect(platform.patient.sendMessage(1, 'x')).rejects.toBeInstanceOf(HttpError);
    expect(waits_s).toEqual(TWO_MINUTES_s);
    platform.close();
  });

  test('where the platform fails by itself', async () => {
    let calls = 0;
    const server = createServer((_, response) => {
      calls += 1;
      response.end(JSON.stringify({ ok: false, error_code: 500, description: 'Internal Server Error' }));
    }).listen(0, '127.0.0.1');
    await new Promise((resolve) => server.once('listening', resolve));
    const { waits_s, platform } = stage(`http://127.0.0.1:${(server.address() as AddressInfo).port}`);
    await expect(platform.patient.sendMessage(1, 'x')).rejects.toBeInstanceOf(GrammyError);
    expect({ calls, waits_s }).toEqual({ calls: 9, waits_s: TWO_MINUTES_s });
    platform.close();
    await new Promise((resolve) => server.close(resolve));
  });
});

test('a call that is given up is not made again', async () => {
  const waits: number[] = [];
  const retry = retryUnreached({ now: () => 0, wait: async (ms) => void waits.push(ms) });
  const failure = new HttpError('failed', new Error('cut'));
  const call = (): Promise<never> => Promise.reject(failure);
  const made = retry(call, 'sendMessage', { chat_id: 1, text: 'x' }, clientSignal(AbortSignal.abort()));
  await expect(made).rejects.toBe(failure);
  expect(waits).toEqual([]);
});
