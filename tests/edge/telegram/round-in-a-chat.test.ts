import { expect, test } from 'vitest';
import { Group } from './group.ts';
import { openScene } from './scene.ts';
import { wholeBot } from './whole-bot.ts';

const ROUND = Array.from({ length: 24 }, (_, at) => `T${at + 1} ${10 + at} hl pH 3.4 free 20 white, ML done`);

test('a round of 24 in a chat: few buttons, some lines at a time, each noted once; its pictures and its file', async () => {
  await using scene = await openScene();
  const { api, serve } = scene;
  serve(wholeBot());
  const group = new Group(api, -4002);
  group.invites('Ana');
  await group.reads(1);

  group.says('Ana', `@a_cellar_bot kmbs\n${ROUND.join('\n')}`);
  expect((await group.reads(2)).text).toMatch(/^In all .* the 24 rounded amounts/);
  group.taps('Ana', 'One by one');
  expect((await group.reads(3)).text).toBe('Which went in? 1–8 of 24:');
  group.taps('Ben', 'T2 23 g');
  expect((await group.reads(4)).text).toMatch(/^Noted 25: T2 23 g potassium metabisulfite/);
  group.taps('Ana', 'T2 23 g');
  expect((await group.reads(5)).text).toMatch(/^Already noted as 25 .*\(Ben\): T2\.$/);
  group.taps('Ana', 'All went in');
  const all = (await group.reads(6)).text;
  expect(all).toMatch(/^Noted 26–48: 23 additions/);
  expect(all).toContain('Noted before, and left: T2.');

  group.taps('Ana', 'Sheet as a picture');
  const pictures = [await group.reads(7), await group.reads(8)];
  expect(pictures.map(({ file }) => file?.isPicture)).toEqual([true, true]);
  group.taps('Ana', 'Sheet as a file');
  expect((await group.reads(9)).file).toMatchObject({
    isPicture: false,
    name: expect.stringMatching(/^weigh-out-.*\.xlsx$/),
  });
});
