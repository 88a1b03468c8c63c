import { describe, expect, test } from 'vitest';

import { Group } from './group.ts';
import { openScene } from './scene.ts';
import { wholeBot } from './whole-bot.ts';

const BEFORE = 'T4 40 hl pH 3.4 free 15 white, ML done';
const AFTER = 'T4 40 hl pH 3.4 free 25 white, ML done';

describe('an edited reading', () => {
  test('is answered anew where the first answer is gone, and the second edit finds that one', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    serve(wholeBot());
    rosa.sends(BEFORE);
    await rosa.reads(1);
    api.fail('editMessageText', { error_code: 400, description: 'Bad Request: message to edit not found' });
    rosa.edits(AFTER);
    expect(await rosa.reads(2)).toMatch(/^Corrected\.\nT4: weigh 48 g/);
    expect(rosa.texts[0]).toContain('117 g');
  });

  test('is tried again where the platform was not reached, and a second edit of the same text harms nothing', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    serve(wholeBot());
    rosa.sends(BEFORE);
    await rosa.reads(1);
    api.fail('editMessageText', 'receipt lost');
    rosa.edits(AFTER);
    await api.until(() => api.callsOf('editMessageText').length === 2);
    rosa.sends('thanks');
    await rosa.reads(2);
    expect(rosa.got.map(({ text, isEdited }) => [text.includes('48 g'), isEdited])).toEqual([
      [true, true],
      [false, undefined],
    ]);
  });

  test('has its answer corrected in place after a restart too', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    const whole = wholeBot();
    const first = serve(whole);
    rosa.sends(BEFORE);
    await rosa.reads(1);
    await first.stop();
    serve(whole);
    rosa.edits(AFTER);
    await api.until(() => api.callsOf('editMessageText').length === 1);
    await api.until(() => rosa.texts[0]?.startsWith('Corrected.\nT4: weigh 48 g') === true);
    expect(rosa.got).toHaveLength(1);
  });
});

test('what is said in a topic is answered there, with a file too', async () => {
  await using scene = await openScene();
  const { api, serve } = scene;
  serve(wholeBot());
  const group = new Group(api, -1_004_001_000_000, { thread: 77 });
  group.says('Ana', `@a_cellar_bot ${BEFORE}`);
  group.says('Ana', '/picture T4');
  await group.reads(2);
  expect(group.got.map(({ thread, replyTo }) => [thread, replyTo])).toEqual([
    [77, 1],
    [77, 2],
  ]);
  expect(api.callsOf('sendChatAction').at(-1)).toMatchObject({ message_thread_id: 77 });
});

test('a group of strangers hears nothing when somebody brings the bot into it', async () => {
  await using scene = await openScene();
  const { api, serve } = scene;
  serve(wholeBot({ is: 'invited', ids: ['telegram:9999'] }));
  const strange = new Group(api, -4002);
  strange.invites('Mal');
  strange.says('Mal', '@a_cellar_bot T4?');
  expect((await strange.reads(1)).text).toContain('This bot is for invited people');
  expect(strange.got).toHaveLength(1);
});

describe('a file', () => {
  test('that takes long to be sent keeps nobody in its chat from being answered', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    serve({ ...wholeBot(), times: { finish_s: 50 } });
    rosa.sends(BEFORE);
    await rosa.reads(1);
    api.fail('sendPhoto', 'hang');
    rosa.sends('picture T4');
    rosa.sends('T4?');
    expect(await rosa.reads(2)).toContain('T4');
  });

  test('is sent once it can be: after a refusal for a while, a cut, and a fault', async () => {
    await using scene = await openScene();
    const { api, serve } = scene;
    serve(wholeBot());
    const group = new Group(api, -4001);
    group.says('Ana', `@a_cellar_bot ${BEFORE}`);
    await group.reads(1);
    const slow = { error_code: 429, description: 'Too Many Requests', retry_after: 2 };
    api.fail('sendPhoto', slow, 'reset', { error_code: 502, description: 'Bad Gateway' });
    group.says('Ana', '/picture T4');
    expect((await group.reads(2)).file?.isPicture).toBe(true);
  });

  test('that the platform does not take is told of, and the next message is answered', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    serve(wholeBot());
    rosa.sends(BEFORE);
    await rosa.reads(1);
    api.fail('sendPhoto', { error_code: 400, description: 'Bad Request: PHOTO_INVALID_DIMENSIONS' });
    rosa.sends('picture T4');
    expect(await rosa.reads(2)).toContain('That did not work');
    rosa.sends('thanks');
    await rosa.reads(3);
  });

  test('is made once more where the process ended before it was handed over', async () => {
    await using scene = await openScene();
    const { api, rosa, serve } = scene;
    const whole = wholeBot();
    const first = serve({ ...whole, times: { finish_s: 50 } });
    rosa.sends(BEFORE);
    await rosa.reads(1);
    api.fail('sendDocument', 'hang');
    rosa.sends('export 2025 csv');
    await api.until(() => api.callsOf('sendDocument').length === 1);
    await first.stop();
    expect(rosa.got).toHaveLength(1);
    serve(whole);
    await rosa.reads(2);
    expect(rosa.got[1]?.file?.name).toMatch(/\.csv$/);
  });
});
