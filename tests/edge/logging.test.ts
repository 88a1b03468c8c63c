import { HttpError } from 'grammy';
import { describe, expect, test } from 'vitest';

import { hideSecret } from '../../src/edge/hide-secret.ts';
import { createLog, type Log } from '../../src/edge/logging.ts';

const TOKEN = '4455667788:a-made-up-token-of-an-invented-cellar';
const SECRET = 'a-made-up-token';

const logged = (write: (log: Log) => void, level: 'info' | 'silent' = 'info'): string => {
  let lines = '';
  write(createLog({ level, secret: TOKEN, to: { write: (line) => void (lines += line) } }));
  return lines;
};

/** As the platform's client throws it when its logs are set to be talkative: the URL stands in the message. */
const networkError = (): HttpError => {
  const url = `https://api.telegram.org/bot${TOKEN}/sendMessage`;
  const cause = Object.assign(new Error(`request to ${url} failed`), { url, errno: 'ECONNRESET' });
  return new HttpError(`Network request for 'sendMessage' failed! request to ${url} failed`, cause);
};

describe('a log line', () => {
  test.each<[string, (log: Log) => void]>([
    ['the message of an error', (log) => log.error(networkError(), 'failed')],
    ['an error under a name of its own', (log) => log.error({ failure: networkError() }, 'failed')],
    [
      'the cause of a cause',
      (log) => log.warn({ err: new Error('a', { cause: new Error('b', { cause: networkError() }) }) }),
    ],
    ['a plain value, deep down', (log) => log.info({ a: [{ url: `x/bot${TOKEN}/y` }] })],
    ['the name of a field', (log) => log.info({ [TOKEN]: 1 })],
    ['the sentence', (log) => log.info(`calling ${TOKEN}`)],
    ['a URL that writes the colon its own way', (log) => log.info(encodeURIComponent(TOKEN))],
    ['the secret half alone', (log) => log.info(TOKEN.split(':')[1] ?? '')],
  ])('never holds the token, not even in %s', (_, write) => {
    const line = logged(write);
    expect(line).toContain('[secret]');
    expect(line).not.toContain(SECRET);
    expect(() => JSON.parse(line) as unknown).not.toThrow();
  });

  test('is one JSON object with a level, a time and the sentence', () => {
    const line = logged((log) => log.warn({ update: 7 }, 'it rained'));
    expect(JSON.parse(line)).toMatchObject({
      level: 40,
      time: expect.any(Number),
      update: 7,
      msg: 'it rained',
    });
  });

  test('is written only at its level and above', () => {
    expect(logged((log) => log.debug('x'))).toBe('');
    expect(logged((log) => log.fatal('x'), 'silent')).toBe('');
  });
});

describe('hideSecret()', () => {
  test('leaves a text alone where there is no secret', () => {
    expect(hideSecret(undefined)('all of it')).toBe('all of it');
    expect(hideSecret('')('all of it')).toBe('all of it');
  });

  test('does not take a short half for a secret', () => {
    expect(hideSecret('123:abc')('abc 123:abc')).toBe('abc [secret]');
  });
});
