import { expect, test } from 'vitest';
import { ADDITIVES } from '../../../src/core/additives/additives.ts';
import type { AdditiveId } from '../../../src/core/additives/additive-id.ts';
import { readStrength } from '../../../src/core/additives/read-strength.ts';

/** As the texts print them: `[additive, per cent or g per 100 mL, source]`. */
const PRINTED = [
  ['potassium-metabisulfite', 90, 'jecfa-1999'], // JECFA 1999: not less than 90 % (read)
  ['potassium-metabisulfite', 95, 'austrian-law'], // RIS 10010710: at least 95 % (read)
  ['potassium-metabisulfite', 57.6, 'usp-35'], // USP 35: 51.8 to 57.6 % SO2 (read)
  ['sodium-metabisulfite', 90, 'jecfa-1999'], // JECFA 1999: not less than 90 % (read)
  ['potassium-bisulfite-solution', 15, 'oiv-potbis'], // COEI-1-POTBIS: 150 g/L SO2 (read)
  ['potassium-bisulfite-solution', 20, 'oiv-oeno-646-2019'], // at most 200 g/L (read)
  ['sulfur-dioxide-solution', 5, 'oiv-oeno-46-2000'], // at least 50 g/L (read)
  ['sulfur-dioxide-solution', 6, 'ifv-grid-2024'], // 60 to 150 g/L (read)
  ['sulfur-dioxide-gas', 99.9, 'ifv-grid-2024'], // least purity (read)
] as const satisfies readonly (readonly [AdditiveId, number, string])[];

test.each(PRINTED)('%s at %d %% stands in %s', (id, percent, source) => {
  expect(ADDITIVES[id].usual).toContainEqual({ percent, source });
});

test('every usual strength is one that can be read', () => {
  const all = Object.values(ADDITIVES).flatMap(({ id, usual }) =>
    usual.map(({ percent }) => readStrength(id, percent)),
  );
  expect(all.filter((read) => 'problem' in read)).toEqual([]);
});
