import { existsSync, readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import type { ESTree } from 'vite';
import { filesUnder, parse, placeOf, sourceFiles } from './source-file.ts';
import type { SourceFile } from './source-file.ts';

const FOLDER = 'tests/tables';

/** Rows of figures without a source: neither the row, nor anything that it stands in, names one. */
function unsourced(file: SourceFile): string[] {
  const found: string[] = [];
  const visit = (node: unknown, sourced: boolean): void => {
    if (!isNode(node)) return;
    if (node.type === 'ArrayExpression' && !sourced) found.push(...bareRows(file, node));
    const named = sourced || (node.type === 'ObjectExpression' && namesSource(node));
    for (const value of Object.values(node)) {
      if (Array.isArray(value)) value.forEach((one) => visit(one, named));
      else visit(value, named);
    }
  };
  for (const statement of file.program.body) visit(statement, false);
  return found;
}

/** The elements of a list that hold figures themselves and name no source. */
function bareRows(file: SourceFile, list: ESTree.ArrayExpression): string[] {
  return list.elements.flatMap((row) => {
    if (row?.type === 'ObjectExpression' && namesSource(row)) return [];
    if (row?.type !== 'ObjectExpression' && row?.type !== 'ArrayExpression') return [];
    const figures = file.text.slice(row.start, row.end);
    return /(^|[^\w.])\d/.test(figures) ? [`${placeOf(file, row.start)} ${figures.slice(0, 60)}`] : [];
  });
}

function namesSource(node: ESTree.ObjectExpression): boolean {
  return node.properties.some(
    (one) => one.type === 'Property' && /^['"]?(source|sources)['"]?$/.test(keyText(one.key)),
  );
}

function keyText(key: ESTree.Node): string {
  if (key.type === 'Identifier') return key.name;
  return key.type === 'Literal' ? String(key.value) : '';
}

function isNode(value: unknown): value is ESTree.Node {
  return typeof value === 'object' && value !== null && 'type' in value;
}

/** The tables as code, whether they are written as code or as JSON. */
function tables(): SourceFile[] {
  if (!existsSync(FOLDER)) return [];
  const json = filesUnder(FOLDER).filter((path) => path.endsWith('.json'));
  return [
    ...sourceFiles(FOLDER).filter((file) => !file.path.endsWith('.test.ts')),
    ...json.map((path) => parse(`${path}.ts`, `export const table = ${readFileSync(path, 'utf8')};`)),
  ];
}

test('every row of a table names its source, because a figure without one cannot be checked by anybody', () => {
  expect(tables().length).toBeGreaterThan(0);
  expect(tables().flatMap(unsourced)).toEqual([]);
});

test.each([
  ['export const T = [{ ph: 3.4, free: 20 }];', 1],
  ['export const T = [[3.4, 20], [3.5, 25]];', 2],
  ["export const T = [{ ph: 3.4, source: 'c1' }, { ph: 3.5 }];", 1],
  ["export const T = { source: 'c1', rows: [[3.4, 20], [3.5, 25]] };", 0],
  ["export const T = [{ ph: 3.4, source: 'c1' }];", 0],
  ["export const T = { 'source': 'c1', rows: [{ ph: 3.4 }] };", 0],
  ['export const NAMES = [{ name: "SO2" }];', 0],
])('%s: %i without a source', (text, times) => {
  expect(unsourced(parse('tests/tables/planted.ts', text))).toHaveLength(times);
});
