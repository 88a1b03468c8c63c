import { expect, test } from 'vitest';
import { readMessage } from '../../../src/chat/reader/read-message.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';

test.each([
  ['juan esta inconsciente', 'es', 'es'],
  ['juan esta inconsciente', 'pt', 'pt'],
  ['er ist bewusstlos', 'en', 'de'],
] as const)('%j in a chat in %s is an emergency in %s', (text, language, recognised) => {
  const understood = readMessage(text, { ...READER_DEFAULTS, language });
  expect(understood.readings.map(({ intent }) => intent)).toEqual(['emergency']);
  expect(understood.language).toBe(recognised);
});
