import { expect, test } from 'vitest';
import { freeTable, TABLE_ROWS_MOST } from '../../../src/core/laboratory/free-table.ts';

// An amateur winemakers' association (Vancouver), free SO2 by pH for 0.8 and 2.0 mg/L (read); it rests on pK 1.77.
test('it prints the association’s table as it stands, with the constant of that table', () => {
  const printed = [
    [2.8, 9, 23], [2.9, 12, 29], [3.0, 14, 36], [3.1, 18, 45], [3.2, 22, 56], [3.3, 28, 70], [3.4, 35, 87],
    [3.5, 44, 109], [3.6, 55, 137], [3.7, 69, 172], [3.8, 87, 216], [3.9, 109, 272], [4.0, 137, 342], [4.1, 172, 430],
  ]; // prettier-ignore
  const rows = freeTable({ molecular_mg_L: [0.8, 2], ph_from: 2.8, ph_to: 4.1, pK: 1.77 });
  expect(rows.map(({ ph, free_mg_L }) => [ph, ...free_mg_L.map((one) => Math.round(one))])).toEqual(printed);
});

test('it stands on one screen, whatever is asked', () => {
  for (const [ph_from, ph_to] of [
    [2.5, 4.8],
    [3.2, 3.8],
    [3.5, 3.5],
    [3.41, 3.44],
  ] as const) {
    const rows = freeTable({ molecular_mg_L: [0.8], ph_from, ph_to, pK: 1.81 });
    expect(rows.length).toBeGreaterThan(0);
    expect(rows.length).toBeLessThanOrEqual(TABLE_ROWS_MOST);
    expect(rows[0]?.ph).toBe(ph_from);
  }
  expect(() => freeTable({ molecular_mg_L: [0.8], ph_from: 3.8, ph_to: 3.2, pK: 1.81 })).toThrow(RangeError);
});
