import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { PassThrough, Readable } from 'node:stream';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { openSqliteStore } from '../../../src/edge/store/sqlite/open-sqlite-store.ts';
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

test('the law of a market is served, and a market that is not on file is refused', async () => {
  const { status, out, told } = await ask(['--region', 'eu', 'hi']);
  expect([status, told]).toEqual([0, []]);
  expect(out).toContain('Hello');
  const refused = await ask(['--region', 'atlantis', 'hi']);
  expect([refused.status, refused.out]).toEqual([2, '']);
  expect(refused.told.join('\n')).toContain('--region must be one of oiv, eu, uk');
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

describe('on a file', () => {
  let folder: string;
  let data: string;

  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'ask-'));
    data = join(folder, 'cellar.db');
  });

  afterEach(() => rmSync(folder, { recursive: true }));

  const logged = async (): Promise<unknown[]> => {
    const { status, out } = await ask(['--data', data, '--log']);
    expect(status).toBe(0);
    return out
      .split('\n')
      .filter((line) => line !== '')
      .map((line) => JSON.parse(line) as unknown);
  };

  test('what is said is noted, and printed by the log', async () => {
    expect(await ask(['--data', data, 'added 137 g kmbs T12'])).toMatchObject({
      status: 0,
      out: expect.stringContaining('137 g') as string,
      told: [],
    });
    const line =
      '{"chat":"c","id":1,"person":"Ana","at":"2026-10-05T13:00:00Z","text":"added 9 g kmbs T1"}\n';
    await ask(['--data', data, '--jsonl'], line + line);
    await ask(['--data', data, '--jsonl'], line);
    expect(await logged()).toEqual([
      expect.objectContaining({ entry: 1, vessel: 'tank 12', mass_g: 137, by: 'person 1' }),
      expect.objectContaining({
        entry: 2,
        vessel: 'tank 1',
        mass_g: 9,
        at: '2026-10-05T13:00:00+00:00',
        by: 'Ana',
      }),
    ]);
    const { out } = await ask(['--data', data, '--vessels']);
    expect(out).toMatch(/^\{"vessel":"tank 1",.*\n\{"vessel":"tank 12",.*\n$/);
  });

  test('a question waits in its chat from one run to the next', async () => {
    const say = (text: string) => ask(['--data', data, '--jsonl'], JSON.stringify({ chat: 'c', text }));
    await say('T4 pH 3.5 free 20');
    expect((await say('40 hl')).out).toContain('"measure":{"value":139,"unit":"g"}');
  });

  test('it is read beside a program that writes to it, and written by one at a time', async () => {
    const writer = await openSqliteStore(data, { now: () => 0, report: () => undefined });
    try {
      expect(await logged()).toEqual([]);
      const { status, out, told } = await ask(['--data', data, 'added 137 g kmbs T12']);
      expect([status, out, told]).toEqual([
        78,
        '',
        [expect.stringMatching(/^Another brimnote is writing to /)],
      ]);
    } finally {
      await writer.close();
    }
    expect(await logged()).toEqual([]);
  });

  test.each(['--log', '--vessels'])(
    '%s of a file that there is not says so, and makes none',
    async (option) => {
      const { status, told } = await ask(['--data', data, option]);
      expect([status, told]).toEqual([78, [`There is no cellar file ${data}: check --data.`]]);
      expect(existsSync(data)).toBe(false);
    },
  );

  test('the terminal writes what the log prints', () => {
    const options = { encoding: 'utf8', env: { DATA_FILE: data, USER: 'rosa' } } as const;
    const run = (program: string, args: string[], input = '') =>
      spawnSync(process.execPath, [program, ...args], { ...options, input });
    expect(run('src/main.ts', [], 'added 137 g kmbs T12\n').status).toBe(0);
    const { status, stdout } = run('src/ask.ts', ['--data', data, '--log']);
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toMatchObject({
      entry: 1,
      kind: 'addition',
      vessel: 'tank 12',
      mass_g: 137,
      by: 'rosa',
    });
  });
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
