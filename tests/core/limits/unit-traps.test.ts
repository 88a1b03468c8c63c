import { expect, test } from 'vitest';
import { limitsFor } from '../../../src/core/limits/limits-for.ts';
import { limitOfRow } from '../../../src/core/limits/limit-of-row.ts';
import { checkLimit } from '../../../src/core/limits/check-limit.ts';
import type { LimitRow } from '../../../src/core/limits/limit-row.ts';

// By definition mg/L = mg/kg × kg/L; a published table of 350 mg/kg at five densities.
test.each([
  [0.99, 346.5],
  [0.995, 348.25],
  [1, 350],
  [1.02, 357],
  [1.08, 378],
])('350 mg/kg at %d kg/L is %d mg/L', (density_kg_L, limit_mg_L) => {
  expect(limitsFor({ region: 'codex', density_kg_L }).total).toMatchObject({ limit_mg_L, density_kg_L });
});

test('a limit by mass without a density is taken at 0.990 kg/L, the strictest, and that is said', () => {
  const { total, notes } = limitsFor({ region: 'codex', style: 'red' });
  expect(total).toMatchObject({
    limit_mg_L: 346.5,
    density_kg_L: 0.99,
    as_written: { value: 350, unit: 'mg/kg' },
  });
  expect(notes).toContainEqual({ code: 'density-assumed' });
});

test('349 mg/L at 0.992 kg/L is 351.8 mg/kg: over 350 mg/kg, though under 350 as a bare number', () => {
  const { total } = limitsFor({ region: 'codex', density_kg_L: 0.992 });
  expect(total && checkLimit(349, total)).toBe('over');
});

// g/kg × 1000 = mg/kg; g/L × 1000 = mg/L; mg/dm3 = mg/L; ppm of wine is read as mg/L in the markets that write it.
test.each([
  ['g/kg', 0.35, 350],
  ['mg/kg', 350, 350],
  ['g/L', 0.25, 250],
  ['mg/dm3', 30, 30],
  ['ppm', 350, 350],
] as const)('a figure in %s', (unit, value, limit_mg_L) => {
  const row: LimitRow = {
    id: 'planted',
    region: 'codex',
    products: ['still'],
    of: 'total',
    operator: '<=',
    value,
    unit,
    text: 'codex',
    checked: 'law-text',
    status: 'in-force',
  };
  expect(limitOfRow(row, { density_kg_L: 1 })).toMatchObject({ limit_mg_L, as_written: { value, unit } });
});

test('0.350 g/kg fails in Japan and Korea and 0.349 passes; 350 mg/kg passes Codex', () => {
  for (const region of ['jp', 'kr'] as const) {
    const { total } = limitsFor({ region, density_kg_L: 1 });
    expect(total && [checkLimit(349, total), checkLimit(350, total)]).toEqual(['near', 'over']);
  }
  const { total } = limitsFor({ region: 'codex', density_kg_L: 1 });
  expect(total && checkLimit(350, total)).toBe('near');
});
