import { describe, expect, test } from 'vitest';
import { pKOf } from '../../../src/core/chemistry/dissociation.ts';
import {
  OIV_TABLE_1,
  OIV_TABLE_2,
  USSEGLIO_TOMASSET_1984,
} from '../../../src/core/chemistry/dissociation-tables.ts';
import { ionicTerm } from '../../../src/core/chemistry/ionic-term.ts';
import { cellAround, pKBetween } from '../../../src/core/chemistry/interpolate.ts';
import { molecularSO2 } from '../../../src/core/chemistry/molecular-so2.ts';
import {
  DEBYE_HUCKEL,
  OIV_TABLE_1_AS_READ,
  OIV_TABLE_2_RECALLED,
  OIV_TABLE_3_FIRST_ROW,
  OIV_TABLE_3_MISPRINTS,
  USSEGLIO_TOMASSET_25C,
} from '../../tables/oiv-dissociation.ts';

describe('the tables of the OIV method', () => {
  test.each(OIV_TABLE_1_AS_READ.rows)(
    'Table I at $alcohol_percent % vol is as $from',
    ({ alcohol_percent, pKT }) => {
      expect(OIV_TABLE_1.pK[OIV_TABLE_1.alcohol_percent.indexOf(alcohol_percent)]).toEqual(pKT);
    },
  );

  test('the row of Table I that is from memory says so', () => {
    const recalled = OIV_TABLE_1_AS_READ.rows.filter(({ from }) => from === 'from memory');
    expect(OIV_TABLE_1.rowsFromMemory).toEqual(recalled.map(({ alcohol_percent }) => alcohol_percent));
  });

  test.each(OIV_TABLE_2_RECALLED.rows)(
    'Table II at $alcohol_percent % vol is as recalled (from memory)',
    (row) => {
      expect(OIV_TABLE_2.pK[OIV_TABLE_2.alcohol_percent.indexOf(row.alcohol_percent)]).toEqual(row.pKM);
      expect(OIV_TABLE_2.rowsFromMemory).toContain(row.alcohol_percent);
    },
  );

  test.each(DEBYE_HUCKEL.rows)(
    'at $alcohol_percent % vol and $temperature_C °C the ionic step leads from Table I to Table II',
    ({ alcohol_percent, temperature_C, permittivity }) => {
      // A goes with (permittivity × kelvin)^-3/2, B with its ^-1/2.
      const { at, ion_angstrom } = DEBYE_HUCKEL;
      const scale =
        (at.permittivity * (273.15 + at.temperature_C)) / (permittivity * (273.15 + temperature_C));
      const term = ionicTerm(at.A * scale ** 1.5, at.B_per_angstrom * ion_angstrom * scale ** 0.5);
      const difference =
        pKBetween(OIV_TABLE_1, alcohol_percent, temperature_C) -
        pKBetween(OIV_TABLE_2, alcohol_percent, temperature_C);
      expect(Math.abs(term - difference)).toBeLessThan(0.0016);
    },
  );

  test('the first row of Table III follows from Table II (from memory)', () => {
    const { ph, temperature_C, molecular_percent } = OIV_TABLE_3_FIRST_ROW;
    const found = [0, 5, 10, 15, 20].map((alcohol) =>
      Number(molecularSO2(100, ph, pKOf('oiv', alcohol, temperature_C).pK).toFixed(2)),
    );
    expect(found).toEqual(molecular_percent);
  });

  test.each(OIV_TABLE_3_MISPRINTS.rows)(
    '$printed in Table III is a misprint of $computed (from memory)',
    (row) => {
      const { pK } = pKOf('oiv', row.alcohol_percent, row.temperature_C);
      const percent = molecularSO2(100, row.ph, pK);
      expect(Number(percent.toFixed(2))).toBe(row.computed);
      expect(Number(percent.toFixed(2))).not.toBe(row.printed);
    },
  );

  test('the table of 1984 agrees with Table I within 0.012 at 25 °C (from memory)', () => {
    USSEGLIO_TOMASSET_25C.pK.forEach((pK, row) => {
      expect(USSEGLIO_TOMASSET_1984.pK[row]?.[2]).toBe(pK);
      expect(Math.abs(pK - (OIV_TABLE_1.pK[row]?.[1] ?? 0))).toBeLessThan(0.0121);
    });
  });
});

describe('between the printed values', () => {
  test('every printed value is met exactly, at the edges too', () => {
    OIV_TABLE_2.alcohol_percent.forEach((alcohol, row) =>
      OIV_TABLE_2.temperature_C.forEach((temperature, column) =>
        expect(pKBetween(OIV_TABLE_2, alcohol, temperature)).toBeCloseTo(
          OIV_TABLE_2.pK[row]?.[column] ?? Number.NaN,
          12,
        ),
      ),
    );
  });

  test('a point lies in the cell around it', () => {
    expect(cellAround(OIV_TABLE_2, 20, 40).alcohol_percent).toEqual([15, 20]);
    expect(cellAround(OIV_TABLE_2, 12, 22).temperature_C).toEqual([20, 25]);
  });

  test.each([
    [-0.1, 25],
    [20.1, 25],
    [12, 19.9],
    [12, 40.1],
    [Number.NaN, 25],
    [12, Number.POSITIVE_INFINITY],
  ])('outside the table (%d %% vol, %d °C) it refuses', (alcohol, temperature) => {
    expect(() => pKBetween(OIV_TABLE_2, alcohol, temperature)).toThrow(RangeError);
  });
});

describe('pKOf() says which basis it used, and why not the one that was asked for', () => {
  test.each([
    [undefined, undefined, 'alcohol-and-temperature-unknown', 12, 20],
    [undefined, 25, 'alcohol-unknown', 12, 25],
    [13, undefined, 'temperature-unknown', 13, 20],
    [21, 25, 'alcohol-out-of-range', 20, 25],
    [13, 14, 'temperature-out-of-range', 13, 20],
    [13, 41, 'temperature-out-of-range', 13, 40],
  ])('%s % vol, %s °C: %s', (alcohol, temperature, why, compared_alcohol, compared_temperature) => {
    const found = pKOf('oiv', alcohol, temperature);
    expect(found).toMatchObject({ pK: 1.81, basis: 'pk-1.81', source: 'uc-1982' });
    expect(found.fallback).toMatchObject({
      why,
      compared_at_alcohol_percent: compared_alcohol,
      compared_at_temperature_C: compared_temperature,
    });
  });

  test('at the edges of the table the table is used', () => {
    expect(pKOf('oiv', 0, 20)).toMatchObject({ pK: 1.723, basis: 'oiv' });
    expect(pKOf('oiv', 20, 40)).toMatchObject({ pK: 2.803, basis: 'oiv' });
  });

  test.each([Number.NaN, Number.POSITIVE_INFINITY])('%d is refused', (value) => {
    expect(() => pKOf('oiv', value, 20)).toThrow(RangeError);
    expect(() => pKOf('pk-1.81', 12, value)).toThrow(RangeError);
  });
});
