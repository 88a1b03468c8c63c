import { describe, expect, test } from 'vitest';

import type { Content } from '../../../src/chat/conversation/ports.ts';
import { languageOf } from '../../../src/edge/telegram/language-of.ts';
import { toMessage } from '../../../src/edge/telegram/to-message.ts';
import { readUpdates } from '../../../src/edge/telegram/update.ts';

const NOW = 1_767_000_100_000;
const FROM = { id: 7001, is_bot: false, first_name: 'Rosa', language_code: 'pt-BR' };
const CHAT = { id: 7001, type: 'private', first_name: 'Rosa' };
const MESSAGE = { message_id: 12, date: 1_767_000_000, chat: CHAT, from: FROM };
const WHO = { cellar: 'telegram:7001', chat: 'telegram:7001', person: 'telegram:7001', name: 'Rosa' };

const arrive = (content: object): ReturnType<typeof toMessage> => {
  const [update] = readUpdates([{ update_id: 900, ...content }]);
  return update && toMessage(update, NOW);
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
        language: 'pt',
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
        language: 'pt',
        content: { kind: 'press', key: 'working:3' },
      },
    });
  });

  test('that was edited, at the time of the edit and with an id of its own', () => {
    const edited_message = { ...MESSAGE, text: 'T4 1540 gal', edit_date: 1_767_000_060 };
    expect(arrive({ edited_message })?.message).toMatchObject({
      id: 'message 12 edited 1767000060',
      at: 1_767_000_060_000,
      content: { kind: 'unreadable', what: 'edited' },
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

describe('an update is passed over', () => {
  const group = { ...CHAT, id: -100, type: 'supergroup' };
  test.each<[string, object]>([
    ['a kind that nobody knows', { something_new: { a: 1 } }],
    ['a poll answer', { poll_answer: { poll_id: '1' } }],
    ['a pinned message', { message: { ...MESSAGE, pinned_message: MESSAGE } }],
    ['a message in a group', { message: { ...MESSAGE, chat: group, text: 'T4 1450 gal' } }],
    ['a tap in a group', { callback_query: { id: '1', from: FROM, message: { chat: group }, data: 'x' } }],
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
