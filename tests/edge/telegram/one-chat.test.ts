import { describe, expect, test } from 'vitest';

import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { StoreError } from '../../../src/edge/store/store-error.ts';
import { Person } from './person.ts';
import type { Fault } from './fake-bot-api.ts';
import { openScene } from './scene.ts';
import { hastyClock } from './served-bot.ts';

describe('what goes wrong in one chat', () => {
  test('stays there: a blocked bot says nothing more to that person', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail('sendMessage', { error_code: 403, description: 'Forbidden: bot was blocked by the user' });
    const bot = serve();
    rosa.sends('two');
    const timo = new Person(api, 7002);
    await api.until(() => api.callsOf('sendMessage').length > 0);
    timo.sends('first');
    expect(await timo.reads(1)).toBe('1: first');
    expect(rosa.texts).toEqual([]);
    expect(bot.logged.filter((line) => /"level":[56]0/.test(line))).toEqual([]);
  });

  test('does not hold up another chat', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail('sendMessage', 'hang');
    serve({ times: { finish_s: 1 } });
    rosa.sends('first');
    await api.until(() => api.callsOf('sendMessage').length > 0);
    const timo = new Person(api, 7002);
    timo.sends('first');
    expect(await timo.reads(1)).toBe('1: first');
    expect(rosa.texts).toEqual([]);
  });

  test('is logged and told, and the next reply and the next message are served', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail('sendMessage', { error_code: 400, description: 'Bad Request: a planted fault' });
    const bot = serve();
    rosa.sends('two');
    rosa.sends('throw');
    rosa.sends('last');
    await rosa.reads(3);
    expect(rosa.texts).toEqual(['and more', 'fault-aside', '2: last']);
    expect(bot.logged.join('')).toContain('a message could not be sent');
    expect(bot.logged.join('')).toContain('a message could not be answered');
  });

  test('no answer is sent when what has to be kept could not be kept, only that it failed', async () => {
    await using scene = await openScene();
    const { rosa, serve } = scene;
    const store = createMemoryCellars({ now: hastyClock.now });
    const disk = new StoreError('full', { cause: new Error('the disk is full') });
    let full = true;
    const bot = serve({
      store: {
        ...store,
        turn: (cellar, work) =>
          store.turn(cellar, async (view) => {
            const done = await work(view);
            if (full) throw disk;
            return done;
          }),
      },
    });
    rosa.sends('first');
    expect(await rosa.reads(1)).toBe('fault-unwritten');
    expect(bot.logged.join('')).toContain('the disk is full');
    full = false;
    rosa.sends('second');
    expect(await rosa.reads(2)).toBe('1: second');
  });
});

describe('a tap', () => {
  test('is acknowledged and answered', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    serve();
    rosa.sends('first');
    await rosa.reads(1);
    rosa.taps('again');
    expect(await rosa.reads(2)).toBe('2: pressed again:1');
    await api.until(() => api.callsOf('answerCallbackQuery').length > 0);
    expect(api.callsOf('answerCallbackQuery')).toEqual([{ callback_query_id: 'tap-2' }]);
  });

  test.each<[string, Fault]>([
    ['too old to be acknowledged', { error_code: 400, description: 'Bad Request: query is too old' }],
    ['acknowledged in vain', 'reset'],
  ])('that is %s is answered all the same', async (_, fault) => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    api.fail('answerCallbackQuery', fault);
    const bot = serve();
    rosa.sends('first');
    await rosa.reads(1);
    rosa.taps('again');
    expect(await rosa.reads(2)).toBe('2: pressed again:1');
    expect(bot.logged.filter((line) => /"level":[456]0/.test(line))).toEqual([]);
  });
});
