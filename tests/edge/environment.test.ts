import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { afterEach, beforeEach, describe, expect, test } from 'vitest';

import { loadEnvironment } from '../../src/edge/environment.ts';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'environment-'));
});
afterEach(() => rmSync(folder, { recursive: true }));

describe('the environment', () => {
  test('is what is set when there is no .env', () => {
    expect(loadEnvironment(folder, { A: '1' })).toEqual({ A: '1' });
  });

  test('gets from .env what is not set, with comments and quotes understood', () => {
    writeFileSync(join(folder, '.env'), '# ours\nBOT_TOKEN="1:abc"\nLOG_LEVEL=debug # loud\n');
    const read = loadEnvironment(folder, { LOG_LEVEL: 'warn' });
    expect(read).toEqual({ BOT_TOKEN: '1:abc', LOG_LEVEL: 'warn' });
  });

  test('stops the start with a sentence when .env is no file', () => {
    mkdirSync(join(folder, '.env'));
    expect(() => loadEnvironment(folder, {})).toThrow(/^\.env cannot be read \(EISDIR\)/);
  });
});
