import { describe, expect, test } from 'vitest';

import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import type { Fault } from './fake-bot-api.ts';
import { SERVER_ERROR } from './fault.ts';
import { openScene } from './scene.ts';
import { hastyClock } from './served-bot.ts';
import { handle } from './stub-conversation.ts';

describe('a stop', () => {
  test('finishes what is in hand, and tells the platform what was received', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail('sendMessage', SERVER_ERROR, SERVER_ERROR, SERVER_ERROR);
    const bot = serve();
    rosa.sends('first');
    rosa.sends('second');
    await api.until(() => api.callsOf('sendMessage').length > 0);
    await bot.stop();
    expect(rosa.texts).toEqual(['1: first', '2: second']);
    expect(api.confirmed).toBe(1003);
  });

  test('in the middle of anything ends with every message answered once by whoever comes next', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    for (const seen of [1, 3, 6]) {
      const bot = serve();
      for (let i = 0; i < 3; i += 1) rosa.sends('again');
      await api.until(() => api.callsOf('sendMessage').length >= seen);
      await bot.stop();
    }
    const bot = serve();
    await rosa.reads(9);
    await bot.stop();
    expect(rosa.texts).toHaveLength(9);
  });

  test('does not wait for ever for what is in hand, and logs how much was left', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail('sendMessage', 'hang');
    const handled: string[] = [];
    const bot = serve({
      times: { finish_s: 50 },
      handle: (message, ...rest) => {
        handled.push(message.id);
        return handle(message, ...rest);
      },
    });
    rosa.sends('first');
    rosa.sends('second');
    await api.until(() => api.callsOf('sendMessage').length > 0);
    await bot.stop();
    expect(rosa.texts).toEqual([]);
    expect(handled).toEqual(['message 1', 'message 2']);
    expect(bot.logged.join('')).toContain('"left":0,"unsent":2');
  });

  test('leaves in the store what it has not sent: the next one sends it, though all of it was confirmed', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail('sendMessage', 'hang');
    const store = createMemoryCellars({ now: hastyClock.now });
    const early = serve({ store, times: { finish_s: 50 } });
    rosa.sends('first');
    rosa.sends('second');
    await api.until(() => api.callsOf('sendMessage').length > 0 && api.confirmed === 1003);
    await early.stop();
    serve({ store });
    rosa.sends('third');
    await rosa.reads(3);
    expect(rosa.texts).toEqual(['1: first', '2: second', '3: third']);
  });

  test('does not wait for a platform that is away', async () => {
    await using scene = await openScene();
    const { api, serve } = scene;
    api.fail('getMe', ...Array<Fault>(1000).fill('reset'));
    const bot = serve();
    await api.until(() => api.calls.length > 2);
    await bot.stop();
    expect(api.callsOf('getUpdates')).toEqual([]);
  });
});
