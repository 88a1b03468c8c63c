import { expect, test } from 'vitest';
import { checkLimit } from '../../../src/core/limits/check-limit.ts';
import { limitsFor } from '../../../src/core/limits/limits-for.ts';

// OIV-MA-C1-01 (Oeno 9/98), read: up to 4 g/L of reducing substances 150 red, 200 white and rosé; above 4 g/L 300.
test.each([
  [{ style: 'red' }, 150],
  [{ style: 'red', sugar_g_L: 4 }, 150],
  [{ style: 'red', sugar_g_L: 4.1 }, 300],
  [{ style: 'white' }, 200],
  [{ style: 'white', sugar_g_L: 4 }, 200],
  [{ style: 'rosé', sugar_g_L: 2 }, 200],
  [{ style: 'rosé', sugar_g_L: 5 }, 300],
  [{}, 150],
  [{ sugar_g_L: 12 }, 300],
  [{ category: 'sweet' }, 300],
  [{ category: 'sweet', style: 'white', sugar_g_L: 3 }, 200],
  [{ category: 'sparkling' }, 'sparkling'],
  [{ category: 'fortified', style: 'red' }, 'fortified'],
  [{ product: 'cider' }, 'cider'],
  [{ product: 'mead' }, 'mead'],
  [{ product: 'fruit-wine', style: 'red' }, 'fruit-wine'],
  [{ stage: 'must' }, 'must'],
] as const)('the limit of %j is %s', (facts, expected) => {
  const { total, none } = limitsFor(facts);
  expect(total?.limit_mg_L ?? none?.product).toBe(expected);
});

const AT_MOST_150 = { limit_mg_L: 150, operator: '<=' } as const;

test.each([
  [134.9, 'within'],
  [135, 'near'],
  [150, 'near'],
  [150.001, 'over'],
])('%d mg/L is %s a limit of 150', (total, standing) => {
  expect(checkLimit(total, AT_MOST_150)).toBe(standing);
});

test('a sum that is a hair off is the figure itself, on either side of the operator', () => {
  expect(checkLimit(150 + 1e-12, AT_MOST_150)).toBe('near');
  expect(checkLimit(346.5 - 1e-12, { limit_mg_L: 346.5, operator: '<' })).toBe('over');
  expect(checkLimit(346.499, { limit_mg_L: 346.5, operator: '<' })).toBe('near');
});

test('a total or a sugar that cannot be is refused', () => {
  expect(() => checkLimit(Number.NaN, AT_MOST_150)).toThrow(RangeError);
  expect(() => checkLimit(-1, AT_MOST_150)).toThrow(RangeError);
  expect(() => limitsFor({ sugar_g_L: -1 })).toThrow(RangeError);
  expect(() => limitsFor({ density_kg_L: 5 })).toThrow(RangeError);
});
