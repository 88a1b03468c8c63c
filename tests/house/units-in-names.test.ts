import { expect, test } from 'vitest';
import { Visitor } from 'vite';
import type { ESTree } from 'vite';
import { parse, placeOf, sourceFiles } from './source-file.ts';
import type { SourceFile } from './source-file.ts';

/** A unit at the end of a name; `per` as in `g_per_100_mL`, the upper-case forms for constants. */
const UNIT =
  /_(L|hL|mL|g|kg|mg|mol|C|F|K|percent|share|ms|s|minutes|hours|mg_L|g_L|g_hL|mol_L|g_mol|mg_mmol|(g|L|mL|mg)_per_[0-9A-Za-z_]+)(_[a-z]+)?$/;
/** Pure numbers of chemistry and arithmetic, counts, and places in a text or a list. */
const BARE = new Set([
  'ph',
  'pH',
  'pK',
  'factor',
  'ratio',
  'fraction',
  'share',
  'value', // of a Quantity or a Measure: the unit is the field beside it
  'number',
  'count',
  'vessels',
  'containers',
  'tablets',
  'min', // of a bound: in the unit of what is bounded
  'max',
  'red', // usual targets: mg/L of molecular SO2
  'white',
  'sweet',
  'decimals',
  'digits',
  'start',
  'end',
  'index',
  'at', // a time in milliseconds since 1970, as in every `…At`
  'nextNumber',
  'code', // of a character
  'offset',
  'position',
  'length',
  'from',
  'to',
]);

function unitless(file: SourceFile): string[] {
  const found: string[] = [];
  const judge = (name: string, start: number): void => {
    if (!BARE.has(name) && !UNIT.test(name) && !name.endsWith('At'))
      found.push(`${placeOf(file, start)} ${name}`);
  };
  const named = (node: ESTree.BindingPattern | ESTree.ParamPattern): void => {
    if (node.type === 'Identifier' && isNumber(node.typeAnnotation)) judge(node.name, node.start);
  };
  const parameters = (node: { readonly params: readonly ESTree.ParamPattern[] }): void =>
    node.params.forEach(named);
  new Visitor({
    FunctionDeclaration: parameters,
    FunctionExpression: parameters,
    ArrowFunctionExpression: parameters,
    TSPropertySignature(node) {
      if (node.key.type === 'Identifier' && isNumber(node.typeAnnotation)) judge(node.key.name, node.start);
    },
    VariableDeclarator: (node) => named(node.id),
  }).visit(file.program);
  return found;
}

/** `number`, `number | undefined`, `readonly [number, number]`. */
function isNumber(annotation: ESTree.TSTypeAnnotation | null | undefined): boolean {
  const type = annotation?.typeAnnotation;
  if (type?.type === 'TSUnionType')
    return type.types.every((one) => one.type === 'TSNumberKeyword' || one.type === 'TSUndefinedKeyword');
  return type?.type === 'TSNumberKeyword';
}

test('a number carries its unit in its name, because 200 of the wrong unit looks just like 200 of the right one', () => {
  expect([...sourceFiles('src/core'), ...sourceFiles('src/chat')].flatMap(unitless)).toEqual([]);
});

test.each([
  'export function f(volume: number): void {}',
  'const f = (mass: number | undefined) => mass;',
  'export interface A { readonly free?: number }',
  'const strength: number = 3;',
])('the rule finds %s', (text) => {
  expect(unitless(parse('src/core/planted.ts', text))).toHaveLength(1);
});

test('the rule lets units, pure numbers and other types be', () => {
  const text = 'export function f(volume_L: number, ph: number, name: string, free_mg_L?: number): void {}';
  expect(unitless(parse('src/core/planted.ts', text))).toEqual([]);
});
