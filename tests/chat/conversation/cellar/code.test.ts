import { expect, test } from 'vitest';
import fc from 'fast-check';
import { codeIn, codeOf, readCode } from '../../../../src/chat/conversation/cellar/code.ts';

const SECRET = '0123456789abcdef01234567';

test('a code holds its cellar and fits behind a link of the platform', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'grapheme', minLength: 1, maxLength: 30 }), (cellar) => {
      const code = codeOf({ cellar, secret: SECRET });
      if (code === undefined) return;
      // 1–64 letters, digits, _ and -: https://core.telegram.org/bots/features#deep-linking
      expect(code).toMatch(/^[A-Za-z0-9_-]{1,64}$/);
      expect(readCode(code)).toEqual({ cellar, secret: SECRET });
    }),
  );
});

test('the code of the longest chat of the platform can be made', () => {
  expect(codeOf({ cellar: 'telegram:-1002345678901234', secret: SECRET })).toBeDefined();
});

test.each(['', 'short', `${SECRET}0123456789`, '0123456789abcde!', '0123456789abcde_'])(
  'no code is made of a secret such as "%s"',
  (secret) => {
    expect(codeOf({ cellar: 'one', secret })).toBeUndefined();
  },
);

test.each(['', 'one', 'one-', `-${SECRET}`.slice(0, 8), `_ZZ-${SECRET}`, `a-b-${SECRET}`, `é-${SECRET}`])(
  'no code is read in "%s"',
  (text) => {
    expect(readCode(text)).toBeUndefined();
  },
);

test.each([
  [`join one-${SECRET}`, `one-${SECRET}`],
  [`/start one-${SECRET}`, `one-${SECRET}`],
  [`hello one-${SECRET}`, undefined],
  [`one-${SECRET}`, undefined],
  [`join one-${SECRET} and two`, undefined],
])('a message joins by its code and nothing else: %s', (text, code) => {
  expect(codeIn(text)).toBe(code);
});
