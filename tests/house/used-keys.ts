import { Visitor } from 'vite';
import type { ESTree } from 'vite';
import { placeOf } from './source-file.ts';
import type { SourceFile } from './source-file.ts';

/** A place where code names a sentence: a pattern for its key, and its values where they are written out there. */
export interface UsedKey {
  readonly place: string;
  readonly key: RegExp;
  readonly shown: string;
  readonly values?: readonly string[];
  /** Whether these are all the values it will get: not where code adds to them, or where the key is put together. */
  readonly whole: boolean;
}

/** Functions that take a key, and which of their arguments it is; values and lists follow it. */
const TAKERS: Readonly<Record<string, number>> = { line: 1, listLine: 1, part: 0 };

/** Every place of a file where a key of a sentence is written, wholly or as a template. */
export function usedKeys(file: SourceFile): UsedKey[] {
  const found: UsedKey[] = [];
  const addedTo = new Set<ESTree.Node>();
  const add = (
    node: ESTree.Node | undefined,
    values: readonly string[] | undefined,
    whole: boolean,
  ): void => {
    if (node === undefined) return;
    for (const { pattern, shown } of patternsIn(node, file.text)) {
      const place = placeOf(file, node.start);
      found.push({
        place,
        key: pattern,
        shown,
        whole: whole && !shown.includes('${'),
        ...(values && { values }),
      });
    }
  };
  new Visitor({
    SpreadElement: (node) => void addedTo.add(node.argument),
    MemberExpression: (node) => void addedTo.add(node.object),
    CallExpression(node) {
      const callee = node.callee.type === 'Identifier' ? node.callee.name : '';
      const at = TAKERS[callee];
      if (at === undefined) return;
      const given = node.arguments[at + 1];
      const values = callee === 'listLine' ? ['list'] : given === undefined ? [] : keysOf(given);
      add(node.arguments[at], values, !addedTo.has(node));
    },
    ObjectExpression(node) {
      const member = (name: string): ESTree.Node | undefined =>
        node.properties.flatMap((one) =>
          one.type === 'Property' && nameOf(one) === name ? [one.value] : [],
        )[0];
      const values = member('values');
      if (values !== undefined) add(member('label') ?? member('key'), keysOf(values), false);
    },
  }).visit(file.program);
  return found;
}

/** Every string of a file, as patterns: what a key may be put together from. */
export function allStrings(file: SourceFile): RegExp[] {
  return patternsIn(file.program, file.text).map(({ pattern }) => pattern);
}

function patternsIn(node: ESTree.Node, text: string): { pattern: RegExp; shown: string }[] {
  const found: { pattern: RegExp; shown: string }[] = [];
  const add = (start: number, end: number, source: string): void =>
    void found.push({ pattern: new RegExp(`^${source}$`), shown: text.slice(start, end) });
  const collect = (one: ESTree.Node): void => {
    if (one.type === 'Literal' && typeof one.value === 'string') add(one.start, one.end, escaped(one.value));
    if (one.type === 'TemplateLiteral') {
      const parts = one.quasis.map((quasi) => escaped(quasi.value.cooked ?? ''));
      if (parts.some((part) => part.length > 2)) add(one.start, one.end, parts.join('.+'));
    }
  };
  if (node.type === 'ConditionalExpression') {
    return [...patternsIn(node.consequent, text), ...patternsIn(node.alternate, text)];
  }
  if (node.type !== 'Program') collect(node);
  else new Visitor({ Literal: collect, TemplateLiteral: collect }).visit(node);
  return found;
}

function keysOf(node: ESTree.Node): string[] | undefined {
  if (node.type !== 'ObjectExpression') return undefined;
  const whole = node.properties.every((one) => one.type === 'Property' && !one.computed);
  return whole ? node.properties.flatMap((one) => (one.type === 'Property' ? [nameOf(one)] : [])) : undefined;
}

function nameOf(property: ESTree.ObjectProperty | ESTree.AssignmentTargetProperty): string {
  return property.key.type === 'Identifier' ? property.key.name : '';
}

function escaped(text: string): string {
  return text.replaceAll(/[.*+?^${}()|[\]\\]/g, '\\$&');
}
