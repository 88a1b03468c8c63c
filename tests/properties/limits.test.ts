import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { LimitFacts } from '../../src/core/limits/limit-facts.ts';
import { LIMIT_ROWS } from '../../src/core/limits/limit-rows.ts';
import { limitsFor } from '../../src/core/limits/limits-for.ts';
import { REGIONS } from '../../src/core/limits/region.ts';
import { upTo } from './wines.ts';

const kinds: fc.Arbitrary<LimitFacts> = fc.constantFrom<LimitFacts>(
  {},
  { category: 'sweet' },
  { category: 'sparkling' },
  { category: 'sparkling', quality: true },
  { category: 'sparkling', quality: false },
  { category: 'fortified' },
  { product: 'cider' },
  { product: 'mead' },
  { product: 'fruit-wine' },
  { product: 'alcohol-free' },
);
const said: fc.Arbitrary<LimitFacts> = fc.constantFrom<LimitFacts>(
  {},
  { organic: true },
  { organic: 'made-with' },
  { designated_mg_L: 300 },
  { designated_mg_L: 350 },
  { designated_mg_L: 400 },
  { designated_mg_L: 123 },
  { pdo: true },
  { bulk: true },
  { uplift: true },
);
const sugars = fc.oneof(fc.constantFrom(0, 2, 4, 5, 9, 35, 45, 50, 100), upTo(0, 300));

const wines = fc
  .tuple(
    fc.constantFrom(...REGIONS),
    kinds,
    said,
    fc.constantFrom<LimitFacts>({ style: 'red' }, { style: 'white' }, { style: 'rosé' }),
    sugars,
    upTo(0.99, 1.1),
  )
  .map(([region, kind, more, style, sugar_g_L, density_kg_L]) => ({
    ...kind,
    ...more,
    ...style,
    region,
    sugar_g_L,
    density_kg_L,
  }));

test('every wine has limits of rows in force of its market, or a reason why there is none', () => {
  fc.assert(
    fc.property(wines, (facts) => {
      const { total, free, none } = limitsFor(facts);
      expect(none === undefined).toBe(total !== undefined || free !== undefined);
      for (const one of [total, free]) {
        if (one === undefined) continue;
        const row = LIMIT_ROWS.find(({ id }) => id === one.rule);
        expect(row?.status).toBe('in-force');
        expect(one.region).toBe(facts.region);
        expect(one.limit_mg_L).toBeGreaterThan(0);
        expect(one.confidence).toBe(row?.checked === 'memory' ? 'unconfirmed' : 'read');
      }
    }),
    { numRuns: 5000, seed: 51 },
  );
});

test('what nobody said is taken at its strictest: saying it never makes a limit lower', () => {
  fc.assert(
    fc.property(
      wines,
      fc.subarray(['style', 'sugar_g_L', 'density_kg_L', 'quality'] as const),
      (facts, unsaid) => {
        // A wine that is called sweet, or of a class, is taken at its word where nobody said its sugar.
        if (facts.category === 'sweet' || facts.designated_mg_L !== undefined || facts.pdo) return;
        const less: LimitFacts = Object.fromEntries(
          Object.entries(facts).filter(([name]) => !unsaid.some((one) => one === name)),
        );
        const [known, unknown] = [limitsFor(facts), limitsFor(less)];
        for (const of of ['total', 'free'] as const)
          expect(unknown[of]?.limit_mg_L ?? 0).toBeLessThanOrEqual(known[of]?.limit_mg_L ?? 0);
      },
    ),
    { numRuns: 5000, seed: 52 },
  );
});

test('a class of sweet wines that is not said never raises a limit, however sweet the wine', () => {
  const classes = LIMIT_ROWS.filter(({ designation }) => designation?.startsWith('sweet-')).map(
    ({ id }) => id,
  );
  fc.assert(
    fc.property(wines, ({ designated_mg_L: _unsaid, ...facts }) => {
      expect(classes).not.toContain(limitsFor(facts).total?.rule);
    }),
    { numRuns: 3000, seed: 53 },
  );
});

test('a declared year raises a limit only where the row takes it, and only when it is said', () => {
  fc.assert(
    fc.property(wines, ({ uplift: _unsaid, ...facts }) => {
      const [plain, declared] = [limitsFor(facts).total, limitsFor({ ...facts, uplift: true }).total];
      const row = LIMIT_ROWS.find(({ id }) => id === declared?.rule);
      const raised = (declared?.limit_mg_L ?? 0) - (plain?.limit_mg_L ?? 0);
      expect(plain?.uplift_mg_L).toBeUndefined();
      expect(raised).toBe(row?.uplift_mg_L ?? 0);
    }),
    { numRuns: 3000, seed: 54 },
  );
});
