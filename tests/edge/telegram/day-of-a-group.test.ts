import { expect, test } from 'vitest';

import { Group } from './group.ts';
import { Person } from './person.ts';
import { openScene } from './scene.ts';
import { hastyClock } from './served-bot.ts';
import { wholeBot } from './whole-bot.ts';

const PNG = [0x89, 0x50, 0x4e, 0x47];
const begins = (bytes: Uint8Array | undefined, mark: readonly number[]): boolean =>
  mark.every((byte, at) => bytes?.[at] === byte);

test('a day of a group with five people: it speaks when it is called, to each of them, and keeps one log', async () => {
  await using scene = await openScene();
  const { api, serve } = scene;
  serve(wholeBot());
  const group = new Group(api, -4001);

  group.invites('Ana');
  expect((await group.reads(1)).text).toContain('Call me by my name, or reply to me');

  // Among themselves, it stays silent; called, it answers the message that called it.
  group.says('Ben', 'T4 was 15 yesterday?');
  group.says('Carla', 'lunch at 12');
  const first = group.says('Ana', '@a_cellar_bot T4 40 hl pH 3.4 free 15 white, ML done');
  const dose = await group.reads(2);
  expect(dose.text).toMatch(/^T4: weigh 117 g potassium metabisulfite/);
  expect(dose.replyTo).toBe(first);

  // One pending question each: the answers of two people do not mix.
  group.says('Ben', '@a_cellar_bot T5 pH 3.5 free 20 white, ML done');
  expect((await group.reads(3)).text).toMatch(/^T5: what volume\?/m);
  group.says('Carla', '/T6 30 hl free 18 white, ML done');
  expect((await group.reads(4)).text).toMatch(/^T6: what pH\?/m);
  group.replies('Ben', '20 hl');
  expect((await group.reads(5)).text).toMatch(/^T5: weigh/);
  group.replies('Carla', '3.3');
  expect((await group.reads(6)).text).toMatch(/^T6: weigh/);

  // Who is about to dose is seen by the others.
  group.says('Dov', '@a_cellar_bot T4 free 15');
  await group.reads(7);
  group.taps('Dov', 'I do this one');
  expect((await group.reads(8)).text).toContain('T4 is yours until');
  group.says('Eve', '@a_cellar_bot T4 free 14');
  expect((await group.reads(9)).text).toContain('T4: Dov is on it');

  // An edited reading corrects its answer in its place.
  const typo = group.says('Carla', '@a_cellar_bot T7 40 hl pH 3.4 free 51 white, ML done');
  expect((await group.reads(10)).text).not.toContain('weigh');
  group.edits('Carla', typo, '@a_cellar_bot T7 40 hl pH 3.4 free 15 white, ML done');
  await api.until(() => group.got[9]?.isEdited === true);
  expect(group.got[9]?.text).toMatch(/^Corrected\.\nT7: weigh 117 g/);
  expect(group.got).toHaveLength(10);

  group.says('Dov', '@a_cellar_bot added 117 g kmbs T4');
  expect((await group.reads(11)).text).toMatch(/^Noted \d+: T4 117 g/);

  // A picture with the words beside it, and an export as a document.
  group.says('Ana', '/picture@a_cellar_bot T4');
  const picture = await group.reads(12);
  expect(picture.file?.isPicture).toBe(true);
  expect(begins(picture.file?.bytes, PNG)).toBe(true);
  expect(picture.text).toContain('T4');
  group.says('Ana', '@a_cellar_bot export 2025 csv');
  const sheet = await group.reads(13);
  expect(sheet.file).toMatchObject({ isPicture: false, name: expect.stringMatching(/\.csv$/) });
  expect(new TextDecoder().decode(sheet.file?.bytes)).toContain('117');
  expect(new Set(api.callsOf('sendChatAction').map(({ action }) => action))).toEqual(
    new Set(['upload_photo', 'upload_document']),
  );

  // The log has everyone by name.
  group.says('Eve', '/today@a_cellar_bot');
  const today = (await group.reads(14)).text;
  for (const name of ['Ana', 'Ben', 'Carla', 'Dov']) expect(today).toContain(name);

  // The group becomes a supergroup: its cellar goes with it.
  group.becomes(-1_004_001_000_000);
  group.says('Ana', '@a_cellar_bot T4?');
  expect((await group.reads(1)).text).toContain('T4: 4\u202f000 L');
}, 30_000);

test('a sheet that is sent to the chat is shown, then taken', async () => {
  await using scene = await openScene();
  const { api, serve } = scene;
  // A second of ours is a quarter of an hour on the clock here, and what is shown can be taken for an hour: hers is ahead.
  const rosa = new Person(api, 7001, { begun_s: Math.round(hastyClock.now() / 1000) + 30_000 });
  serve(wholeBot());
  const bytes = new TextEncoder().encode(
    'vessel,volume,colour\nT1,20 hl,white\nT2,30 hl,red\nnothing here\n',
  );
  api.files.set('sheet', { path: 'documents/file_1.csv', bytes });
  const document = {
    file_id: 'sheet',
    file_unique_id: 'u',
    file_name: '../../../etc/passwd.csv',
    file_size: 60,
  };
  rosa.sends({ document });
  expect(await rosa.reads(1)).toContain('Vessels in the file: 2');
  expect(api.fetched).toEqual(['documents/file_1.csv']);
  expect(rosa.got[0]?.buttons).not.toEqual([]);
  rosa.taps(rosa.got[0]?.buttons[0]?.text ?? '');
  expect(await rosa.reads(2)).toContain('Taken');
  rosa.sends('vessels');
  expect(await rosa.reads(3)).toContain('T2');

  // A pH is a reading, and a list of vessels would drop it: the file is a round, and its vessels alone are one choice.
  const measured = 'vessel,volume,pH\nT1,20 hl,3.4\nT2,30 hl,3.5\nnothing here\n';
  api.files.set('round', { path: 'documents/file_2.csv', bytes: new TextEncoder().encode(measured) });
  rosa.sends({ document: { ...document, file_id: 'round' } });
  expect(await rosa.reads(4)).toContain('A round of 2 lines.\nNot understood, and left out: line 4');
  expect(rosa.got[3]?.buttons).toHaveLength(3);
});

test('who begins with a link of an invitation is in, and a stranger is not', async () => {
  await using scene = await openScene();
  const { api, rosa, serve } = scene;
  serve(wholeBot({ is: 'invited', ids: ['telegram:7001'] }));
  rosa.sends('T4 40 hl pH 3.4 free 15 white, ML done');
  expect(await rosa.reads(1)).toContain('T4: weigh 117 g');
  rosa.sends('invite guest');
  const invitation = await rosa.reads(2);
  const [, code = ''] = /https:\/\/t\.me\/a_cellar_bot\?start=([\w-]+)/.exec(invitation) ?? [];
  const mal = new Person(api, 7002);
  mal.sends('T4?');
  expect(await mal.reads(1)).toContain('This bot is for invited people');
  // Nothing that a stranger sends is fetched.
  mal.sends({ document: { file_id: 'sheet', file_unique_id: 'u', file_name: 'a.csv' } });
  mal.sends(`/start ${code}`);
  expect(await mal.reads(2)).toContain('as guest');
  mal.sends('T4?');
  expect(await mal.reads(3)).toContain('T4: 4\u202f000 L');
  expect([api.callsOf('getFile'), api.fetched]).toEqual([[], []]);
});

test('what is typed behind its name is answered with a dose to insert, or with nothing', async () => {
  await using scene = await openScene();
  const { api, serve } = scene;
  serve(wholeBot());
  const from = { id: 7001, is_bot: false, first_name: 'Rosa', language_code: 'en' };
  const ask = (id: string, query: string): void =>
    api.offer({ inline_query: { id, from, query, offset: '' } });
  ask('1', 'T4 40 hl pH 3.4 free 15 white, ML done');
  ask('2', 'hello');
  await api.until(() => api.callsOf('answerInlineQuery').length === 2);
  const of = (id: string) => api.callsOf('answerInlineQuery').find((call) => call['inline_query_id'] === id);
  expect(of('1')).toMatchObject({
    is_personal: true,
    results: [{ type: 'article', input_message_content: { message_text: expect.stringContaining('117 g') } }],
  });
  expect(of('2')).toMatchObject({ results: [] });
  const listed = () => api.callsOf('setMyCommands').map((call) => call['language_code']);
  await api.until(() => listed().length === 6);
  expect(listed()).toEqual([undefined, 'es', 'pt', 'fr', 'it', 'de']);
});
