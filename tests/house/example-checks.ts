import { parseSync } from 'vite';
import type { ESTree, ParseResult } from 'vite';

/** One line of an example: an expression and what it is said to give. */
export interface Check {
  readonly expression: string;
  readonly expected: string;
}

/** An example as code to run: `body` calls `check(number of the check, value)`. */
export interface Runnable {
  readonly imports: readonly { readonly names: string; readonly from: string }[];
  readonly body: string;
  readonly checks: readonly Check[];
}

/** Reads a block of lines `expression // => expected`; other statements run as they stand. */
export function runnable(code: string): Runnable {
  const { program, comments, errors } = parseSync('example.ts', code);
  if (errors.length > 0) throw new SyntaxError(`Cannot read the example: ${errors[0]?.message}\n${code}`);
  const imports: { names: string; from: string }[] = [];
  const checks: Check[] = [];
  const parts = program.body.map((statement): string => {
    const text = code.slice(statement.start, statement.end);
    if (statement.type === 'ImportDeclaration') {
      imports.push({
        names: text.replace(/^import\s+(type\s+)?|\s+from[\s\S]*$/g, ''),
        from: statement.source.value,
      });
      return '';
    }
    const expected =
      statement.type === 'ExpressionStatement' ? expectedAfter(code, statement, comments) : undefined;
    if (expected === undefined || statement.type !== 'ExpressionStatement') return text;
    const { start, end } = statement.expression;
    const expression = code.slice(start, end);
    checks.push({ expression, expected });
    return `await check(${checks.length - 1}, async () => (${expression}));`;
  });
  return { imports, body: parts.join('\n'), checks };
}

/** The comment `// => …` on the last line of a statement, with the comment lines below that carry it on. */
function expectedAfter(
  code: string,
  statement: ESTree.Statement,
  comments: ParseResult['comments'],
): string | undefined {
  const gap = (from: number, to: number): string => code.slice(from, to);
  const first = comments.findIndex(
    (comment) => comment.start >= statement.end && /^[ \t]*$/.test(gap(statement.end, comment.start)),
  );
  const comment = comments[first];
  if (comment === undefined || !/^\s*=>/.test(comment.value)) return undefined;
  let expected = comment.value.replace(/^\s*=>\s*/, '');
  for (let at = first + 1; !isWhole(expected) && at < comments.length; at += 1)
    expected += comments[at]?.value;
  return expected.trim();
}

function isWhole(expression: string): boolean {
  if (/^throws\s/.test(expression)) return true;
  return parseSync('expected.ts', `(${expression})`).errors.length === 0;
}
