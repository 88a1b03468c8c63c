import { describe, expect, test } from 'vitest';

import { OperatorError } from '../../../src/edge/operator-error.ts';
import type { Fault } from './fake-bot-api.ts';
import { openScene } from './scene.ts';

describe('the operator is told', () => {
  test('that BOT_TOKEN is wrong, and the program ends with the status of a wrong configuration', async () => {
    await using scene = await openScene();
    const { api, serve } = scene;
    api.fail('getMe', { error_code: 401, description: 'Unauthorized' });
    const bot = serve();
    const error = await bot.ended.catch((thrown: unknown) => thrown);
    expect(error).toBeInstanceOf(OperatorError);
    expect(error).toMatchObject({ exitStatus: 78, message: expect.stringContaining('BOT_TOKEN (401)') });
    expect(api.callsOf('getUpdates')).toEqual([]);
  });

  test('that BOT_TOKEN was replaced while it ran', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail('getUpdates', 'none', { error_code: 401, description: 'Unauthorized' });
    const bot = serve();
    rosa.sends('first');
    await expect(bot.ended).rejects.toThrow('BOT_TOKEN (401)');
  });

  test('that a second program polls, and goes on when that one has ended', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    const bot = serve();
    await api.until(() => api.callsOf('getUpdates').length > 0);
    const second = serve();
    await api.until(() => api.callsOf('getUpdates').length > 2);
    await second.stop();
    rosa.sends('first');
    expect(await rosa.reads(1)).toBe('1: first');
    expect([...bot.told, ...second.told].join('\n')).toContain('with the same BOT_TOKEN (409)');
  });

  test('that the network or BOT_API_ROOT is at fault, and serving begins when it is back', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail('getMe', 'reset', 'reset', 'reset');
    const bot = serve();
    rosa.sends('first');
    expect(await rosa.reads(1)).toBe('1: first');
    expect(bot.told[0]).toMatch(
      /cannot be reached \(.+\): check the network and BOT_API_ROOT\. Trying again in 1 s\./,
    );
    expect(bot.told[1]).toContain('Trying again in 2 s.');
    expect(bot.told).toContain('The Bot API answers again.');
  });

  test('only while the wait grows: then the same sentence would only fill the screen', async () => {
    await using scene = await openScene();
    const { api, serve } = scene;
    api.fail('getMe', ...Array<Fault>(12).fill('reset'));
    const bot = serve();
    await api.until(() => api.callsOf('getUpdates').length > 0);
    expect(bot.told.filter((sentence) => sentence.includes('Trying again'))).toHaveLength(6);
  });

  test('that a webhook stood in the way of polling and is taken away', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail('getUpdates', {
      error_code: 409,
      description:
        "Conflict: can't use getUpdates method while webhook is active; use deleteWebhook to delete it",
    });
    const bot = serve();
    rosa.sends('first');
    expect(await rosa.reads(1)).toBe('1: first');
    expect(api.callsOf('deleteWebhook')).toEqual([{}]);
    expect(bot.told.join('\n')).toContain('A webhook was set for this bot');
  });
});
