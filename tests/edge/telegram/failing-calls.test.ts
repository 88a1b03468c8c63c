import { describe, expect, test } from 'vitest';

import type { Fault } from './fake-bot-api.ts';
import { CONFLICT, SERVER_ERROR, SLOW_DOWN } from './fault.ts';
import { openScene } from './scene.ts';

describe('a call that fails', () => {
  const cases: readonly [sentence: string, method: string, faults: readonly Fault[], copies: number][] = [
    ['sending answered with 500', 'sendMessage', [SERVER_ERROR, SERVER_ERROR], 1],
    ['sending answered with 429', 'sendMessage', [SLOW_DOWN], 1],
    ['sending cut off before it is done', 'sendMessage', ['reset', 'reset', 'reset'], 1],
    ['a sending whose receipt is lost', 'sendMessage', ['receipt lost'], 2],
    ['sending answered by a gateway', 'sendMessage', ['gateway page'], 1],
    ['a poll answered with 500', 'getUpdates', [SERVER_ERROR, SERVER_ERROR], 1],
    ['a poll answered with 429', 'getUpdates', [SLOW_DOWN], 1],
    ['a poll cut off', 'getUpdates', ['reset', 'reset', 'reset'], 1],
    ['a poll whose answer is lost', 'getUpdates', ['none', 'receipt lost', 'receipt lost'], 1],
    ['a poll of a second poller', 'getUpdates', [CONFLICT], 1],
    ['a greeting answered with 502', 'getMe', ['gateway page', SERVER_ERROR], 1],
  ];
  test.each(cases)('%s leaves no message unanswered', async (_, method, faults, copies) => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail(method, ...faults);
    serve();
    rosa.sends('first');
    await rosa.reads(copies);
    rosa.sends('second');
    await rosa.reads(copies + 1);
    expect(rosa.texts).toEqual([...Array<string>(copies).fill('1: first'), '2: second']);
  });

  test('that never ends is left behind and made again', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail('sendMessage', 'hang');
    api.fail('getUpdates', 'none', 'hang');
    serve({ times: { callTimeout_s: 0.3, sendTimeout_s: 0.3, longPoll_s: 0.1 } });
    rosa.sends('first');
    expect(await rosa.reads(1)).toBe('1: first');
    rosa.sends('second');
    expect(await rosa.reads(2)).toBe('2: second');
  });

  test('a poll that the client itself forgets is left behind by the watchdog', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail('getUpdates', 'hang');
    const bot = serve({ times: { watchdog_s: 200 } });
    rosa.sends('first');
    expect(await rosa.reads(1)).toBe('1: first');
    expect(bot.told.join('\n')).toContain('a poll did not end within 200 s');
  });
});
