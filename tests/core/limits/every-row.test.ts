import { describe, expect, test } from 'vitest';
import { dose } from '../../../src/core/dose/dose.ts';
import type { DoseAnswer } from '../../../src/core/dose/answer.ts';
import { LAW_TEXTS } from '../../../src/core/limits/law-texts.ts';
import { limitsFor } from '../../../src/core/limits/limits-for.ts';
import { LIMIT_ROWS } from '../../../src/core/limits/limit-rows.ts';
import { REGIONS } from '../../../src/core/limits/region.ts';
import { SULFITE_LIMITS, type LimitCase } from '../../tables/sulfite-limits.ts';

const CASES = SULFITE_LIMITS.flatMap(({ cases }) => cases);

/** 20 mg/L into a wine of such free and total SO2 that the one in question reaches `SO2_mg_L`. */
function dosedTo(SO2_mg_L: number, { facts, of }: LimitCase): DoseAnswer {
  const before = SO2_mg_L - 20;
  return dose({
    ...facts,
    volume_L: 1000,
    free_mg_L: of === 'free' ? before : 5,
    total_mg_L: of === 'free' ? before + 10 : before,
    additive: { id: 'potassium-metabisulfite' },
    target: { add_mg_L: 20 },
    targetStated: true,
    stage: 'finished',
    stageStated: true,
    basis: 'pk-1.81',
  });
}

const passed = (answer: DoseAnswer): readonly string[] =>
  answer.warnings
    .filter(({ code }) => code === 'total-over-limit' || code === 'free-over-limit')
    .map(({ values }) => String(values['rule']));

describe.each(SULFITE_LIMITS)('$source', ({ cases }) => {
  test.each(cases)('$rule: $passes passes, $fails does not', (one) => {
    const { facts, rule, of = 'total', passes, fails } = one;
    const found = limitsFor(facts)[of];
    expect(found).toMatchObject({ rule, of, confidence: 'read' });
    const within = dosedTo(passes, one);
    expect(passed(within)).toEqual([]);
    expect(within.capped).toBeUndefined();
    const over = dosedTo(fails, one);
    expect(passed(over)).toEqual([rule]);
    expect(over.limit).toMatchObject({ rule, of });
    expect(over.capped?.dose_mg_L).toBeLessThan(20);
  });
});

test('every row that was read and is in force stands in the table', () => {
  const rows = LIMIT_ROWS.filter(
    ({ checked, status, of }) => checked !== 'memory' && status === 'in-force' && of !== 'added',
  ).map(({ id }) => id);
  expect(rows.length).toBeGreaterThan(75);
  expect(rows.filter((id) => !CASES.some(({ rule }) => rule === id))).toEqual([]);
});

test('every row names a text, has an id of its own and a market that is known', () => {
  expect(new Set(LIMIT_ROWS.map(({ id }) => id)).size).toBe(LIMIT_ROWS.length);
  for (const { text, region, status, value } of LIMIT_ROWS) {
    expect(LAW_TEXTS[text].name.length).toBeGreaterThan(3);
    expect(REGIONS).toContain(region);
    expect(value === undefined).toBe(status === 'not-found');
  }
});

describe('a row from memory is unconfirmed and takes nothing away', () => {
  test.each([
    [{ region: 'nz', style: 'white', sugar_g_L: 3 }, 'nz-le35'],
    [{ region: 'br' }, 'br'],
    [{ region: 'hk' }, 'hk'],
    [{ region: 'eaeu' }, 'eaeu'],
    [{ region: 'ca' }, 'ca-tot-now'],
    [{ region: 'uk', category: 'sparkling', quality: true }, 'uk-qsp'],
    [{ region: 'eu', product: 'cider' }, 'eu-cider'],
    [{ region: 'eu', style: 'white', sugar_g_L: 90, designated_mg_L: 400 }, 'eu-desig-400'],
    [{ region: 'us', organic: 'made-with' }, 'us-mwog'],
    [{ region: 'ca', organic: true, sugar_g_L: 60 }, 'caorg-tot-5to10pc'],
  ] as const)('%j', (facts, rule) => {
    expect(limitsFor(facts).total).toMatchObject({ rule, confidence: 'unconfirmed' });
    const answer = dosedTo(900, { facts, rule, passes: 0, fails: 0 });
    expect(answer.warnings.map(({ code }) => code)).toContain('limit-unconfirmed');
    expect(answer).toMatchObject({ dose_mg_L: 20, limit: { confidence: 'unconfirmed' } });
    expect(answer.capped).toBeUndefined();
  });
});

describe('what is repealed, in another unit or not found is told and never compared with', () => {
  test.each([
    [{ region: 'ca' }, 'repealed', 'ca-comb-old'],
    [{ region: 'jp' }, 'other-unit-told', 'jp-ivv'],
    [{ region: 'kr' }, 'other-unit-told', 'kr-uiv'],
    [{ region: 'cl' }, 'second-value-told', 'cl-total-alt'],
    [{ region: 'za', style: 'red' }, 'second-value-told', 'za-red-dry'],
  ] as const)('%j', (facts, code, rule) => {
    const { total, notes } = limitsFor(facts);
    expect(notes).toContainEqual({ code, rule });
    expect(total?.rule).not.toBe(rule);
  });

  test.each([
    [{ region: 'uy' }, { region: 'uy', product: 'still', reason: 'not-found' }],
    [{ region: 'md' }, { region: 'md', product: 'still', reason: 'not-found' }],
    [{ region: 'in' }, { region: 'in', product: 'still', reason: 'not-found' }],
    [{ region: 'mercosur' }, { region: 'mercosur', product: 'still', reason: 'not-found' }],
    [
      { region: 'oiv', category: 'sparkling' },
      { region: 'oiv', product: 'sparkling', reason: 'not-on-file' },
    ],
    [
      { region: 'ca', product: 'mead' },
      { region: 'ca', product: 'mead', reason: 'not-on-file' },
    ],
    [
      { region: 'us', product: 'cider', alcohol_percent: 5 },
      { region: 'us', product: 'cider', reason: 'not-on-file' },
    ],
  ] as const)('no limit on file: %j', (facts, none) => {
    expect(limitsFor(facts)).toMatchObject({ none });
    expect(limitsFor(facts)).not.toHaveProperty('total');
  });
});

describe('a class of sweet wines is asked for and never inferred', () => {
  test.each([
    [{ region: 'eu', style: 'white', sugar_g_L: 60 }, 250],
    [{ region: 'eu', style: 'white', category: 'sweet' }, 250],
    [{ region: 'uk', style: 'white', sugar_g_L: 120 }, 250],
    [{ region: 'oiv', style: 'white', sugar_g_L: 120 }, 300],
    [{ region: 'cl', style: 'white', sugar_g_L: 60 }, 250],
    [{ region: 'codex', style: 'white', sugar_g_L: 60, density_kg_L: 1 }, 350],
  ] as const)('%j has the ordinary limit', (facts, limit_mg_L) => {
    const { total, notes } = limitsFor(facts);
    expect(total?.limit_mg_L).toBe(limit_mg_L);
    expect(notes.map(({ code }) => code)).toContain('designation-unknown');
  });

  test('a class that the market has no row for leaves the ordinary limit, and that is said', () => {
    const { total, notes } = limitsFor({ region: 'ge', style: 'white', sugar_g_L: 60, designated_mg_L: 300 });
    expect(total?.rule).toBe('ge-wr-5');
    expect(notes).toContainEqual({ code: 'designation-not-on-file' });
  });
});
