import { spawnSync } from 'node:child_process';
import { PassThrough, Readable } from 'node:stream';
import { expect, test } from 'vitest';
import { runAsk } from '../../../src/edge/ask/run-ask.ts';

async function ask(
  args: readonly string[],
  input = '',
): Promise<{ status: number; out: string; told: string[] }> {
  const output = new PassThrough({ encoding: 'utf8' });
  const told: string[] = [];
  let out = '';
  output.on('data', (chunk) => (out += String(chunk)));
  const status = await runAsk({
    args,
    input: Readable.from([input]),
    output,
    tell: (sentence) => told.push(sentence),
    now: () => Date.parse('2026-10-05T12:00:00Z'),
  });
  return { status, out, told };
}

test('one message prints the reply a person gets', async () => {
  const { status, out } = await ask(['T4 1450 gal pH 3.58 free 21']);
  expect([status, out.split('\n')[0]]).toEqual([0, 'T4: weigh 256 g potassium metabisulfite']);
});

test('wrong options have status 2, a sentence for whoever runs it and nothing on stdout', async () => {
  const { status, out, told } = await ask(['--colour', 'red']);
  expect([status, out]).toEqual([2, '']);
  expect(told.join('\n')).toContain('--colour');
});

test('an option that cannot be served yet is named, and the message is answered', async () => {
  const { status, out, told } = await ask(['--region', 'eu', 'hi']);
  expect([status, told]).toEqual([0, ['--region is not served yet; it changes nothing.']]);
  expect(out).toContain('Hello');
});

test('every line is answered in its order, a broken one in its place', async () => {
  const lines = Array.from({ length: 300 }, (_, at) =>
    at === 7 ? '{broken' : JSON.stringify({ id: at, text: `T${at} 20 hl pH 3.4 free 15` }),
  );
  const { out } = await ask(['--jsonl'], lines.join('\n'));
  const ids = out
    .trimEnd()
    .split('\n')
    .map((line) => (JSON.parse(line) as { id: number | null }).id);
  expect(ids).toEqual(lines.map((_, at) => (at === 7 ? null : at)));
});

test('the language of the run holds for lines that name none', async () => {
  const { out } = await ask(['--jsonl', '--language', 'de'], '{"id":1,"text":"T4 40 hl pH 3,4 frei 15"}\n');
  expect(JSON.parse(out)).toMatchObject({ understood: [{ fields: { ph: 3.4, free_mg_L: 15 } }] });
});

test('the program itself answers, and ends with the status', () => {
  const run = (...args: string[]) =>
    spawnSync(process.execPath, ['src/ask.ts', ...args], { encoding: 'utf8' });
  expect(run('T4 1450 gal pH 3.58 free 21')).toMatchObject({
    status: 0,
    stderr: '',
    stdout: expect.stringContaining('256 g') as string,
  });
  expect(run('--nonsense').status).toBe(2);
});
