import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { inOrder, WARNING_ORDER } from '../../../src/core/dose/warnings.ts';

/** The codes as their type lists them: a list written out here would be forgotten, and a type is gone at run time. */
function codesOfTheType(): readonly string[] {
  const source = readFileSync('src/core/dose/answer.ts', 'utf8');
  const [, list = ''] = /export type WarningCode =([^;]+);/.exec(source) ?? [];
  return [...list.matchAll(/'([\w-]+)'/g)].map(([, code]) => code ?? '');
}

test('every warning has a place in the order, as one without would come first', () => {
  expect(codesOfTheType()).toContain('ph-unusual');
  expect(WARNING_ORDER.toSorted()).toEqual(codesOfTheType().toSorted());
});

test('danger to people comes first, then the law, then the wine, then what was assumed', () => {
  const codes = ['stage-assumed', 'ph-unusual', 'total-over-limit', 'gas-needs-training'] as const;
  const ordered = inOrder(codes.map((code) => ({ code, values: {} })));
  expect(ordered.map(({ code }) => code)).toEqual([...codes].toReversed());
});
