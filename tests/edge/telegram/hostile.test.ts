import { expect, test } from 'vitest';

import { Group } from './group.ts';
import { Person } from './person.ts';
import { openScene, type Scene } from './scene.ts';
import { wholeBot } from './whole-bot.ts';

const DOSE = 'T4 40 hl pH 3.4 free 15 white, ML done';
const document = (fields: object = {}): Record<string, unknown> => ({
  document: { file_id: 'f', file_unique_id: 'u', file_name: 'a.csv', ...fields },
});

/** What somebody may do who means harm, and what comes of it. */
const TRIED: readonly [what: string, run: (scene: Scene) => Promise<void>][] = [
  [
    'a button of another chat, forged, does nothing in either',
    async ({ api, rosa }) => {
      rosa.sends(DOSE);
      await rosa.reads(1);
      const key = rosa.got[0]?.buttons.find(({ text }) => text === 'I added it')?.callback_data;
      const group = new Group(api, -4001);
      group.taps('Mal', 'I added it', key);
      expect((await group.reads(1)).text).not.toMatch(/Noted|117|T4/);
      rosa.sends('today');
      expect(await rosa.reads(2)).not.toContain('117 g');
    },
  ],
  [
    'a key that no button has is answered, and changes nothing',
    async ({ api, rosa }) => {
      const group = new Group(api, -4001);
      for (const key of ['../../x', '__proto__', 'a:1.1', 'x'.repeat(64)]) group.taps('Mal', '', key);
      await group.reads(4);
      rosa.sends('vessels');
      expect(await rosa.reads(1)).not.toMatch(/T\d+ ·/);
    },
  ],
  [
    'HTML and Markdown in names stay letters, and nothing is sent as markup',
    async ({ api }) => {
      const group = new Group(api, -4001, { title: '<a href="x">*_`[hill](http://b.example)' });
      group.says('*Ben* <b>_[x](http://b.example)', `@a_cellar_bot ${DOSE}`);
      await group.reads(1);
      group.says('*Ben* <b>_[x](http://b.example)', '/today');
      expect((await group.reads(2)).text).toContain('*Ben* <b>_[x](http://b.example)');
      expect(api.callsOf('sendMessage').filter((call) => 'parse_mode' in call || 'entities' in call)).toEqual(
        [],
      );
    },
  ],
  [
    'a path in the name of a file names nothing here',
    async ({ api, rosa }) => {
      api.files.set('f', { path: 'documents/file_1', bytes: new TextEncoder().encode('T1,20 hl\n') });
      rosa.sends(document({ file_name: '../../../../etc/passwd.csv' }));
      await rosa.reads(1);
      rosa.sends('import ../../etc/passwd.csv');
      expect(await rosa.reads(2)).toContain('There is no file');
      expect(api.fetched).toEqual(['documents/file_1']);
    },
  ],
  [
    'a path of the platform that leads elsewhere is not followed, and the person is told',
    async ({ api, rosa }) => {
      api.files.set('f', { path: '../../other/secret', bytes: new Uint8Array(3) });
      rosa.sends(document());
      await rosa.reads(1);
      expect(api.fetched).toEqual([]);
    },
  ],
  [
    'a file that the platform does not hand over is told of, and no error shows the token',
    async ({ api, rosa }) => {
      api.fail('getFile', 'gateway page', 'gateway page', {
        error_code: 400,
        description: 'Bad Request: file is gone',
      });
      api.files.set('f', { path: 'documents/file_1', bytes: new Uint8Array(3) });
      rosa.sends(document());
      await rosa.reads(1);
      expect(api.fetched).toEqual([]);
      rosa.sends(DOSE);
      expect(await rosa.reads(2)).toContain('117 g');
    },
  ],
  [
    'a file that says it is too long is not fetched',
    async ({ api, rosa }) => {
      rosa.sends(document({ file_size: 9 * 1024 * 1024 }));
      expect(await rosa.reads(1)).toContain('Nothing of it was taken');
      expect(api.callsOf('getFile')).toEqual([]);
    },
  ],
  [
    'a file that is longer than it says is not read to its end',
    async ({ api, rosa }) => {
      api.files.set('f', { path: 'documents/file_1', bytes: new Uint8Array(9 * 1024 * 1024) });
      rosa.sends(document({ file_size: 10 }));
      expect(await rosa.reads(1)).toContain('Nothing of it was taken');
    },
  ],
  [
    'a file that is no table is told to be none',
    async ({ api, rosa }) => {
      api.files.set('f', { path: 'documents/file_1', bytes: new Uint8Array(2000).fill(7) });
      rosa.sends(document({ file_name: 'a.xlsx' }));
      expect(await rosa.reads(1)).toContain('Nothing of it was taken');
    },
  ],
  [
    'a line of 4,096 characters is answered',
    async ({ rosa }) => {
      rosa.sends(`T4 ${'9'.repeat(4093)}`);
      await rosa.reads(1);
      rosa.sends(DOSE);
      expect(await rosa.reads(2)).toContain('117 g');
    },
  ],
  [
    'another chat is another cellar',
    async ({ api, rosa }) => {
      rosa.sends(DOSE);
      await rosa.reads(1);
      const mal = new Person(api, 7002);
      mal.sends('T4?');
      expect(await mal.reads(1)).toContain('I know nothing of T4');
      const group = new Group(api, -4001);
      group.says('Mal', '/T4?');
      group.says('Mal', '@a_cellar_bot T4?');
      expect((await group.reads(1)).text).toContain('I know nothing of T4');
    },
  ],
  [
    'who sends forty messages at once is told so once, and others are answered',
    async ({ api, rosa }) => {
      for (let at = 0; at < 40; at += 1) rosa.sends('help');
      const timo = new Person(api, 7002);
      timo.sends(DOSE);
      expect(await timo.reads(1)).toContain('117 g');
      await api.until(() => rosa.texts.some((text) => !text.includes(rosa.texts[0] ?? '')));
      expect(rosa.got.length).toBeLessThan(35);
    },
  ],
];

test.each(TRIED)('%s', async (_, run) => {
  await using scene = await openScene();
  scene.serve(wholeBot());
  await run(scene);
  expect(scene.api.broken).toEqual([]);
});
