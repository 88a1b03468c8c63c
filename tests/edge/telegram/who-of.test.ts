import { expect, test } from 'vitest';

import { isServed, whoOf } from '../../../src/edge/telegram/who-of.ts';

test('a chat and the person in it have names of their own, and each chat is a cellar', () => {
  const who = { cellar: 'telegram:-100', chat: 'telegram:-100', person: 'telegram:7' };
  expect(whoOf({ id: -100, type: 'group' }, { id: 7, first_name: ' Rosa ' })).toEqual({
    ...who,
    name: 'Rosa',
  });
  expect(whoOf({ id: -100, type: 'group' }, { id: 7, first_name: ' ' })).toEqual(who);
});

test.each([
  ['private', true],
  ['group', true],
  ['supergroup', true],
  ['channel', false],
])('in a chat of the kind %s the bot speaks: %s', (type, served) => {
  expect(isServed({ id: 1, type })).toBe(served);
});
