import { pathToFileURL } from 'node:url';
import { posix, resolve } from 'node:path';
import { describe, expect, test } from 'vitest';
import { differences } from './as-shown.ts';
import { exampleBlocks } from './example-blocks.ts';
import { runnable } from './example-checks.ts';
import { exportedFrom } from './exported.ts';
import { sourceFiles } from './source-file.ts';

type Scope = Record<string, unknown>;
type Check = (index: number, value: () => Promise<unknown>) => Promise<void>;

async function load(path: string): Promise<Scope> {
  return (await import(/* @vite-ignore */ pathToFileURL(resolve(path)).href)) as Scope;
}

/** Runs an example with everything its file exports in reach, and returns what does not hold. */
async function failures(code: string, exports: Scope, folder: string): Promise<string[]> {
  const example = runnable(code);
  const scope: Scope = { ...exports };
  for (const { names, from } of example.imports) {
    const loaded = await load(posix.join(folder, from));
    for (const [name] of names.matchAll(/[\w$]+/g)) scope[name] = loaded[name];
  }
  const found: string[] = [];
  const names = Object.keys(scope);
  const inScope = (body: string, ...more: string[]): ((...values: unknown[]) => unknown) =>
    // oxlint-disable-next-line no-implied-eval -- an example is code in a comment: there is no other way to run it
    new Function(...names, ...more, body) as (...values: unknown[]) => unknown;
  const evaluate = (expression: string): unknown =>
    inScope(`return (${expression});`)(...Object.values(scope));
  const check: Check = async (index, value) => {
    const { expression, expected } = example.checks[index] ?? { expression: '', expected: '' };
    found.push(...(await wrong(value, expected, evaluate)).map((one) => `${expression}: ${one}`));
  };
  await inScope(`return (async () => {${example.body}\n})();`, 'check')(...Object.values(scope), check);
  if (example.checks.length === 0) found.push('the example shows no result');
  return found;
}

async function wrong(
  value: () => Promise<unknown>,
  expected: string,
  evaluate: (expression: string) => unknown,
): Promise<string[]> {
  const thrown = /^throws\s+(\w+)/.exec(expected)?.[1];
  try {
    const actual = await value();
    return thrown === undefined ? differences(actual, expected, evaluate) : [`does not throw ${thrown}`];
  } catch (error) {
    return error instanceof Error && error.name === thrown ? [] : [`throws ${String(error)}`];
  }
}

for (const file of sourceFiles('src')) {
  const documented = exportedFrom(file).flatMap(({ name, doc }) =>
    exampleBlocks(doc).map((code, at) => [at === 0 ? name : `${name} (${at + 1})`, code] as const),
  );
  if (documented.length === 0) continue;
  describe(`the examples of ${file.path} give what they show`, () => {
    test.each(documented)('%s', async (_name, code) => {
      expect(await failures(code, await load(file.path), posix.dirname(file.path))).toEqual([]);
    });
  });
}

const planted = { double: (x: number) => ({ twice: 2 * x, all: [x, 'a'] }), third: 1 / 3, none: undefined };
const fail = (): never => {
  throw new RangeError('no');
};

test.each([
  'double(1.5) // => { twice: 3, all: [1.5, "a"] }',
  'const x = 2;\ndouble(x).twice // => 4',
  'third // => 0.333',
  'double(1) // => {\n//   twice: 2,\n//   all: [1, "a"],\n// }',
  'none // => undefined',
  'fail() // => throws RangeError',
])('an example that holds: %s', async (code) => {
  expect(await failures(code, { ...planted, fail }, '.')).toEqual([]);
});

test.each([
  'double(1.5) // => { twice: 3.1, all: [1.5, "a"] }',
  'double(1) // => { twice: 2 }',
  'double(1).all // => [1]',
  'double(1).all // => [1, "b"]',
  'third // => 0.334',
  'third // => 0',
  'third // => undefined',
  'third // => throws RangeError',
  'fail() // => 1',
  'third',
])('an example that does not hold is found: %s', async (code) => {
  expect(await failures(code, { ...planted, fail }, '.')).toHaveLength(1);
});
