import { parseSync } from 'vite';
import type { ESTree } from 'vite';

/** Differences between a value and an expression that shows it; empty when they agree. */
export function differences(
  actual: unknown,
  shown: string,
  evaluate: (expression: string) => unknown,
): string[] {
  const source = `(${shown})`;
  const { program, errors } = parseSync('shown.ts', source);
  const statement = program.body[0];
  if (errors.length > 0 || statement?.type !== 'ExpressionStatement') return [`cannot read ${shown}`];
  const expression = statement.expression;
  const inner = expression.type === 'ParenthesizedExpression' ? expression.expression : expression;
  return compare(actual, inner, { source, evaluate, path: '' });
}

interface Context {
  readonly source: string;
  readonly evaluate: (expression: string) => unknown;
  readonly path: string;
}

function compare(actual: unknown, shown: ESTree.Expression, context: Context): string[] {
  const text = context.source.slice(shown.start, shown.end);
  const number = /^-?\s*[\d_]*\.?\d+(e[+-]?\d+)?$/i.test(text) ? text.replaceAll(/[\s_]/g, '') : undefined;
  if (number !== undefined) return agrees(actual, number) ? [] : [message(context, actual, text)];
  if (shown.type === 'ArrayExpression') return compareList(actual, shown, context);
  if (shown.type === 'ObjectExpression') return compareObject(actual, shown, context);
  const expected = context.evaluate(text);
  return Object.is(actual, expected) || deepEqual(actual, expected) ? [] : [message(context, actual, text)];
}

function compareList(actual: unknown, shown: ESTree.ArrayExpression, context: Context): string[] {
  if (!Array.isArray(actual) || actual.length !== shown.elements.length)
    return [message(context, actual, `a list of ${shown.elements.length}`)];
  return shown.elements.flatMap((element, at) => {
    if (element === null || element.type === 'SpreadElement')
      return [`${context.path}[${at}] cannot be shown so`];
    return compare(actual[at], element, { ...context, path: `${context.path}[${at}]` });
  });
}

function compareObject(actual: unknown, shown: ESTree.ObjectExpression, context: Context): string[] {
  if (typeof actual !== 'object' || actual === null) return [message(context, actual, 'an object')];
  const values = new Map(Object.entries(actual).filter(([, value]) => value !== undefined));
  const found = shown.properties.flatMap((property) => {
    if (property.type === 'SpreadElement') return [`${context.path} cannot be shown with a spread`];
    const key = context.source.slice(property.key.start, property.key.end).replaceAll(/['"]/g, '');
    const value = values.get(key);
    values.delete(key);
    return compare(value, property.value, {
      ...context,
      path: `${context.path}.${key}`,
    });
  });
  return [...found, ...[...values.keys()].map((key) => `${context.path}.${key} is not shown`)];
}

/** Equal within 1e-9 of itself; with decimals shown, within half of the last digit shown. */
function agrees(actual: unknown, shown: string): boolean {
  if (typeof actual !== 'number') return false;
  const expected = Number(shown);
  const [mantissa = '', exponent = '0'] = shown.toLowerCase().split('e');
  const decimals = mantissa.split('.')[1]?.length ?? 0;
  const half = decimals === 0 ? 0 : 0.5 * 10 ** (Number(exponent) - decimals);
  return Math.abs(actual - expected) <= Math.max(1e-9 * Math.abs(expected), half * (1 + 1e-9));
}

function deepEqual(a: unknown, b: unknown): boolean {
  return typeof a === 'object' && typeof b === 'object' && JSON.stringify(a) === JSON.stringify(b);
}

function message(context: Context, actual: unknown, expected: string): string {
  return `${context.path === '' ? 'the value' : context.path} is ${JSON.stringify(actual)}, not ${expected}`;
}
