import { SO2ShareOf, molarMass, type Composition } from '../chemistry/molar-mass.ts';
import type { SourceKey } from '../sources.ts';
import type { AdditiveId } from './additive-id.ts';
import { cautionsOf, type CautionId } from './cautions.ts';

/** A strength that is usual in trade. `percent` means what the additive's strength means (`read-strength`). */
export interface UsualStrength {
  readonly percent: number;
  readonly source: SourceKey;
}

/** One additive: what it is made of, how it is measured, how strong it usually is, what to beware of. */
export interface Additive {
  readonly id: AdditiveId;
  readonly kind: 'powder' | 'solution' | 'gas' | 'tablet';
  /** Formula of the salt or gas that carries the SO2. */
  readonly formula: string;
  readonly composition: Composition;
  /** g/mol of `formula`. */
  readonly molar_mass_g_mol: number;
  /** Grams of SO2 in a gram of `formula`, 0 to 1. */
  readonly SO2_share: number;
  readonly contains?: 'potassium' | 'sodium' | 'ammonium';
  readonly usual: readonly UsualStrength[];
  /** Ids; the sentences are the locales'. */
  readonly cautions: readonly CautionId[];
}

const K2S2O5: Composition = { K: 2, S: 2, O: 5 };
const Na2S2O5: Composition = { Na: 2, S: 2, O: 5 };
const KHSO3: Composition = { K: 1, H: 1, S: 1, O: 3 };
const NH4HSO3: Composition = { N: 1, H: 5, S: 1, O: 3 };
const SO2: Composition = { S: 1, O: 2 };

const row = (
  id: AdditiveId,
  kind: Additive['kind'],
  formula: string,
  composition: Composition,
  more: Pick<Additive, 'contains' | 'usual'>,
): Additive => ({
  id,
  kind,
  formula,
  composition,
  molar_mass_g_mol: molarMass(composition),
  SO2_share: SO2ShareOf(composition),
  cautions: cautionsOf(id),
  ...more,
});

/**
 * Every additive of the message language. Molar masses follow from the standard atomic weights (`atomic-weights`);
 * a test holds the shares against JECFA, USP, the OIV Codex and the Austrian law text.
 *
 * @example
 * ```ts
 * ADDITIVES['potassium-metabisulfite'].SO2_share // => 0.57629
 * ADDITIVES['sodium-metabisulfite'].molar_mass_g_mol // => 190.095
 * ```
 */
export const ADDITIVES: Readonly<Record<AdditiveId, Additive>> = {
  'potassium-metabisulfite': row('potassium-metabisulfite', 'powder', 'K2S2O5', K2S2O5, {
    contains: 'potassium',
    usual: [
      { percent: 90, source: 'jecfa-1999' }, // least assay
      { percent: 95, source: 'austrian-law' }, // least assay
      { percent: 57.6, source: 'usp-35' }, // greatest SO2 yield
    ],
  }),
  'sodium-metabisulfite': row('sodium-metabisulfite', 'powder', 'Na2S2O5', Na2S2O5, {
    contains: 'sodium',
    usual: [{ percent: 90, source: 'jecfa-1999' }], // least assay
  }),
  'potassium-metabisulfite-solution': row('potassium-metabisulfite-solution', 'solution', 'K2S2O5', K2S2O5, {
    contains: 'potassium',
    usual: [{ percent: 10, source: 'common-practice' }],
  }),
  'sodium-metabisulfite-solution': row('sodium-metabisulfite-solution', 'solution', 'Na2S2O5', Na2S2O5, {
    contains: 'sodium',
    usual: [{ percent: 10, source: 'common-practice' }],
  }),
  'potassium-bisulfite-solution': row('potassium-bisulfite-solution', 'solution', 'KHSO3', KHSO3, {
    contains: 'potassium',
    usual: [
      { percent: 15, source: 'oiv-potbis' }, // 150 g/L SO2
      { percent: 20, source: 'oiv-oeno-646-2019' }, // 200 g/L SO2 at most
    ],
  }),
  'ammonium-bisulfite-solution': row('ammonium-bisulfite-solution', 'solution', 'NH4HSO3', NH4HSO3, {
    contains: 'ammonium',
    usual: [{ percent: 40, source: 'common-practice' }],
  }),
  'sulfur-dioxide-solution': row('sulfur-dioxide-solution', 'solution', 'SO2', SO2, {
    usual: [
      { percent: 5, source: 'oiv-oeno-46-2000' }, // 50 g/L at least
      { percent: 6, source: 'ifv-grid-2024' }, // 60 to 150 g/L
    ],
  }),
  'sulfur-dioxide-gas': row('sulfur-dioxide-gas', 'gas', 'SO2', SO2, {
    usual: [{ percent: 99.9, source: 'ifv-grid-2024' }], // least purity
  }),
  tablet: row('tablet', 'tablet', 'K2S2O5', K2S2O5, {
    contains: 'potassium',
    usual: [], // a tablet is known by the grams of SO2 that it gives
  }),
};
