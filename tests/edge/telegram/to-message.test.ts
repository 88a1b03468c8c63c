import { describe, expect, test } from 'vitest';

import type { Content } from '../../../src/chat/conversation/ports.ts';
import { languageOf } from '../../../src/edge/telegram/language-of.ts';
import { toMessage } from '../../../src/edge/telegram/to-message.ts';
import { readUpdates } from '../../../src/edge/telegram/update.ts';

const NOW = 1_767_000_100_000;
const FROM = { id: 7001, is_bot: false, first_name: 'Rosa', language_code: 'pt-BR' };
const CHAT = { id: 7001, type: 'private', first_name: 'Rosa' };
const ME = { id: 4455667788, username: 'a_cellar_bot' };
const MESSAGE = { message_id: 12, date: 1_767_000_000, chat: CHAT, from: FROM };
const WHO = {
  cellar: 'telegram:7001',
  chat: 'telegram:7001',
  person: 'telegram:7001',
  name: 'Rosa',
  language: 'pt',
  linkBegin: 'https://t.me/a_cellar_bot?start=',
  addressed: 'direct',
  nonce: expect.stringMatching(/^[0-9a-f]{24}$/),
} as const;

const arrive = (content: object): ReturnType<typeof toMessage> => {
  const [update] = readUpdates([{ update_id: 900, ...content }]);
  return update && toMessage(update, { received_at: NOW, me: ME });
};

describe('an update becomes a message', () => {
  test('with all that the conversation has to know', () => {
    expect(arrive({ message: { ...MESSAGE, text: 'T4 1450 gal' } })).toEqual({
      updateId: 900,
      received_at: NOW,
      chatId: 7001,
      message: {
        ...WHO,
        id: 'message 12',
        at: 1_767_000_000_000,
        content: { kind: 'text', text: 'T4 1450 gal' },
      },
    });
  });

  test('that is a press, with the time at which it came and the tap to acknowledge', () => {
    const message = { message_id: 11, date: 0, chat: CHAT };
    expect(arrive({ callback_query: { id: 'tap-1', from: FROM, message, data: 'working:3' } })).toEqual({
      updateId: 900,
      received_at: NOW,
      chatId: 7001,
      tapId: 'tap-1',
      message: {
        ...WHO,
        id: 'tap tap-1',
        at: NOW,
        content: { kind: 'press', key: 'working:3' },
      },
    });
  });

  test('that was edited, at the time of the edit and with an id of its own', () => {
    const edited_message = { ...MESSAGE, text: 'T4 1540 gal', edit_date: 1_767_000_060 };
    expect(arrive({ edited_message })?.message).toMatchObject({
      id: 'message 12 edited 1767000060',
      at: 1_767_000_060_000,
      content: {
        kind: 'edited',
        text: 'T4 1540 gal',
        original: 'message 12',
        original_at: 1_767_000_000_000,
      },
    });
    const caption = { ...MESSAGE, photo: [], caption: 'T4', edit_date: 1_767_000_060 };
    expect(arrive({ edited_message: caption })?.message.content).toEqual({
      kind: 'unreadable',
      what: 'edited',
    });
  });

  const photo = [{ file_id: 'f', file_unique_id: 'u', width: 90, height: 90 }];
  test.each<[string, object, Content]>([
    ['a photo', { photo }, { kind: 'unreadable', what: 'photo' }],
    ['a photo with words under it', { photo, caption: 'T4 1450 gal' }, { kind: 'unreadable', what: 'photo' }],
    ['a sticker', { sticker: {} }, { kind: 'unreadable', what: 'sticker' }],
    ['a voice message', { voice: {} }, { kind: 'unreadable', what: 'voice' }],
    ['a round video', { video_note: {} }, { kind: 'unreadable', what: 'voice' }],
    ['a file', { document: {} }, { kind: 'unreadable', what: 'file' }],
    [
      'an animation, which is a document too',
      { animation: {}, document: {} },
      { kind: 'unreadable', what: 'other' },
    ],
    ['a place', { location: {} }, { kind: 'unreadable', what: 'other' }],
    ['markup', { text: '<b>*T4*</b>' }, { kind: 'text', text: '<b>*T4*</b>' }],
    ['an empty text', { text: '' }, { kind: 'text', text: '' }],
  ])('that is %s', (_, fields, content) => {
    expect(arrive({ message: { ...MESSAGE, ...fields } })?.message.content).toEqual(content);
  });
});

describe('in a group', () => {
  const chat = { id: -100, type: 'supergroup', title: ' Hill\u202e <b>cellar</b> ' };
  const group = { ...MESSAGE, chat };
  const us = { id: ME.id, is_bot: true, first_name: 'brimnote' };
  const other = { id: 9, is_bot: true, first_name: 'other' };

  test.each<[string, object, string]>([
    ['what is said among others is overheard', { text: 'T4 1450 gal' }, 'overheard'],
    ['our name calls us', { text: '@A_Cellar_bot T4?' }, 'called'],
    ['our name at the end calls us', { text: 'T4?, @a_cellar_bot' }, 'called'],
    ['a longer name does not', { text: '@a_cellar_bot2 T4?' }, 'overheard'],
    ['a mail address does not', { text: 'me@a_cellar_bot T4?' }, 'overheard'],
    [
      'a mention without a name calls us',
      { text: 'brimnote T4?', entities: [{ type: 'text_mention', offset: 0, length: 8, user: us }] },
      'called',
    ],
    ['an answer to us calls us', { text: '20 hl', reply_to_message: { from: us } }, 'called'],
    ['an answer to another does not', { text: '20 hl', reply_to_message: { from: other } }, 'overheard'],
    ['a command calls us', { text: '/today' }, 'called'],
    ['a command with our name calls us', { text: '/today@a_cellar_bot' }, 'called'],
    ['a command for another bot does not', { text: '/today@b_cellar_bot' }, 'overheard'],
    ['a path does not', { text: '/usr/bin' }, 'overheard'],
    ['our name under a picture calls us', { photo: [], caption: '@a_cellar_bot' }, 'called'],
  ])('%s', (_, fields, addressed) => {
    expect(arrive({ message: { ...group, ...fields } })?.message.addressed).toBe(addressed);
  });

  test('the answer goes to the message, in its topic where it stands in one', () => {
    expect(arrive({ message: { ...group, text: 'x' } })).toMatchObject({ chatId: -100, replyTo: 12 });
    const topic = { ...group, text: 'x', message_thread_id: 5, is_topic_message: true };
    expect(arrive({ message: topic })).toMatchObject({ chatId: -100, replyTo: 12, threadId: 5 });
    const reply = { ...group, text: 'x', message_thread_id: 5 };
    expect(arrive({ message: reply })).not.toHaveProperty('threadId');
    const tap = { id: 't', from: FROM, message: topic, data: 'k' };
    expect(arrive({ callback_query: tap })).toMatchObject({
      replyTo: 12,
      threadId: 5,
      message: { addressed: 'called' },
    });
  });

  test('its title is shown on one line, and nothing in it turns what follows', () => {
    expect(arrive({ message: { ...group, text: 'x' } })?.message.title).toBe('Hill <b>cellar</b>');
  });

  const change = (before: string, after: string, more: object = {}): object => ({
    my_chat_member: {
      chat,
      from: FROM,
      date: 1_767_000_000,
      old_chat_member: { status: before, user: us },
      new_chat_member: { status: after, user: us, ...more },
    },
  });
  test.each([
    ['left', 'member', true],
    ['kicked', 'administrator', true],
    ['member', 'administrator', false],
    ['member', 'left', false],
    ['administrator', 'kicked', false],
  ])('from %s to %s we say who we are: %s', (before, after, isJoin) => {
    expect(arrive(change(before, after))?.isJoin ?? false).toBe(isJoin);
  });

  test.each([
    ['a list', { file_name: '../../etc/vessels.CSV' }, true],
    [
      'a spreadsheet without a name',
      { mime_type: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet' },
      true,
    ],
    ['a text that says it is a picture', { file_name: 'a.pdf', mime_type: 'image/png' }, false],
    ['a name that is none', { file_name: 7 }, false],
  ])('%s is a sheet: %s', (_, fields, isSheet) => {
    const document = { file_id: 'f', file_unique_id: 'u', ...fields };
    const file = arrive({ message: { ...MESSAGE, document } })?.file;
    expect(file).toEqual(isSheet ? { fileId: 'f' } : undefined);
    expect(arrive({ message: { ...group, document } })?.file).toBeUndefined();
  });
});

describe('an update is passed over', () => {
  const channel = { ...CHAT, id: -100, type: 'channel' };
  test.each<[string, object]>([
    ['a kind that nobody knows', { something_new: { a: 1 } }],
    ['a poll answer', { poll_answer: { poll_id: '1' } }],
    ['a pinned message', { message: { ...MESSAGE, pinned_message: MESSAGE } }],
    ['a message in a channel', { message: { ...MESSAGE, chat: channel, text: 'T4 1450 gal' } }],
    [
      'a tap in a channel',
      { callback_query: { id: '1', from: FROM, message: { chat: channel }, data: 'x' } },
    ],
    ['a question behind our name', { inline_query: { id: '1', from: FROM, query: 'T4', offset: '' } }],
    [
      'a tap without data',
      { callback_query: { id: '1', from: FROM, message: { chat: CHAT }, game_short_name: 'x' } },
    ],
    [
      'a tap under no message',
      { callback_query: { id: '1', from: FROM, inline_message_id: '1', data: 'x' } },
    ],
    ['a message of a bot', { message: { ...MESSAGE, from: { ...FROM, is_bot: true }, text: 'x' } }],
    ['a message of nobody', { message: { ...MESSAGE, from: undefined, text: 'x' } }],
    ['a live location that moves', { edited_message: { ...MESSAGE, location: {} } }],
    ['a message with a chat that is none', { message: { ...MESSAGE, chat: 'x', text: 'x' } }],
    ['a message with a time that is none', { message: { ...MESSAGE, date: 'x', text: 'x' } }],
  ])('that is %s', (_, content) => {
    expect(arrive(content)).toBeUndefined();
  });
});

test('an answer that is no list of numbered updates is refused', () => {
  expect(() => readUpdates({ a: 1 })).toThrow(/expected array/);
  expect(() => readUpdates([{ message: {} }])).toThrow(/update_id/);
});

test.each([
  ['en', 'en'],
  ['en-GB', 'en'],
  ['PT-br', 'pt'],
  ['es', 'es'],
  ['de-AT', 'de'],
  ['fr-CA', 'fr'],
  ['it', 'it'],
  ['nl', 'en'],
  ['', 'en'],
  [undefined, 'en'],
  ['constructor', 'en'],
])('the phone language %s is answered in %s', (tag, language) => {
  expect(languageOf(tag)).toBe(language);
});
