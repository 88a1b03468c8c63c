import { expect, test } from 'vitest';
import { Visitor } from 'vite';
import type { ESTree } from 'vite';
import { parse, placeOf, sourceFiles } from './source-file.ts';
import type { SourceFile } from './source-file.ts';

/** Names through which a clock, chance, the network, the environment or a screen comes in. */
const WORLD = new Set([
  'process',
  'fetch',
  'setTimeout',
  'setInterval',
  'setImmediate',
  'queueMicrotask',
  'console',
  'performance',
  'crypto',
  'globalThis',
  'require',
  'eval',
  'Temporal',
]);
const WORLD_MEMBERS = /^(Date\.now|Math\.random|navigator\..*|Atomics\..*)$/;
/** What a `Date` says in the time zone of the machine, and a number in its language. */
const LOCAL_METHODS = /^(get(FullYear|Month|Date|Day|Hours|Minutes|Seconds|TimezoneOffset)|toDateString)$/;
const LANGUAGE_METHODS = /^toLocale/;

function impurities(file: SourceFile): string[] {
  const found: string[] = [];
  const report = (node: { start: number }, what: string): void => {
    found.push(`${placeOf(file, node.start)} ${what}`);
  };
  const notNames = new Set<unknown>();
  new Visitor({
    MemberExpression(node) {
      if (node.computed || node.property.type !== 'Identifier') return;
      notNames.add(node.property);
      const path = `${file.text.slice(node.object.start, node.object.end)}.${node.property.name}`;
      if (WORLD_MEMBERS.test(path)) report(node, path);
    },
    Property: (node) => void (node.computed || node.shorthand || notNames.add(node.key)),
    TSPropertySignature: (node) => void notNames.add(node.key),
    CallExpression(node) {
      const method = methodName(node);
      if (method === undefined || node.arguments.length > 0) return;
      if (LANGUAGE_METHODS.test(method)) report(node, `${method}() without a language`);
      if (LOCAL_METHODS.test(method)) report(node, `${method}() in the machine's time zone`);
    },
    NewExpression(node) {
      const name = file.text.slice(node.callee.start, node.callee.end);
      if (node.arguments.length > 0) return;
      if (name === 'Date') report(node, 'new Date() reads the clock');
      if (name.startsWith('Intl.')) report(node, `new ${name}() takes the machine's language`);
    },
  }).visit(file.program);
  new Visitor({
    Identifier: (node) => void (WORLD.has(node.name) && !notNames.has(node) && report(node, node.name)),
  }).visit(file.program);
  return found;
}

function methodName(node: ESTree.CallExpression): string | undefined {
  const callee = node.callee;
  return callee.type === 'MemberExpression' && callee.property.type === 'Identifier'
    ? callee.property.name
    : undefined;
}

/** Top-level variables that can change: what one call leaves there, the next one reads. */
function changingState(file: SourceFile): string[] {
  return file.program.body.flatMap((statement) => {
    const declared = statement.type === 'ExportNamedDeclaration' ? statement.declaration : statement;
    const changes = declared?.type === 'VariableDeclaration' && declared.kind !== 'const';
    return changes ? [`${placeOf(file, statement.start)} changes between calls`] : [];
  });
}

/** Calls at the top level: a file that does something when it is merely imported. */
function doings(file: SourceFile): string[] {
  return file.program.body.flatMap((statement) =>
    statement.type === 'ExpressionStatement' && statement.directive === null
      ? [`${placeOf(file, statement.start)} does something on import`]
      : [],
  );
}

const pure = [...sourceFiles('src/core'), ...sourceFiles('src/chat')];

test('core and chat have no clock, chance, network, environment or screen, so that the same message always gets the same answer', () => {
  expect(pure.flatMap(impurities)).toEqual([]);
});

test('core keeps nothing between two calls, so that one tank never colours the next', () => {
  expect(sourceFiles('src/core').flatMap(changingState)).toEqual([]);
});

test('importing a file does nothing, so that a test or a second program can take any part', () => {
  // The one instance of mathjs is told its units where it is made.
  const passive = sourceFiles('src').filter(
    (file) => !/^src\/(main|ask)\.ts$|^src\/core\/units\//.test(file.path),
  );
  expect(passive.flatMap(doings)).toEqual([]);
});

test.each([
  'const x = Date.now();',
  'const x = new Date();',
  'const x = Math.random();',
  "const x = process.env['A'];",
  'const x = () => fetch("a");',
  'setTimeout(() => 1, 2);',
  'console.log(1);',
  'const x = performance.now();',
  'const x = new Intl.NumberFormat();',
  'const x = (1).toLocaleString();',
  'const x = new Date(0).getHours();',
  'const x = { a: process };',
])('the rule finds %s', (text) => {
  expect(impurities(parse('src/core/planted.ts', text))).toHaveLength(1);
});

test.each([
  'const x = new Date(0).toISOString();',
  'const x = { process: 1 }.process;',
  "new Intl.NumberFormat('en');",
])('the rule lets %s be', (text) => {
  expect(impurities(parse('src/core/planted.ts', text))).toEqual([]);
});

test('the rule finds a top-level let and a call on import', () => {
  expect(changingState(parse('src/core/planted.ts', 'export let x = 1;'))).toHaveLength(1);
  expect(doings(parse('src/edge/planted.ts', 'start();\nfunction start() {}'))).toHaveLength(1);
});
