import { readdirSync } from 'node:fs';
import { expect, test } from 'vitest';

const EXPECTED = [
  'DEVELOPERS.md',
  'Dockerfile',
  'LICENSE',
  'README.md',
  'locales',
  'package-lock.json',
  'package.json',
  'src',
  'tests',
  'tsconfig.json',
];
/** What git ignores: packages, a cellar's data, logs. */
const IGNORED = /^(node_modules|data|.*\.log)$/;

test('the top level holds what a newcomer looks for and nothing else', () => {
  const there = readdirSync('.').filter((name) => !name.startsWith('.') && !IGNORED.test(name));
  expect(there.toSorted()).toEqual(EXPECTED);
});
