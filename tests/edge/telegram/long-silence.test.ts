import { expect, test } from 'vitest';

import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { Person } from './person.ts';
import { realConversation } from './real-conversation.ts';
import { openScene } from './scene.ts';
import { hastyClock } from './served-bot.ts';

const NOW_s = 1_767_000_000;
const HOUR_s = 3600;
const WEEK_s = 7 * 24 * HOUR_s;

test('after a week of silence what is younger than 12 hours is answered, and each chat is told once what was left', async () => {
  await using scene = await openScene();
  const { api, serve } = scene;
  const store = createMemoryCellars({ now: hastyClock.now });
  // Some of it in the store, the rest with the platform.
  const ana = new Person(api, 7001, { begun_s: NOW_s - WEEK_s });
  for (let i = 0; i < 40; i += 1) ana.sends(`added ${100 + i} g kmbs T12`);
  await store.receive(
    api.takeUpdates().map((update, at) => ({
      channel: 'telegram',
      number: 1001 + at,
      body: JSON.stringify(update),
      received_at: 1000 * (NOW_s - WEEK_s),
    })),
  );
  const anaToday = new Person(api, 7001, { begun_s: NOW_s - 2 * HOUR_s });
  anaToday.sends('T4 1450 gal pH 3.58 free 21');
  const rui = new Person(api, 7002, { begun_s: NOW_s - 13 * HOUR_s });
  rui.sends('added 137 g kmbs T12');
  const eva = new Person(api, 7003, { begun_s: NOW_s - 60 });
  eva.sends('T4 1450 gal pH 3.58 free 21');

  serve({ ...realConversation, store });
  await Promise.all([anaToday.reads(2), rui.reads(1), eva.reads(1)]);
  expect(ana.texts[0]).toMatch(/^I was away\. 40 messages here are older than 12 hours/);
  expect(ana.texts[1]).toContain('256 g potassium metabisulfite');
  expect(rui.texts).toEqual([expect.stringMatching(/^I was away\. A message here is older than 12 hours/)]);
  expect(eva.texts).toEqual([expect.stringContaining('256 g potassium metabisulfite')]);
  for (const cellar of ['telegram:7001', 'telegram:7002'])
    expect(
      await store.look(cellar, (view) => view.entries({ from: 0, to: 1000 * (NOW_s - 12 * HOUR_s) })),
    ).toEqual([]);
  expect(await store.waiting('telegram')).toEqual([]);
});
