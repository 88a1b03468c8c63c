import { MF } from 'mf-parser';
import { describe, expect, test } from 'vitest';
import { ADDITIVES } from '../../../src/core/additives/additives.ts';
import { amountFor } from '../../../src/core/additives/amount-for.ts';
import { SO2In } from '../../../src/core/additives/so2-in.ts';
import { ATOMIC_WEIGHTS } from '../../../src/core/chemistry/atomic-weights.ts';
import { IONS_PER_100_mg_L, PUBLISHED_ASSAYS, PUBLISHED_SHARES } from '../../tables/so2-shares.ts';
import { BISULFITE_SOLUTIONS, PRACTICAL_YIELD } from '../../tables/worked-additions.ts';

const decimalsOf = (printed: number): number => String(printed).split('.')[1]?.length ?? 0;

describe('shares of SO2 and formula weights as published', () => {
  test.each(PUBLISHED_SHARES)('$id by $source', ({ id, formula_weight_g_mol, ...printed }) => {
    const { SO2_share, molar_mass_g_mol } = ADDITIVES[id];
    // Older weights of sulfur and oxygen make up to 0.02 g/mol.
    expect(Math.abs(molar_mass_g_mol - formula_weight_g_mol)).toBeLessThan(0.04);
    if (!('SO2_percent' in printed)) return;
    expect(Number((100 * SO2_share).toFixed(decimalsOf(printed.SO2_percent)))).toBe(printed.SO2_percent);
  });

  test.each(PUBLISHED_ASSAYS)('$id of $assay_percent % gives $SO2_percent %: $source', (row) => {
    const SO2_g = SO2In({ mass_g: 100 }, { id: row.id, strength_percent: row.assay_percent }) ?? Number.NaN;
    expect(Math.abs(SO2_g - row.SO2_percent)).toBeLessThan(0.1);
  });

  test.each(Object.values(ADDITIVES))('the molar mass of $formula ($id) is that of mf-parser', (additive) => {
    const mass = new MF(additive.formula).getInfo().mass;
    expect(Math.abs(additive.molar_mass_g_mol / mass - 1)).toBeLessThan(1e-4);
    const sulfurs = additive.composition.S ?? 0;
    const share = (sulfurs * new MF('SO2').getInfo().mass) / mass;
    expect(Math.abs(additive.SO2_share / share - 1)).toBeLessThan(1e-4);
  });

  test.each(IONS_PER_100_mg_L)(
    '$id brings $mg_L mg/L of $element with 100 mg/L of SO2',
    ({ id, element, mg_L }) => {
      const { composition, molar_mass_g_mol, SO2_share } = ADDITIVES[id];
      const ion_share = ((composition[element] ?? 0) * ATOMIC_WEIGHTS[element]) / molar_mass_g_mol;
      expect(Number(((100 * ion_share) / SO2_share).toFixed(1))).toBe(mg_L);
    },
  );
});

describe('what is in a solution, a powder, a tablet', () => {
  test.each(BISULFITE_SOLUTIONS)('$KHSO3_g_L g/L of KHSO3 are $SO2_g_L g/L of SO2: $source', (row) => {
    const additive = {
      id: 'potassium-bisulfite-solution',
      strength_percent: row.KHSO3_g_L / 10,
      strength_of: 'salt',
    } as const;
    expect(Math.round(SO2In({ additive_volume_mL: 1000 }, additive) ?? 0)).toBe(row.SO2_g_L);
  });

  test('10 g of SO2 take 17.35 g of pure powder, 18 g in practice (L28)', () => {
    const { SO2_g, powder_g, exact_powder_g } = PRACTICAL_YIELD;
    const pure = amountFor(SO2_g, { id: 'potassium-metabisulfite' })?.mass_g ?? 0;
    expect(Number(pure.toFixed(2))).toBe(exact_powder_g);
    const practical =
      amountFor(SO2_g, { id: 'potassium-metabisulfite', strength_percent: 55.6 })?.mass_g ?? 0;
    expect(Number(practical.toFixed(0))).toBe(powder_g);
  });

  test('10 g of potassium metabisulfite in 100 mL are 57.6 g/L of SO2 (computed; trade prints 5.7 %)', () => {
    const stock = { id: 'potassium-metabisulfite-solution', strength_percent: 10 } as const;
    expect(Number((SO2In({ additive_volume_mL: 1000 }, stock) ?? 0).toFixed(1))).toBe(57.6);
  });

  test.each([
    [{ mass_g: 50 }, { id: 'sulfur-dioxide-gas' }, 50],
    [{ mass_g: 10 }, { id: 'tablet', tablet_SO2_g: 5 }, 10],
    [{ tablets: 2 }, { id: 'tablet', tablet_SO2_g: 5 }, 10],
    [{ mass_g: 100 }, { id: 'potassium-metabisulfite', strength_percent: 57 }, 57],
    [{ mass_g: 100 }, { id: 'sodium-metabisulfite', strength_percent: 65 }, 65],
    [{ additive_volume_mL: 100 }, { id: 'sulfur-dioxide-solution', strength_percent: 6 }, 6],
    [{ additive_volume_mL: 100 }, { id: 'ammonium-bisulfite-solution', strength_percent: 40 }, 40],
    [{ additive_volume_mL: 100 }, { id: 'sulfur-dioxide-solution' }, undefined],
    [{ tablets: 2 }, { id: 'tablet' }, undefined],
    [{ tablets: 2 }, { id: 'potassium-metabisulfite' }, undefined],
    [{ additive_volume_mL: 100 }, { id: 'potassium-metabisulfite' }, undefined],
    [{}, { id: 'potassium-metabisulfite' }, undefined],
  ] as const)('%j of %j hold %s g', (amount, additive, SO2_g) => {
    const found = SO2In(amount, additive);
    expect(found && Number(found.toFixed(10))).toBe(SO2_g);
  });

  test('a strength that cannot be is refused, not reckoned with', () => {
    expect(() => SO2In({ mass_g: 1 }, { id: 'potassium-metabisulfite', strength_percent: 30 })).toThrow(
      RangeError,
    );
    expect(() => SO2In({ mass_g: -1 }, { id: 'potassium-metabisulfite' })).toThrow(RangeError);
    expect(() => SO2In({ tablets: 1 }, { id: 'tablet', tablet_SO2_g: 0 })).toThrow(RangeError);
    expect(() => amountFor(Number.NaN, { id: 'potassium-metabisulfite' })).toThrow(RangeError);
  });
});
