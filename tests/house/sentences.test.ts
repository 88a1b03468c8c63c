import { expect, test } from 'vitest';
import { Visitor } from 'vite';
import { parse, placeOf, sourceFiles } from './source-file.ts';
import type { SourceFile } from './source-file.ts';

/** Three words in a row: a sentence, or the start of one. */
const SENTENCE = /\p{L}{2,}[,;:]?\s+\p{L}+[,;:]?\s+\p{L}{2,}/u;

function sentences(file: SourceFile): string[] {
  const found: string[] = [];
  // What a programmer reads when a call was wrong is not what a person reads in a chat.
  const faults: [number, number][] = [];
  new Visitor({
    NewExpression(node) {
      if (file.text.slice(node.callee.start, node.callee.end).endsWith('Error'))
        faults.push([node.start, node.end]);
    },
  }).visit(file.program);
  const judge = (text: string, start: number): void => {
    if (!SENTENCE.test(text) || faults.some(([from, to]) => start >= from && start < to)) return;
    found.push(`${placeOf(file, start)} ${text.slice(0, 60)}`);
  };
  new Visitor({
    Literal: (node) => void (typeof node.value === 'string' && judge(node.value, node.start)),
    TemplateElement: (node) => judge(node.value.cooked ?? '', node.start),
  }).visit(file.program);
  return found;
}

test('no sentence stands in the code of the chat: what we say is in locales, what people write in words', () => {
  const code = sourceFiles('src/chat').filter((file) => !file.path.startsWith('src/chat/reader/words/'));
  expect(code.flatMap(sentences)).toEqual([]);
});

test('the rule finds a sentence and a template, and lets keys, faults and comments be', () => {
  const find = (text: string): number => sentences(parse('src/chat/planted.ts', text)).length;
  expect(find("const x = 'weigh out the salt';")).toBe(1);
  expect(find('const x = `weigh ${1} of the salt now`;')).toBe(1);
  expect(find("const x = 'weigh-out-the-salt'; // weigh out the salt")).toBe(0);
  expect(find("throw new RangeError('Cannot weigh less than nothing');")).toBe(0);
});
