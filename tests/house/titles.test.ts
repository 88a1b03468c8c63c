import { expect, test } from 'vitest';
import { Visitor } from 'vite';
import { parse, placeOf, sourceFiles } from './source-file.ts';
import type { SourceFile } from './source-file.ts';

/** Titles of single tests that are no sentence: fewer than three words. */
function bareTitles(file: SourceFile): string[] {
  const found: string[] = [];
  new Visitor({
    CallExpression(node) {
      if (node.callee.type !== 'Identifier' || !['test', 'it'].includes(node.callee.name)) return;
      const title = node.arguments[0];
      if (title?.type !== 'Literal' || typeof title.value !== 'string') return;
      if (title.value.trim().split(/\s+/).length < 3)
        found.push(`${placeOf(file, node.start)} ${title.value}`);
    },
  }).visit(file.program);
  return found;
}

test('the title of a test is a sentence, so that a failure says what no longer holds', () => {
  const tests = sourceFiles('tests').filter((file) => file.path.endsWith('.test.ts'));
  expect(tests.flatMap(bareTitles)).toEqual([]);
});

test('the rule finds a bare title and lets a sentence be', () => {
  expect(bareTitles(parse('tests/planted.test.ts', "test('volume', () => {});"))).toHaveLength(1);
  expect(bareTitles(parse('tests/planted.test.ts', "test('a volume is positive', () => {});"))).toEqual([]);
});
