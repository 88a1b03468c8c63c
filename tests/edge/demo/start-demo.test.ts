import { spawnSync } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { TOKEN } from '../telegram/fake-bot-api.ts';

const MAIN = join(import.meta.dirname, '..', '..', '..', 'src', 'main.ts');

/** Where what was compiled is kept between runs. */
const NODE_COMPILE_CACHE = join(tmpdir(), 'node-compile-cache');

let folder: string;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'demo-'));
});

afterEach(() => rmSync(folder, { recursive: true }));

/** Runs the program in a folder of its own, which is the one for temporary files too. */
function run(args: readonly string[], input: string, environment: Record<string, string> = {}) {
  return spawnSync(process.execPath, [MAIN, ...args], {
    cwd: folder,
    env: { TMPDIR: folder, NODE_COMPILE_CACHE, ...environment },
    input,
    encoding: 'utf8',
  });
}

// Each starts a process, which takes a while on a machine that has other things to do.
describe('npm start -- --demo', { timeout: 30_000 }, () => {
  test('stays in the terminal, and neither reads nor writes what is set for a real cellar', () => {
    const dataFile = join(folder, 'cellar.db');
    writeFileSync(dataFile, 'a real cellar');
    writeFileSync(join(folder, '.env'), 'LOG_LEVEL=loud\n');
    const { stdout, stderr, status } = run(['--demo'], 'yesterday\n\nadded 137 g kmbs T6\n', {
      BOT_TOKEN: TOKEN,
      DATA_FILE: dataFile,
      USER: 'rosa',
    });
    expect([stderr, status]).toEqual(['', 0]);
    expect(stdout).toMatch(/^\d+ · 9:42 · strikes \d+: one zero too many · Nora$/m);
    expect(stdout).toMatch(/^Noted \d+: T6 137 g potassium metabisulfite, /m);
    expect(readFileSync(dataFile, 'utf8')).toBe('a real cellar');
    expect(readdirSync(folder).toSorted()).toEqual(['.env', 'cellar.db']);
  });

  test('writes exports into a folder of its own, and has no backups to make', () => {
    const { stdout, status } = run(['--demo'], 'export all csv\n\nbackup\n');
    expect(status).toBe(0);
    const [, path = ''] = /^Written: (.*)$/m.exec(stdout) ?? [];
    expect(readFileSync(join(folder, path), 'utf8')).toContain('Nora');
    expect(readdirSync(folder)).toEqual([expect.stringMatching(/^brimnote-demo-/)]);
    expect(stdout).toContain('Whoever runs me makes the backups.');
  });

  test('greets nobody through a pipe, and begins anew each time', () => {
    for (let count = 0; count < 2; count += 1)
      expect(run(['--demo'], 'added 137 g kmbs T6\n').stdout).toMatch(/^Noted 99: /);
  });

  test.each([['--dmo'], ['demo'], ['--demo=yes']])(
    '%s is no option: a sentence, status 78, no file',
    (arg) => {
      const { stdout, stderr, status } = run([arg], 'today\n');
      expect([stdout, status]).toEqual(['', 78]);
      expect(stderr).toMatch(/^[^\n]+\.\nnpm start .*\nnpm start -- --demo .*\n/);
      expect(readdirSync(folder)).toEqual([]);
    },
  );
});
