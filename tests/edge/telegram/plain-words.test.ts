import { expect, test } from 'vitest';

import { plainWords } from '../../../src/edge/telegram/plain-words.ts';

test.each([
  ['/start', 'help'],
  ['/start telegram_3A7-0123456789abcdef', '/start telegram_3A7-0123456789abcdef'],
  ['/start@a_cellar_bot telegram_3A7-0123456789abcdef', '/start telegram_3A7-0123456789abcdef'],
  ['/START@a_cellar_bot', 'help'],
  ['/help', 'help'],
  ['/help@a_cellar_bot', 'help'],
  ['/help law', 'help law'],
  ['/help@a_cellar_bot law', 'help law'],
  ['/T4 1450 gal\npH 3.58', 'T4 1450 gal\npH 3.58'],
  ['T4 1450 gal', 'T4 1450 gal'],
  ['/', '/'],
  ['/20 hl', '/20 hl'],
  ['/usr/bin', '/usr/bin'],
  ['1/2 hl', '1/2 hl'],
  ['', ''],
])('"%s" is read as "%s"', (text, words) => {
  expect(plainWords(text)).toBe(words);
});
