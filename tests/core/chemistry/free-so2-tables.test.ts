import { describe, expect, test } from 'vitest';
import { DISSOCIATION_CONSTANTS } from '../../../src/core/chemistry/dissociation.ts';
import { freeSO2Needed } from '../../../src/core/chemistry/free-so2-needed.ts';
import { molecularSO2 } from '../../../src/core/chemistry/molecular-so2.ts';
import { ASSOCIATION, HIGH_PH, SWEET_WHITES, TWO_CONSTANTS, VIRGINIA } from '../../tables/free-so2-other.ts';
import { UC_1982 } from '../../tables/free-so2-uc-1982.ts';

const percentOf = (ph: number, pK: number): number => molecularSO2(100, ph, pK);
const toDigits = (value: number, decimals: number): number => Number(value.toFixed(decimals));

describe('the table of 1982 (its source is in the table)', () => {
  const cells = [UC_1982.wholeSteps, UC_1982.halfSteps].flatMap(({ pK, rows }) =>
    rows.flatMap((row) => [
      {
        ph: row.ph,
        cell: 'molecular_percent',
        printed: row.molecular_percent,
        computed: percentOf(row.ph, pK),
        shown: toDigits(percentOf(row.ph, pK), 1),
      },
      ...[[0.8, 'free_for_0_8_mg_L'] as const, [0.5, 'free_for_0_5_mg_L'] as const].map(
        ([molecular_mg_L, cell]) => {
          const computed = freeSO2Needed(molecular_mg_L, row.ph, pK);
          return { ph: row.ph, cell, printed: row[cell], computed, shown: Math.round(computed) };
        },
      ),
    ]),
  );
  const slips = cells.filter(({ printed, shown }) => printed !== shown);

  test('65 of its 69 cells follow from pK 1.81 on whole steps and pK 1.80 on half steps', () => {
    expect(cells).toHaveLength(69);
    expect(cells.length - slips.length).toBe(65);
  });

  test('the four cells that do not are the misprints named in the table, and no others', () => {
    const named = slips.map(({ ph, cell, printed }) => ({ ph, cell, printed }));
    const expected = UC_1982.misprints.map(({ ph, cell, printed }) => ({ ph, cell, printed }));
    expect(named.toSorted((a, b) => a.ph - b.ph)).toEqual(expected.toSorted((a, b) => a.ph - b.ph));
    for (const misprint of UC_1982.misprints) {
      const slip = slips.find(({ ph, cell }) => ph === misprint.ph && cell === misprint.cell);
      expect(Math.abs((slip?.computed ?? 0) - misprint.computed)).toBeLessThan(0.05);
    }
  });

  test('the default constant of every dose is the one of its whole steps', () => {
    expect(DISSOCIATION_CONSTANTS['pk-1.81'].pK).toBe(UC_1982.wholeSteps.pK);
    expect(DISSOCIATION_CONSTANTS['pk-1.80'].pK).toBe(UC_1982.halfSteps.pK);
  });
});

describe('the table of an association (its source is in the table)', () => {
  test.each(ASSOCIATION.rows)('at pH %d it has %d mg/L free for 0.8 and %d for 2.0', (ph, for08, for20) => {
    const { pK } = DISSOCIATION_CONSTANTS['pk-1.77'];
    expect(pK).toBe(ASSOCIATION.pK);
    expect(Math.round(freeSO2Needed(0.8, ph, pK))).toBe(for08);
    expect(Math.round(freeSO2Needed(2, ph, pK))).toBe(for20);
  });
});

describe('sweet whites, 1.5 mg/L (its source is in the table)', () => {
  test.each(SWEET_WHITES.rows)('at pH %d its %d mg/L free are met within a tenth', (ph, free_mg_L) => {
    const { pK } = DISSOCIATION_CONSTANTS['pk-1.80'];
    expect(pK).toBe(SWEET_WHITES.pK);
    expect(Math.abs(freeSO2Needed(1.5, ph, pK) / free_mg_L - 1)).toBeLessThan(0.1);
  });
});

describe('the page with two constants (its source is in the table)', () => {
  // The second constant belongs to this page alone; no dose rests on it.
  const pK = -Math.log10(TWO_CONSTANTS.K1_mol_L);
  const freePerMolecular = (ph: number): number => {
    const h = 10 ** -ph;
    const first = freeSO2Needed(1, ph, pK);
    return first + (TWO_CONSTANTS.K1_mol_L * TWO_CONSTANTS.K2_mol_L) / h ** 2;
  };

  test.each(TWO_CONSTANTS.rows)(
    'at pH %d it has %d per cent active and %d mg/L free for 10',
    (ph, percent, free) => {
      expect(Math.round(10 * freePerMolecular(ph))).toBe(free);
      // The page took its per cent from the rounded figure.
      expect(toDigits(1000 / free, 2)).toBe(percent);
    },
  );
});

describe('single figures (their sources are in the tables)', () => {
  test.each(VIRGINIA.rows)(
    'at pH $ph $molecular_percent % are molecular',
    ({ ph, molecular_percent, decimals }) => {
      expect(toDigits(percentOf(ph, VIRGINIA.pK), decimals)).toBe(molecular_percent);
    },
  );

  test('the ends of the published range at pH 3.95 stand for pK 1.96 and 1.81', () => {
    const ends = HIGH_PH.implied_pK.map((pK) => Math.round(freeSO2Needed(0.8, HIGH_PH.ph, pK)));
    const [low, high] = HIGH_PH.free_range_mg_L;
    expect(ends[0]).toBe(low);
    expect(Math.abs((ends[1] ?? 0) - high)).toBeLessThanOrEqual(1);
  });

  test('the need at pH 4.0 is about ten times that at pH 3.0', () => {
    const ratio = freeSO2Needed(0.8, 4, 1.81) / freeSO2Needed(0.8, 3, 1.81);
    expect(Math.abs(ratio / HIGH_PH.needAt4.timesNeedAt3 - 1)).toBeLessThan(0.06);
  });
});
