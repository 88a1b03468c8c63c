import { readFileSync } from 'node:fs';
import { Readable, PassThrough } from 'node:stream';
import { expect, test } from 'vitest';
import { runAsk } from '../../../src/edge/ask/run-ask.ts';

/**
 * The blocks of `jsonl` in the README: a line in, and below it part of the line that comes out, as often as it likes;
 * `together`: lines in, and at the end part of what comes out of the last.
 */
const PAIRS = [...readFileSync('README.md', 'utf8').matchAll(/```jsonl( [^\n]*)?\n([\s\S]*?)```/g)].flatMap(
  ([, options = '', block = '']) => {
    const lines = block.trim().split('\n');
    if (options.includes('together')) {
      const line = lines.slice(0, -1).join('\n');
      return [{ options: options.replace('together', '').trim(), line, shown: lines.at(-1) ?? '' }];
    }
    return lines.flatMap((line, at) =>
      at % 2 === 0 ? [{ options: options.trim(), line, shown: lines[at + 1] ?? '' }] : [],
    );
  },
);

/** What is shown, with each figure as one that agrees to the digits it shows. */
function expected(text: string): unknown {
  const marked = text.replaceAll(/(?<=[:[,] ?)-?\d+(\.\d+)?(?=[,}\]])/g, (figure) => `"#${figure}"`);
  return JSON.parse(marked, (_, value: unknown) => {
    const [, figure] = typeof value === 'string' ? (/^#(.+)$/.exec(value) ?? []) : [];
    if (figure === undefined) return value;
    const decimals = figure.split('.')[1]?.length ?? 0;
    return expect.closeTo(Number(figure), decimals === 0 ? 9 : decimals);
  });
}

async function ask(args: readonly string[], input: string): Promise<string> {
  const output = new PassThrough({ encoding: 'utf8' });
  let out = '';
  output.on('data', (chunk) => (out += String(chunk)));
  const now = (): number => Date.parse('2026-10-05T12:00:00Z');
  await runAsk({ args, input: Readable.from([input]), output, tell: () => undefined, now });
  return out;
}

test('the README has examples for scripts', () => {
  expect(PAIRS.length).toBeGreaterThan(1);
});

test.each(PAIRS)('README: $line', async ({ options, line, shown }) => {
  const args = ['--jsonl', ...options.split(' ').filter(Boolean)];
  const out = await ask(args, `${line}\n`);
  expect(JSON.parse(out.trim().split('\n').at(-1) ?? '')).toMatchObject(expected(shown) as object);
});

/** The table of languages, in the order of its rows: what is written, and the first line of what comes. */
const ROWS = [...readFileSync('README.md', 'utf8').matchAll(/^\| `(T4 12 hl [^`]+)` +\| `([^`]+)` +\|$/gm)];

test.each(['en', 'es', 'fr', 'it', 'de', 'pt'].map((language, at) => ({ language, row: ROWS[at] })))(
  'README: the job in $language',
  async ({ language, row }) => {
    const [, written = '', answered] = row ?? [];
    const out = await ask(
      ['--jsonl', '--language', language],
      `${JSON.stringify({ id: 'a', text: written })}\n`,
    );
    const { reply } = JSON.parse(out) as { reply: string };
    expect(reply.replaceAll(/[\u00a0\u202f]/g, ' ').split('\n')[0]).toBe(answered);
  },
);
