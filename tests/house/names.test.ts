import { expect, test } from 'vitest';
import { filesUnder } from './source-file.ts';

const KEBAB = /^\.?[a-z0-9]+(-[a-z0-9]+)*(\.[a-z0-9]+(-[a-z0-9]+)*)*$/;
/** Names that say where things were put because nobody knew what they were. */
const SAYS_NOTHING = /(^|[-./])(utils?|helpers?|common|managers?|misc|lib|stuff)([-./]|$)/;

function badNames(paths: readonly string[]): string[] {
  return paths.filter((path) => SAYS_NOTHING.test(path) || path.split('/').some((part) => !KEBAB.test(part)));
}

test('files and folders are kebab-case and named for the one thing in them', () => {
  expect(badNames(['.ci', 'src', 'tests', 'locales'].flatMap(filesUnder))).toEqual([]);
});

test.each([
  'src/core/Dose.ts',
  'src/core/free_so2.ts',
  'src/core/utils.ts',
  'src/helpers/a.ts',
  'src/chat/chat-manager.ts',
])('the rule finds %s', (path) => {
  expect(badNames([path, 'src/core/dose/dose.ts', 'tests/messages/en.jsonl'])).toEqual([path]);
});
