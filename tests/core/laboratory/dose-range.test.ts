import { expect, test } from 'vitest';
import { pKOf } from '../../../src/core/chemistry/dissociation.ts';
import { freeSO2Needed } from '../../../src/core/chemistry/free-so2-needed.ts';
import { molecularSO2 } from '../../../src/core/chemistry/molecular-so2.ts';
import { doseRange } from '../../../src/core/laboratory/dose-range.ts';
import { loadMathjs } from '../../../src/core/units/define.ts';
import { stepFault } from '../../../src/core/units/step-fault.ts';
import { chanceOf } from '../simulated.ts';

const math = await loadMathjs();
const dissociation = pKOf('pk-1.81');
const { pK } = dissociation;

const WINES = [
  { ph: 3.58, free_mg_L: 21, molecular_mg_L: 0.8 },
  { ph: 3.2, free_mg_L: 8, molecular_mg_L: 0.8 },
  { ph: 3.75, free_mg_L: 30, molecular_mg_L: 0.6 },
  { ph: 3.45, free_mg_L: 25, molecular_mg_L: 1.5 },
];

// What is sampled is what the true wine may be, by errors of which each ± is two standard deviations.
test.each(WINES)(
  'of 200 000 wines that such readings may come of, 95 % (± 1) need a dose in the range (pH $ph)',
  ({ ph, free_mg_L, molecular_mg_L }) => {
    const { dose_mg_L, ph_plus_minus, free_plus_minus_mg_L } = doseRange({
      ph,
      free_mg_L,
      target: { molecular_mg_L },
      dissociation,
    });
    const { normal } = chanceOf(20261201);
    let held = 0;
    const runs = 200_000;
    for (let run = 0; run < runs; run++) {
      const truePH = ph + (normal() * ph_plus_minus) / 2;
      const trueFree = free_mg_L + (normal() * free_plus_minus_mg_L) / 2;
      const needed = freeSO2Needed(molecular_mg_L, truePH, pK) - trueFree;
      if (needed >= dose_mg_L[0] && needed <= dose_mg_L[1]) held++;
    }
    expect((100 * held) / runs).toBeGreaterThan(94);
    expect((100 * held) / runs).toBeLessThan(96);
  },
);

// Below two standard deviations lie 2.3 of 100 (tables of the normal distribution).
test.each(WINES.filter((wine) => wine.free_mg_L >= 10))(
  'after the dose, 97.7 % (± 1) of such wines have the molecular SO2 that one is sure of (pH $ph)',
  ({ ph, free_mg_L, molecular_mg_L }) => {
    const range = doseRange({ ph, free_mg_L, target: { molecular_mg_L }, dissociation });
    const dose = freeSO2Needed(molecular_mg_L, ph, pK) - free_mg_L;
    const { normal } = chanceOf(7);
    let held = 0;
    const runs = 200_000;
    for (let run = 0; run < runs; run++) {
      const truePH = ph + (normal() * range.ph_plus_minus) / 2;
      const trueFree = free_mg_L + (normal() * range.free_plus_minus_mg_L) / 2;
      if (molecularSO2(trueFree + dose, truePH, pK) >= range.molecular_sure_mg_L) held++;
    }
    expect((100 * held) / runs).toBeGreaterThan(96.7);
    expect((100 * held) / runs).toBeLessThan(99.2);
  },
);

test('a surer pH makes a narrower range, and a sure wine none', () => {
  const wine = { ph: 3.58, free_mg_L: 21, target: { molecular_mg_L: 0.8 }, dissociation };
  const width = (range: ReturnType<typeof doseRange>): number => range.dose_mg_L[1] - range.dose_mg_L[0];
  const usual = doseRange(wine);
  const finer = doseRange({ ...wine, ph_plus_minus: 0.03 });
  expect(width(finer)).toBeLessThan(width(usual));
  const sure = doseRange({ ...wine, ph_plus_minus: 0, free_plus_minus_mg_L: 0 });
  expect(width(sure)).toBe(0);
  expect(sure.molecular_sure_mg_L).toBeCloseTo(0.8, 9);
});

test('a target in free SO2 does not hang on the pH, and what binds widens the range with the dose', () => {
  const wine = { ph: 3.5, free_mg_L: 20, target: { free_mg_L: 30 }, dissociation };
  expect(doseRange(wine).dose_mg_L).toEqual([8, 12]);
  expect(doseRange({ ...wine, ph_plus_minus: 0.2 }).dose_mg_L).toEqual([8, 12]);
  expect(doseRange({ ...wine, binding_share: 0.5 }).dose_mg_L).toEqual([16, 24]);
  expect(doseRange({ ...wine, binding_allowance_percent: 30 }).dose_mg_L[1]).toBeCloseTo(15.6, 9);
});

test('it never takes SO2 out', () => {
  const { dose_mg_L } = doseRange({ ph: 3.3, free_mg_L: 40, target: { molecular_mg_L: 0.8 }, dissociation });
  expect(dose_mg_L).toEqual([0, 0]);
});

test.each(WINES)('each line of the working holds and leads to the range (pH $ph)', (wine) => {
  const range = doseRange({
    ...wine,
    target: { molecular_mg_L: wine.molecular_mg_L },
    dissociation,
    binding_allowance_percent: 30,
  });
  expect(range.steps.map((step) => stepFault(step, math))).toEqual(range.steps.map(() => undefined));
  const of = (name: string): number => range.steps.find((step) => step.name === name)?.result.value ?? NaN;
  expect(of('dose-lowest')).toBeCloseTo(range.dose_mg_L[0], 1);
  expect(of('dose-highest')).toBeCloseTo(range.dose_mg_L[1], 1);
  expect(of('molecular-sure')).toBeCloseTo(range.molecular_sure_mg_L, 2);
});

test('where nothing or almost nothing is free, nothing of the dose is counted as sure', () => {
  const of = (free_mg_L: number): ReturnType<typeof doseRange> =>
    doseRange({ ph: 3.3, free_mg_L, target: { molecular_mg_L: 0.8 }, dissociation });
  expect(of(0).molecular_sure_mg_L).toBe(0);
  expect(of(0).free_plus_minus_mg_L).toBe(1);
  expect(of(9).molecular_sure_mg_L).toBeLessThan(molecularSO2(9, 3.3, pK));
  expect(of(9).molecular_sure_mg_L).toBeGreaterThan(0);
  expect(of(10).molecular_sure_mg_L).toBeGreaterThan(0.6);
});
