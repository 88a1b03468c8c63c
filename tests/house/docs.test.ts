import { expect, test } from 'vitest';
import { exportedFrom, parametersOf } from './exported.ts';
import type { Exported } from './exported.ts';
import { exampleBlocks } from './example-blocks.ts';
import { parse, placeOf, sourceFiles } from './source-file.ts';
import { UNIT_WORD } from './unit-words.ts';

/** A bound, or the place a figure is from. */
const RANGE_OR_SOURCE =
  /\d ?(–|-|to|…) ?-?\d|\b(from .+ to|at least|at most|between|above|below|over|under|up to|never|positive|negative|not negative|finite|any (number|value)|range|source|sources|RangeError|table|standard|published|common practice|by definition|exact)\b|[<>≤≥]|@throws/i;

function what(exported: Exported): string {
  return `${placeOf(exported.file, exported.start)} ${exported.name}`;
}

/** A parameter that is a number, or an object some of whose own fields are. */
function takesNumbers(exported: Exported): boolean {
  return parametersOf(exported).some((parameter) =>
    /:\s*number\b/.test(exported.file.text.slice(parameter.start, parameter.end)),
  );
}

function missing(exported: Exported): string[] {
  const lacks: string[] = [];
  const { doc, kind, file } = exported;
  if (doc.replace(/@\w+/g, '').trim().length < 10) return [`${what(exported)}: no doc comment`];
  const core = file.path.startsWith('src/core/');
  if (kind !== 'function') return [];
  if (core && takesNumbers(exported)) {
    const signature = parametersOf(exported).map((one) => file.text.slice(one.start, one.end));
    const prose = doc.split('@example')[0] ?? '';
    if (!UNIT_WORD.test(`${prose} ${signature.join(' ')}`)) lacks.push('unit');
    if (!RANGE_OR_SOURCE.test(prose)) lacks.push('range or source');
  }
  if ((core || file.path.startsWith('src/chat/replies/')) && exampleBlocks(doc).length === 0)
    lacks.push('@example');
  return lacks.map((lack) => `${what(exported)}: no ${lack}`);
}

test('whatever a file offers says what it is; in core also its units, its range or source, and an example', () => {
  expect(sourceFiles('src').flatMap(exportedFrom).flatMap(missing)).toEqual([]);
});

const EXAMPLE = ' * @example\n * ```ts\n * f(1) // => 1\n * ```\n';
const CORE = 'src/core/planted.ts';
test.each([
  ['no doc comment', 'src/edge/planted.ts', 'export function f(): void {}'],
  ['no doc comment', 'src/edge/planted.ts', '/* no */ export const X = 1;'],
  ['no doc comment', 'src/edge/planted.ts', 'export type X = 1;'],
  ['no doc comment', 'src/edge/planted.ts', 'export interface X {}'],
  ['no doc comment', 'src/edge/planted.ts', '/** of the other */\nconst Y = 2;\nexport class X {}'],
  [
    'no unit',
    CORE,
    `/**\n * Turns it round, 0 to 1.\n${EXAMPLE} */\nexport function f(a: number): number {}`,
  ],
  ['no range', CORE, `/**\n * Turns mg/L round.\n${EXAMPLE} */\nexport function f(a: number): number {}`],
  ['no @example', CORE, '/** Turns text round. */\nexport const f = (a: string): string => a;'],
  ['no @example', 'src/chat/replies/planted.ts', '/** Turns text round. */\nexport function f(): void {}'],
])('the rule finds %s in %s', (lack, path, text) => {
  expect(exportedFrom(parse(path, text)).flatMap(missing)).toEqual([expect.stringContaining(lack)]);
});

test('the rule lets a documented function be', () => {
  const text = `/**\n * Free SO2 in mg/L, from 0 to 1,000.\n${EXAMPLE} */\nexport function f(free_mg_L: number): number {}`;
  expect(exportedFrom(parse(CORE, text)).flatMap(missing)).toEqual([]);
});
