import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { filesUnder } from './source-file.ts';

/** Absolute paths of one machine. */
const MACHINE_PATH = /(^|[^\w.~*/-])\/(w[o]rk|t[m]p|r[o]ot|h[o]me|f[a]rm|U[s]ers)(\/|\b)|\.\.\/s[h]ared\b/;
/** The project speaks of itself alone: not of how it came about, nor of who or what helped. */
const FOREIGN =
  /t[r]anscript|l[e]cture|\bthe (t[a]lk|c[o]urse)\b|\b(c[l]aude|c[h]atgpt|c[o]pilot|g[e]mini|l[l]m|a[i] assistant)\b/i;

function found(pattern: RegExp, path: string, text: string): string[] {
  return text
    .split('\n')
    .flatMap((line, at) => (pattern.test(line) ? [`${path}:${at + 1} ${line.trim().slice(0, 80)}`] : []));
}

const texts = filesUnder('.')
  .filter((path) => !/(^|\/)package-lock\.json$|\.log$|^\.env$/.test(path))
  .map((path) => [path, readFileSync(path, 'utf8')] as const);

test('no file names a path of one machine, because the next machine does not have it', () => {
  expect(texts.flatMap(([path, text]) => found(MACHINE_PATH, path, text))).toEqual([]);
});

/** Other languages have such words for other things: a reading, a price. */
const OTHER_LANGUAGES = /(reader\/words|locales|tests\/messages)\/(es|fr|it|de|pt)\b/;

test('no file speaks of anything but the project and its subject', () => {
  const english = texts.filter(([path]) => !OTHER_LANGUAGES.test(path));
  expect(english.flatMap(([path, text]) => found(FOREIGN, path, text))).toEqual([]);
});

test.each([
  ['/', 'work/main'],
  ['cd /', 'tmp && ls'],
  ["'/", "root/x'"],
  ['../', 'shared/stack.md'],
])('the rule finds a path such as %s%s', (start, end) => {
  expect(found(MACHINE_PATH, 'a', start + end)).toHaveLength(1);
});

test.each([
  ['as the trans', 'cript says'],
  ['see the lec', 'ture'],
  ['from the co', 'urse'],
])('the rule finds %s%s', (start, end) => {
  expect(found(FOREIGN, 'a', start + end)).toHaveLength(1);
});

test('the rule lets "of course", "a course of action" and "src/work" be', () => {
  expect(found(FOREIGN, 'a', 'of course, a course of action')).toEqual([]);
  expect(found(MACHINE_PATH, 'a', 'see src/work/ and 18/60 or g/home')).toEqual([]);
});
