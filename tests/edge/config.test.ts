import { describe, expect, test } from 'vitest';

import { readConfig } from '../../src/edge/config.ts';

const USUAL = { botApiRoot: 'https://api.telegram.org', logLevel: 'info', notServedYet: [] };

describe('the configuration', () => {
  test.each([
    ['nothing is set', {}, USUAL],
    ['variables are empty', { BOT_TOKEN: '', LOG_LEVEL: ' ', PORT: '' }, USUAL],
    ['others have variables of their own', { PATH: '/bin', BOT: 'x' }, USUAL],
    ['a token is set', { BOT_TOKEN: '1:abc-DEF_2' }, { ...USUAL, botToken: '1:abc-DEF_2' }],
    [
      'a root ends in slashes',
      { BOT_API_ROOT: 'http://127.0.0.1:81//' },
      { ...USUAL, botApiRoot: 'http://127.0.0.1:81' },
    ],
    ['a level is set', { LOG_LEVEL: 'silent' }, { ...USUAL, logLevel: 'silent' }],
    [
      'variables of later versions are set',
      { DATA_FILE: 'a.db', WEBHOOK_URL: 'https://cellar.example/in', WEBHOOK_SECRET: 'a_b-1', PORT: '8443' },
      { ...USUAL, notServedYet: ['DATA_FILE', 'WEBHOOK_URL', 'WEBHOOK_SECRET', 'PORT'] },
    ],
  ])('is understood when %s', (_, environment, config) => {
    expect(readConfig(environment)).toEqual(config);
  });

  test.each([
    ['BOT_TOKEN', '1:abc def'],
    ['BOT_TOKEN', '1:abc/../x'],
    ['BOT_API_ROOT', 'api.telegram.org'],
    ['BOT_API_ROOT', 'file:///etc'],
    ['LOG_LEVEL', 'loud'],
    ['WEBHOOK_URL', 'http://cellar.example/in'],
    ['WEBHOOK_SECRET', 'with a space'],
    ['PORT', '70000'],
    ['PORT', '-1'],
    ['PORT', '80.5'],
  ])('stops the start with one sentence where %s is "%s", and does not repeat the value', (name, value) => {
    const start = (): unknown => readConfig({ [name]: value });
    expect(start).toThrow(expect.objectContaining({ name: 'OperatorError', exitStatus: 78 }));
    expect(start).toThrow(new RegExp(`^${name} [^\n]+\\.$`));
    expect(start).not.toThrow(value);
  });

  test('names every variable that is wrong, each in a line', () => {
    expect(() => readConfig({ LOG_LEVEL: 'loud', PORT: 'x' })).toThrow(/^LOG_LEVEL .*\.\nPORT .*\.$/);
  });
});
