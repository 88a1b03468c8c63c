import { describe, expect, test } from 'vitest';

import { readConfig } from '../../src/edge/config.ts';

const USUAL = {
  botApiRoot: 'https://api.telegram.org',
  logLevel: 'info',
  dataFile: 'data/cellar.db',
};

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
    ['a file is set', { DATA_FILE: 'other place/a.db' }, { ...USUAL, dataFile: 'other place/a.db' }],
    ['all are let in', { ALLOW: 'open' }, USUAL],
    ['only invited people are let in', { ALLOW: 'invited' }, { ...USUAL, allow: [] }],
    ['some people are let in', { ALLOW: '123, 4567' }, { ...USUAL, allow: [123, 4567] }],
    ['a port is set', { PORT: '8443' }, { ...USUAL, port: 8443 }],
    [
      'a webhook is set',
      { WEBHOOK_URL: 'https://cellar.example/in' },
      { ...USUAL, port: 8080, webhook: { url: 'https://cellar.example/in' } },
    ],
    [
      'a webhook is set with its secret and a port',
      { WEBHOOK_URL: 'https://cellar.example/in', WEBHOOK_SECRET: 'a_b-1', PORT: '0' },
      { ...USUAL, port: 0, webhook: { url: 'https://cellar.example/in', secret: 'a_b-1' } },
    ],
  ])('is understood when %s', async (_, environment, config) => {
    expect(await readConfig(environment)).toEqual(config);
  });

  test.each([
    ['BOT_TOKEN', '1:abc def'],
    ['BOT_TOKEN', '1:abc/../x'],
    ['BOT_API_ROOT', 'api.telegram.org'],
    ['BOT_API_ROOT', 'file:///etc'],
    ['LOG_LEVEL', 'loud'],
    ['DATA_FILE', 'data/'],
    ['WEBHOOK_URL', 'http://cellar.example/in'],
    ['WEBHOOK_URL', 'https://cellar.example'],
    ['WEBHOOK_SECRET', 'with a space'],
    ['ALLOW', 'everybody'],
    ['ALLOW', '@rosa'],
    ['ALLOW', '123;456'],
    ['PORT', '70000'],
    ['PORT', '-1'],
    ['PORT', '80.5'],
  ])(
    'stops the start with one sentence where %s is "%s", and does not repeat the value',
    async (name, value) => {
      const error = await readConfig({ [name]: value }).catch((thrown: unknown) => thrown);
      expect(error).toMatchObject({ name: 'OperatorError', exitStatus: 78 });
      const { message } = error as Error;
      expect(message).toMatch(new RegExp(`^${name} [^\n]+\\.$`));
      expect(message).not.toContain(value);
    },
  );

  test('names every variable that is wrong, each in a line', async () => {
    await expect(readConfig({ LOG_LEVEL: 'loud', PORT: 'x' })).rejects.toThrow(/^LOG_LEVEL .*\.\nPORT .*\.$/);
  });
});
