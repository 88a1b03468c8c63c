import { expect, test } from 'vitest';
import { Visitor } from 'vite';
import { parse, sourceFiles } from './source-file.ts';
import type { SourceFile } from './source-file.ts';

const LONGEST = 250;
const MEDIAN = 60;

/** A table: constants and types, and not one function. It may be as long as its subject. */
function isData(file: SourceFile): boolean {
  let functions = 0;
  const count = (): void => void (functions += 1);
  new Visitor({
    FunctionDeclaration: count,
    FunctionExpression: count,
    ArrowFunctionExpression: count,
    ClassDeclaration: count,
  }).visit(file.program);
  return functions === 0 || file.path.startsWith('src/chat/reader/words/');
}

function tooLong(files: readonly SourceFile[]): string[] {
  return files
    .filter((file) => file.lines > LONGEST && !isData(file))
    .map((file) => `${file.path}: ${file.lines} lines`);
}

function median(files: readonly SourceFile[]): number {
  const sizes = files.map((file) => file.lines).toSorted((a, b) => a - b);
  return sizes[Math.floor(sizes.length / 2)] ?? 0;
}

test(`no file is over ${LONGEST} lines unless it is a table, because a long file holds two things`, () => {
  const code = [...sourceFiles('src'), ...sourceFiles('tests'), ...sourceFiles('.ci')];
  expect(tooLong(code)).toEqual([]);
});

test(`half of the files in src are at most ${MEDIAN} lines, so that each can be read in one look`, () => {
  expect(median(sourceFiles('src'))).toBeLessThanOrEqual(MEDIAN);
});

test('the program itself is under 60 lines: it joins parts and decides nothing', () => {
  const main = sourceFiles('src').filter((file) => file.path === 'src/main.ts');
  expect(main.map((file) => file.lines < 60)).toEqual([true]);
});

test('the rule finds a long file of code and lets a long table be', () => {
  const rows = 'export const X = [\n' + '  1,\n'.repeat(300) + '];\n';
  expect(tooLong([parse('src/core/rows.ts', rows)])).toEqual([]);
  expect(tooLong([parse('src/core/code.ts', `${rows}export function f(): void {}\n`)])).toHaveLength(1);
});
