import { expect, test } from 'vitest';
import { readStrength } from '../../../src/core/additives/read-strength.ts';

const OUT = 'strength-out-of-range';
const ASK = 'ambiguous-number';

test.each([
  ['potassium-metabisulfite', 80, {}, 'assay'],
  ['potassium-metabisulfite', 100, {}, 'assay'],
  ['potassium-metabisulfite', 79.9, {}, OUT],
  ['potassium-metabisulfite', 60.1, {}, OUT],
  ['potassium-metabisulfite', 60, {}, 'SO2-yield'],
  ['potassium-metabisulfite', 57.6, {}, 'SO2-yield'],
  ['potassium-metabisulfite', 45, {}, 'SO2-yield'],
  ['potassium-metabisulfite', 44.9, {}, OUT],
  ['potassium-metabisulfite', 100.1, {}, OUT],
  ['sodium-metabisulfite', 96, {}, 'assay'],
  ['sodium-metabisulfite', 60, {}, 'SO2-yield'],
  ['sodium-metabisulfite', 68, {}, 'SO2-yield'],
  ['sodium-metabisulfite', 59.9, {}, OUT],
  ['sodium-metabisulfite', 68.1, {}, OUT],
  ['potassium-metabisulfite-solution', 1, {}, 'salt-per-100mL'],
  ['potassium-metabisulfite-solution', 25, {}, 'salt-per-100mL'],
  ['potassium-metabisulfite-solution', 0.9, {}, OUT],
  ['potassium-metabisulfite-solution', 25.1, {}, OUT],
  ['sodium-metabisulfite-solution', 10, { salt: true }, 'salt-per-100mL'],
  ['sodium-metabisulfite-solution', 25, {}, 'salt-per-100mL'],
  ['sodium-metabisulfite-solution', 25.1, {}, OUT],
  ['sulfur-dioxide-solution', 1, {}, 'SO2-per-100mL'],
  ['sulfur-dioxide-solution', 8, {}, 'SO2-per-100mL'],
  ['sulfur-dioxide-solution', 8.1, {}, ASK],
  ['sulfur-dioxide-solution', 10, { named: true }, 'SO2-per-100mL'],
  ['sulfur-dioxide-solution', 15, { named: true }, 'SO2-per-100mL'],
  ['sulfur-dioxide-solution', 15.1, { named: true }, OUT],
  ['sulfur-dioxide-solution', 16, {}, OUT],
  ['potassium-bisulfite-solution', 5, {}, 'SO2-per-100mL'],
  ['potassium-bisulfite-solution', 20, {}, 'SO2-per-100mL'],
  ['potassium-bisulfite-solution', 20.1, {}, ASK],
  ['potassium-bisulfite-solution', 30, { salt: true }, 'salt-per-100mL'],
  ['potassium-bisulfite-solution', 15, { salt: true }, 'salt-per-100mL'],
  ['potassium-bisulfite-solution', 40.1, { salt: true }, OUT],
  ['potassium-bisulfite-solution', 4.9, {}, OUT],
  ['ammonium-bisulfite-solution', 10, {}, 'SO2-per-100mL'],
  ['ammonium-bisulfite-solution', 40, {}, 'SO2-per-100mL'],
  ['ammonium-bisulfite-solution', 40.1, {}, ASK],
  ['ammonium-bisulfite-solution', 60, { salt: true }, 'salt-per-100mL'],
  ['ammonium-bisulfite-solution', 70.1, {}, OUT],
  ['ammonium-bisulfite-solution', 9.9, {}, OUT],
  ['sulfur-dioxide-gas', 99.9, {}, 'assay'],
  ['sulfur-dioxide-gas', 99, {}, 'assay'],
  ['sulfur-dioxide-gas', 98.9, {}, OUT],
  ['tablet', 50, {}, OUT],
  ['potassium-metabisulfite', Number.NaN, {}, OUT],
  ['potassium-metabisulfite', -57, {}, OUT],
] as const)('%s of %d %% (%j) is %s', (id, percent, said, expected) => {
  const { salt, named } = { salt: false, named: false, ...said };
  const read = readStrength(id, percent, salt, named);
  expect('kind' in read ? read.kind : read.problem).toBe(expected);
});
