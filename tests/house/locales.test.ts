import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { localeMessages, referredTo } from '../../.ci/locale-messages.ts';
import type { LocaleMessages } from '../../.ci/locale-messages.ts';
import { helpKeys } from '../../.ci/help-keys-of.ts';
import { sentenceKeys } from '../../.ci/sentence-keys-of.ts';
import { parse, sourceFiles } from './source-file.ts';
import type { SourceFile } from './source-file.ts';
import { allStrings, usedKeys } from './used-keys.ts';

const english = readFileSync('locales/en.ftl', 'utf8');
const messages = localeMessages(english);
const KEYS_FILE = 'src/chat/replies/sentence-keys.ts';
const speaking = [...sourceFiles('src/chat'), ...sourceFiles('src/edge')].filter(
  (file) => file.path !== KEYS_FILE,
);

function unknownKeys(files: readonly SourceFile[], known: LocaleMessages): string[] {
  return files
    .flatMap(usedKeys)
    .flatMap(({ place, key, shown }) =>
      [...known.keys()].some((one) => key.test(one)) ? [] : [`${place} ${shown} is no sentence`],
    );
}

function unusedKeys(files: readonly SourceFile[], ftl: string): string[] {
  const strings = files.flatMap(allStrings);
  const inside = referredTo(ftl);
  return [...localeMessages(ftl).keys()].filter(
    (key) => !inside.has(key) && !strings.some((one) => one.test(key)),
  );
}

/** Values that stand written out beside a key and are not the ones its sentence takes. */
function wrongValues(files: readonly SourceFile[], known: LocaleMessages): string[] {
  return files.flatMap(usedKeys).flatMap(({ place, key, shown, values, whole }) => {
    const takers = [...known].filter(([one]) => key.test(one)).map(([, taken]) => taken);
    if (values === undefined || takers.length === 0) return [];
    const lacking = (whole ? takers : []).flatMap((taken) => taken.filter((one) => !values.includes(one)));
    const idle = values.filter((one) => !takers.some((taken) => taken.includes(one)));
    return [
      ...lacking.map((one) => `${place} ${shown} lacks $${one}`),
      ...idle.map((one) => `${place} ${shown} takes no $${one}`),
    ];
  });
}

describe('sentences and code belong together', () => {
  test('every key that the code names is a sentence, because a missing one would leave a hole in a reply', () => {
    expect(unknownKeys(speaking, messages)).toEqual([]);
  });

  test('every sentence is said somewhere, so that a translator translates nothing in vain', () => {
    expect(unusedKeys([...speaking, ...sourceFiles('src/core')], english)).toEqual([]);
  });

  test('a sentence gets the values it takes and no others, because a number left out is a wrong instruction', () => {
    expect(wrongValues(speaking, messages)).toEqual([]);
  });

  test('the list of keys that the types are made from is up to date: else run node .ci/sentence-keys.ts', () => {
    expect(existsSync(KEYS_FILE) ? readFileSync(KEYS_FILE, 'utf8') : '').toBe(sentenceKeys(english));
    expect(readFileSync('src/chat/replies/help-keys.ts', 'utf8')).toBe(helpKeys(english));
  });
});

test.each(readdirSync('locales'))('%s says nothing that en.ftl does not say with the same values', (name) => {
  const others = localeMessages(readFileSync(`locales/${name}`, 'utf8'));
  const wanted = [...others.keys()].map((key) => [key, messages.get(key) ?? 'not in en.ftl']);
  expect(Object.fromEntries(others)).toEqual(Object.fromEntries(wanted));
});

describe('the rules find what is planted', () => {
  const ftl = 'greeting = Hello { $name }\nstep-a = A\nstep-b = B { greeting }\n';
  const find = <T>(rule: (files: SourceFile[], known: LocaleMessages) => T, text: string): T =>
    rule([parse('src/chat/planted.ts', text)], localeMessages(ftl));

  test.each([
    ["line('first', 'greting', { name })", 1],
    ["line('first', yes ? 'greeting' : 'farewell', { name })", 1],
    ['line(`first`, `stop-${x}`)', 1],
    ["line('first', 'greeting', { name })", 0],
    ["const x = { room: 'first', key: 'greting', values: {} }", 1],
    ["const x = { mark: '1', label: 'step-c', values: {} }", 1],
  ])('%s: %i unknown', (text, times) => {
    expect(find(unknownKeys, text)).toHaveLength(times);
  });

  test.each([
    ["line('first', 'greeting')", 1],
    ["line('first', 'greeting', { name, age })", 1],
    ["line('first', 'greeting', { nam })", 2],
    ["line('first', 'greeting', { ...all })", 0],
    ["line('first', 'greeting', { name: 'x' })", 0],
    ["line('first', 'step-a', { name: 'x' })", 1],
    ["const x = { ...line('first', 'greeting'), list: [] }", 0],
    ["const x = { key: 'step-a', values: { name: 'x' } }", 1],
    ["line('first', `step-${x}`, { age: 'x' })", 1],
  ])('%s: %i wrong values', (text, times) => {
    expect(find(wrongValues, text)).toHaveLength(times);
  });

  test('a sentence that nothing says, also where part of the key is put together', () => {
    const unused = (text: string): string[] => unusedKeys([parse('src/chat/planted.ts', text)], ftl);
    expect(unused("say('step-a')")).toEqual(['step-b']);
    expect(unused('say(`step-${name}`)')).toEqual([]);
  });

  test('a locale with a line that is none, a key that stands twice, or a reference into nothing', () => {
    expect(() => localeMessages('a = A\nb B\n')).toThrow(SyntaxError);
    expect(() => localeMessages('a = A\na = B\n')).toThrow(SyntaxError);
    expect(() => localeMessages('a = { b }\n')).toThrow(SyntaxError);
  });
});
