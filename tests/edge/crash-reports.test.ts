import { spawn } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, test } from 'vitest';

import { TOKEN } from './telegram/token.ts';

const MAIN = join(import.meta.dirname, '..', '..', 'src', 'main.ts');
const WEBHOOK_SECRET = 'a-made-up-secret';
/** Soon after the start something happens that no part of the program expects. */
const HAPPENS = {
  'an error that nobody catches, with the token in it': `throw new Error('planted: ' + ${JSON.stringify(TOKEN)})`,
  'a rejection that nobody handles': `Promise.reject(new Error('planted: ' + ${JSON.stringify(TOKEN)}))`,
  'memory that runs out': 'const all = []; for (;;) all.push(new Array(1e6).fill(all.length))',
  'an abort': 'process.abort()',
  'somebody who asks for a report': `process.report.writeReport(); process.exit(1)`,
} as const;

/** When the program has read its token, or has not within ten seconds. */
const WHEN_STARTED = `
  const begun = Date.now();
  setInterval(() => {
    if (process.env.BOT_TOKEN !== undefined && Date.now() < begun + 10_000) return;
`;

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'crash-'));
});
afterEach(() => rmSync(folder, { recursive: true }));

const SLOW = { timeout: 60_000 };

test.each(Object.entries(HAPPENS))(
  'neither a report nor a line shows the token after %s',
  SLOW,
  async (_, code) => {
    const planted = `data:text/javascript,${encodeURIComponent(WHEN_STARTED + code + '}, 100)')}`;
    const reports = ['--report-uncaught-exception', '--report-on-fatalerror', '--report-on-signal'];
    const args = [
      ...reports,
      `--report-directory=${folder}`,
      '--max-old-space-size=60',
      '--import',
      planted,
      MAIN,
    ];
    // Nobody listens there.
    const env = { BOT_TOKEN: TOKEN, WEBHOOK_SECRET, BOT_API_ROOT: 'http://127.0.0.1:9' };
    const program = spawn('/bin/sh', ['-c', 'ulimit -c 0; exec "$0" "$@"', process.execPath, ...args], {
      cwd: folder,
      env,
    });
    let shown = '';
    for (const stream of [program.stdout, program.stderr])
      stream.on('data', (part) => (shown += String(part)));
    await new Promise((resolve) => program.on('close', resolve));
    const written = readdirSync(folder).filter((name) => name.endsWith('.json'));
    for (const name of written) shown += readFileSync(join(folder, name), 'utf8');
    const isReported = !/planted|abort/.test(code);
    expect(written.length > 0 || !isReported).toBe(true);
    expect(shown).not.toBe('');
    expect(shown).not.toContain(TOKEN.slice(TOKEN.indexOf(':') + 1));
    expect(shown).not.toContain(WEBHOOK_SECRET);
  },
);
