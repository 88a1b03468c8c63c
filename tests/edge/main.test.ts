import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { afterEach, beforeEach, describe, expect, test } from 'vitest';

import { openSqliteReader } from '../../src/edge/store/sqlite/open-sqlite-reader.ts';
import { FakeBotApi, TOKEN } from './telegram/fake-bot-api.ts';
import { Person } from './telegram/person.ts';

const MAIN = join(import.meta.dirname, '..', '..', 'src', 'main.ts');

interface Run {
  readonly process: ChildProcess;
  /** What it wrote so far. */
  readonly out: () => string;
  readonly err: () => string;
  readonly exit: Promise<number | null>;
}

let folder: string;
let runs: Run[] = [];

/** Starts the program as `npm start` does, in an empty folder and with these variables alone. */
const start = (environment: Record<string, string>, input = ''): Run => {
  const program = spawn(process.execPath, [MAIN], { cwd: folder, env: environment });
  let out = '';
  let err = '';
  program.stdout.on('data', (part) => (out += String(part)));
  program.stderr.on('data', (part) => (err += String(part)));
  program.stdin.end(input);
  const exit = new Promise<number | null>((resolve) => program.on('close', resolve));
  const run = { process: program, out: () => out, err: () => err, exit };
  runs.push(run);
  return run;
};

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'main-'));
});

afterEach(() => {
  const shown = runs.map((run) => run.out() + run.err()).join('');
  for (const run of runs) run.process.kill('SIGKILL');
  runs = [];
  rmSync(folder, { recursive: true });
  if (shown.includes(TOKEN.slice(TOKEN.indexOf(':') + 1))) throw new Error('The token was shown');
});

/** What is in the file of the cellar. */
const kept = async (): Promise<{ masses_g: unknown[]; people: unknown }> => {
  const reader = await openSqliteReader(join(folder, 'data', 'cellar.db'), { now: () => 0 });
  try {
    return await reader.look('cellar', async (view) => ({
      masses_g: (await view.entries({})).map((entry) => 'mass_g' in entry && entry.mass_g),
      people: await view.people(),
    }));
  } finally {
    await reader.close();
  }
};

// Each starts a process, which takes a while on a machine that has other things to do.
describe('the program', { timeout: 30_000 }, () => {
  test('without a token answers what comes through the pipe, and ends', async () => {
    const run = start({}, 'T4 1450 gal pH 3.58 free 21\n');
    expect(await run.exit).toBe(0);
    expect(run.out()).toContain('T4: weigh 256 g potassium metabisulfite');
    expect(run.err()).toBe('');
  });

  test('keeps what was noted in the file, under the name of whoever runs it, and leaves it closed', async () => {
    for (const mass of [137, 138])
      expect(await start({ USER: 'rosa' }, `added ${mass} g kmbs T12\n`).exit).toBe(0);
    expect(readdirSync(join(folder, 'data')).toSorted()).toEqual(['cellar.db', 'cellar.db-writer']);
    expect(await kept()).toEqual({ masses_g: [137, 138], people: [{ number: 1, name: 'rosa' }] });
  });

  test('tells the time by the clock of the machine', async () => {
    // Without the zero in front that a reply leaves out before ten.
    const clock = (): string =>
      new Date().toLocaleTimeString('en-GB', { timeZone: 'Asia/Tokyo' }).slice(0, 5).replace(/^0/, '');
    const before = clock();
    const run = start({ TZ: 'Asia/Tokyo' }, 'added 137 g kmbs T12\n');
    expect(await run.exit).toBe(0);
    const told = [before, clock()].filter((time) => run.out().includes(time));
    expect(told).not.toEqual([]);
  });

  test('of two on one file the second ends with status 78 and a sentence, and a lock dies with its process', async () => {
    const first = spawn(process.execPath, [MAIN], { cwd: folder, env: {} });
    try {
      first.stdin.write('added 137 g kmbs T12\n\n');
      await new Promise((resolve) => first.stdout.once('data', resolve));
      const second = start({}, 'added 138 g kmbs T12\n');
      expect(await second.exit).toBe(78);
      expect(second.err()).toMatch(/^Another brimnote is writing to [^\n]+\n$/);
      expect(second.out()).toBe('');
    } finally {
      first.kill('SIGKILL');
    }
    expect(await start({}, 'added 139 g kmbs T12\n').exit).toBe(0);
    expect((await kept()).masses_g).toEqual([137, 139]);
  });

  test.each<[string, Record<string, string>, string]>([
    ['a file that is a folder', { DATA_FILE: '.' }, 'check DATA_FILE'],
    ['a file in what is no folder', { DATA_FILE: `${MAIN}/cellar.db` }, 'check DATA_FILE'],
    ['a wrong level', { LOG_LEVEL: 'loud' }, 'LOG_LEVEL is not a level'],
    ['a token with a blank in it', { BOT_TOKEN: `${TOKEN} x` }, 'BOT_TOKEN is not a bot token'],
  ])('ends with status 78 and one sentence for %s', async (_, environment, sentence) => {
    const run = start(environment);
    expect(await run.exit).toBe(78);
    expect(run.err()).toMatch(/^[^\n]+\n$/);
    expect(run.err()).toContain(sentence);
    expect(run.out()).toBe('');
  });

  test('ends with status 78 when the platform does not know the token, which comes from .env', async () => {
    await using api = await FakeBotApi.start();
    api.fail('getMe', { error_code: 401, description: 'Unauthorized' });
    writeFileSync(join(folder, '.env'), `BOT_TOKEN=${TOKEN}\nBOT_API_ROOT=${api.root}/\n`);
    const run = start({});
    expect(await run.exit).toBe(78);
    expect(run.err()).toContain('does not accept BOT_TOKEN (401)');
  });

  test('finishes what is in hand after SIGTERM, and ends with status 0', async () => {
    await using api = await FakeBotApi.start();
    const rosa = new Person(api, 7001, { begun_s: Math.floor(Date.now() / 1000) });
    api.fail('sendMessage', { error_code: 500, description: 'Internal Server Error' });
    const run = start({ BOT_TOKEN: TOKEN, BOT_API_ROOT: api.root });
    rosa.sends('T4 1450 gal pH 3.58 free 21');
    rosa.sends('thanks');
    await api.until(() => api.callsOf('sendMessage').length === 1);
    run.process.kill('SIGTERM');
    expect(await run.exit).toBe(0);
    expect(rosa.texts).toHaveLength(2);
    expect(rosa.texts[0]).toContain('T4: weigh 256 g potassium metabisulfite');
    expect(api.confirmed).toBe(1003);
  });

  test('says that it cannot reach the platform, goes on trying, and stops when it is told to', async () => {
    const run = start({ BOT_TOKEN: TOKEN, BOT_API_ROOT: 'http://127.0.0.1:9' });
    await new Promise<void>((resolve) => {
      run.process.stderr?.on('data', () => run.err().includes('again in 2 s') && resolve());
    });
    run.process.kill('SIGINT');
    expect(await run.exit).toBe(0);
    expect(run.err()).toContain('check the network and BOT_API_ROOT');
  });
});
