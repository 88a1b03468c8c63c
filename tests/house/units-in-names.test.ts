import { expect, test } from 'vitest';
import { Visitor } from 'vite';
import type { ESTree } from 'vite';
import { exportedFrom, parametersOf } from './exported.ts';
import { parse, placeOf, sourceFiles } from './source-file.ts';
import type { SourceFile } from './source-file.ts';
import { UNIT_WORD } from './unit-words.ts';

/** A unit at the end of a name. */
const UNIT =
  /(^|_)(L|hL|mL|g|kg|mg|mol|C|F|K|percent|share|ms|s|pK|mg_L|g_L|g_hL|mol_L|g_mol|(g|L|mL|mg)_per_[0-9A-Za-z_]+)(_[a-z]+)?$|At$|_at$|(^|_)(days|hours|minutes?)(_[a-z]+)?$/;
/** Pure numbers of chemistry and arithmetic, counts, and places in a text or a list. */
const BARE = new Set([
  'ph',
  'pH',
  'pK',
  'factor',
  'ratio',
  'fraction',
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
  'code', // of a character
  'start',
  'end',
  'index',
  'i',
  'offset',
  'from',
  'to',
  'next',
  'place',
  'rows',
  'tries',
  'columns',
  'position',
  'at', // a time in milliseconds since 1970, as in every `…At`
  'nextNumber',
  'nextEntry',
  'now', // a time in milliseconds since 1970
  'entry', // numbers of entries, and of people
  'corrects',
  'order',
  'by',
  'last', // how many of the newest
  'last_entry',
  'most',
  'since', // times in milliseconds since 1970
  'until',
  'empty',
  'later',
  'year', // of a calendar or a clock
  'month',
  'day',
  'weekday',
  'hour',
  'second',
]);

/**
 * Numbers without a unit in their name: fields of types, and parameters of exported functions. Where one works in any
 * unit, the comment of the field or the `@param` says so.
 */
function unitless(file: SourceFile): string[] {
  const found: string[] = [];
  const judge = (
    node: ESTree.Node,
    name: string,
    type: ESTree.TSTypeAnnotation | null | undefined,
    said: string,
  ) => {
    if (!isNumber(type) || BARE.has(name) || UNIT.test(name) || UNIT_WORD.test(said)) return;
    found.push(`${placeOf(file, node.start)} ${name}`);
  };
  new Visitor({
    TSPropertySignature(node) {
      if (node.key.type === 'Identifier')
        judge(node, node.key.name, node.typeAnnotation, commentOf(file, node));
    },
  }).visit(file.program);
  for (const exported of exportedFrom(file)) {
    for (const parameter of parametersOf(exported)) {
      if (parameter.type !== 'Identifier') continue;
      const said = new RegExp(`@param ${parameter.name}\\b[^@]*`).exec(exported.doc)?.[0] ?? '';
      judge(parameter, parameter.name, parameter.typeAnnotation, said);
    }
  }
  return found;
}

/** The comment right above a node, or behind it on its line. */
function commentOf(file: SourceFile, node: ESTree.Node): string {
  const close = file.comments.filter((comment) => {
    const gap = comment.end <= node.start ? [comment.end, node.start] : [node.end, comment.start];
    return /^;?\s*$/.test(file.text.slice(...gap)) && !/\n.*\n/.test(file.text.slice(...gap));
  });
  return close.map((comment) => comment.value).join(' ');
}

/** `number`, `number | undefined`. */
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
  'export const f = (mass: number | undefined) => mass;',
  'export interface A { readonly free?: number }',
  '/** Rounds it.\n * @param amount what to round */\nexport function f(amount: number): void {}',
])('the rule finds %s', (text) => {
  expect(unitless(parse('src/core/planted.ts', text))).toHaveLength(1);
});

test.each([
  'export function f(volume_L: number, ph: number, name: string, free_mg_L?: number): void {}',
  'export interface A {\n  /** In grams. */\n  readonly mass?: number;\n  readonly free: number; // mg/L\n}',
  '/** Rounds it.\n * @param amount in the unit of `step` */\nexport function f(amount: number): void {}',
])('the rule lets %s be', (text) => {
  expect(unitless(parse('src/core/planted.ts', text))).toEqual([]);
});
