import { expect, test } from 'vitest';

import type { FileWork } from '../../../src/edge/telegram/make-carry-files.ts';
import { openScene } from './scene.ts';
import { wholeBot } from './whole-bot.ts';

const READING = 'T4 40 hl pH 3.4 free 15 white, ML done';

/** A bot whose errands take until they are let go, and then end as they are told to. */
function slowBot(end: Partial<FileWork> = {}) {
  const whole = wholeBot();
  const { promise, resolve } = Promise.withResolvers<void>();
  if (whole.fileWork === undefined) throw new TypeError('the whole bot carries files');
  const { runErrand } = { ...whole.fileWork, ...end };
  const fileWork: FileWork = {
    ...whole.fileWork,
    runErrand: async (errand, message) => promise.then(() => runErrand(errand, message)),
  };
  return { bot: { ...whole, fileWork, times: { progress_s: 1 } }, letGo: resolve };
}

test('long work is told in one line in the words of the person, which says in the end that it is done', async () => {
  await using scene = await openScene();
  const { api, rosa, serve } = scene;
  const { bot, letGo } = slowBot();
  serve(bot);
  rosa.sends(READING);
  await rosa.reads(1);
  rosa.sends('idioma español');
  await rosa.reads(2);
  rosa.sends('export all csv');
  expect(await rosa.reads(3)).toBe('Estoy en ello …');
  letGo();
  await api.until(() => api.callsOf('sendDocument').length === 1);
  await api.until(() => rosa.texts[2] === 'Hecho.');
  expect(rosa.texts.filter((text) => text === 'Hecho.')).toHaveLength(1);
});

test('its line says so where it fails, and nothing else does', async () => {
  await using scene = await openScene();
  const { api, rosa, serve } = scene;
  const failed = async () => ({
    said: [{ text: 'That did not work', buttons: [] }],
    isFailed: true as const,
  });
  const { bot, letGo } = slowBot({ runErrand: failed });
  serve(bot);
  rosa.sends(READING);
  await rosa.reads(1);
  rosa.sends('export all csv');
  expect(await rosa.reads(2)).toBe('Working on it …');
  letGo();
  await api.until(() => rosa.texts[1]?.startsWith('That did not work, and nothing was written') === true);
  rosa.sends('thanks');
  await rosa.reads(3);
  expect(rosa.texts).toHaveLength(3);
});

test('where the line cannot be sent, what went wrong is said all the same', async () => {
  await using scene = await openScene();
  const { api, rosa, serve } = scene;
  const failed = async () => ({
    said: [{ text: 'That did not work', buttons: [] }],
    isFailed: true as const,
  });
  const { bot, letGo } = slowBot({ runErrand: failed });
  serve(bot);
  rosa.sends(READING);
  await rosa.reads(1);
  api.fail('sendMessage', { error_code: 400, description: 'Bad Request: planted' });
  rosa.sends('export all csv');
  await api.until(() => api.callsOf('sendMessage').length === 2);
  letGo();
  expect(await rosa.reads(2)).toBe('That did not work');
});

test('what takes no time is told by nothing but its file', async () => {
  await using scene = await openScene();
  const { api, rosa, serve } = scene;
  serve(wholeBot());
  rosa.sends(READING);
  await rosa.reads(1);
  rosa.sends('export all csv');
  await api.until(() => api.callsOf('sendDocument').length === 1);
  expect(api.callsOf('sendMessage')).toHaveLength(1);
});
