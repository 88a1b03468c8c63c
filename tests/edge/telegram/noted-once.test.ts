import { expect, test } from 'vitest';

import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { realConversation } from './real-conversation.ts';
import { openScene } from './scene.ts';
import { hastyClock } from './served-bot.ts';

test('what was noted before a stop and comes again after it is noted once, under the name that is shown', async () => {
  await using scene = await openScene();
  const { api, rosa, serve } = scene;
  // The store outlives the bot here, as a file would.
  const store = createMemoryCellars({ now: hastyClock.now });
  api.fail('sendMessage', 'hang');
  api.fail('getUpdates', 'none', 'hang');
  const early = serve({ ...realConversation, store, times: { finish_s: 50 } });
  rosa.sends('added 137 g kmbs T12');
  await api.until(() => api.callsOf('sendMessage').length > 0 && api.callsOf('getUpdates').length > 1);
  await early.stop();
  serve({ ...realConversation, store });
  expect(await rosa.reads(1)).toMatch(/noted/i);
  rosa.sends('thanks');
  await rosa.reads(2);
  expect(rosa.texts.join('\n')).not.toMatch(/already/i);
  const [entries, people] = await store.look('telegram:7001', async (view) => [
    await view.entries({}),
    await view.people(),
  ]);
  expect(entries).toEqual([expect.objectContaining({ kind: 'addition', mass_g: 137, by: 1 })]);
  expect(people).toEqual([{ number: 1, name: 'Rosa <b>' }]);
});
