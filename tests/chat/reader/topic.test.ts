import { expect, test } from 'vitest';
import { readMessage } from '../../../src/chat/reader/read-message.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';

const LONG_THANKS = 'thanks for all of that, we are off to the harvest supper at the mill tonight';

test.each([
  ['?', 'help'],
  ['how do i use this', 'help'],
  ['what can you do', 'help'],
  ['/start', 'help'],
  ['help', 'help'],
  ['help wine', 'help-wine'],
  ['/help law', 'help-law'],
  ['Help with the law, please?', 'help-law'],
  ['help me with sulphur discs', 'help-solutions'],
  ['help stock', 'help-stock'],
  ['help stock solution', 'help-solutions'],
  ['picture help', 'help-pictures'],
  ['help T4', 'help'],
  ['help, the stock of tank 4 is out', 'help'],
  ['\u{1F44D}', 'thanks'],
  ['thanks a lot', 'thanks'],
  [LONG_THANKS, undefined],
  ['hello', 'greeting'],
  ['the supper at the mill is tonight', undefined],
])('%j is about: %s', (text, topic) => {
  const [reading] = readMessage(text, READER_DEFAULTS).readings;
  expect(reading).toMatchObject({ intent: 'chat', fields: {} });
  expect(reading?.topic).toBe(topic);
});
