import type { AdditiveAtHand, AdditiveId } from '../additives/additive-id.ts';
import type { Measure } from './answer.ts';

/** What is measured of an additive for one line of a round: so much for each of `count` vessels. */
export interface Weighed {
  readonly additive: AdditiveAtHand;
  readonly measure: Measure;
  readonly count: number;
}

/** What a round takes of one additive as it stands in the cellar: one of the three amounts, and how it is measured out. */
export interface TotalToFetch {
  readonly additive: AdditiveId;
  readonly strength_percent?: number;
  readonly strength_of?: 'salt';
  readonly tablet_SO2_g?: number;
  readonly tablet_salt_g?: number;
  readonly mass_g?: number;
  readonly additive_volume_mL?: number;
  readonly tablets?: number;
  readonly measure: Measure;
}

/** A scale shows hundredths of a gram at the finest, and a syringe tenths of a millilitre: their sums stay whole in hundredths. */
const HUNDREDTHS = 100;

const inSmallUnit = ({ value, unit }: Measure): number =>
  unit === 'kg' || unit === 'L' ? value * 1000 : value;

/**
 * What to fetch of each additive for a whole round: the sum of what is measured out line by line, and so of the rounded
 * amounts; nothing is rounded once more. From 1,000 g or mL on it is shown in kg or L. Additives of different strength or
 * tablets of different size are different things; they come in the order in which they are first measured.
 *
 * @param weighed what is measured of each line, in g, kg, mL, L or tablets, for each of its vessels
 *
 * @example
 * ```ts
 * totalsToFetch([{ additive: { id: 'potassium-metabisulfite' }, measure: { value: 103, unit: 'g' }, count: 1 }, { additive: { id: 'potassium-metabisulfite' }, measure: { value: 5.4, unit: 'g' }, count: 4 }]) // => [{ additive: 'potassium-metabisulfite', mass_g: 124.6, measure: { value: 124.6, unit: 'g' } }]
 * totalsToFetch([{ additive: { id: 'potassium-metabisulfite' }, measure: { value: 1.25, unit: 'kg' }, count: 1 }])[0]?.mass_g // => 1250
 * ```
 */
export function totalsToFetch(weighed: readonly Weighed[]): TotalToFetch[] {
  const alike = Map.groupBy(weighed, ({ additive, measure }) =>
    JSON.stringify([
      additive.id,
      additive.strength_percent,
      additive.strength_of,
      additive.tablet_SO2_g,
      additive.tablet_salt_g,
      kindOf(measure),
    ]),
  );
  return [...alike.values()].flatMap((same) => {
    const [first] = same;
    if (first === undefined) return [];
    const hundredths = same.reduce(
      (sum, { measure, count }) => sum + Math.round(inSmallUnit(measure) * HUNDREDTHS) * count,
      0,
    );
    const { id, ...more } = first.additive;
    return [{ additive: id, ...more, ...amountAs(kindOf(first.measure), hundredths / HUNDREDTHS) }];
  });
}

type Kind = 'mass_g' | 'additive_volume_mL' | 'tablets';

function kindOf({ unit }: Measure): Kind {
  if (unit === 'tablets') return 'tablets';
  return unit === 'g' || unit === 'kg' ? 'mass_g' : 'additive_volume_mL';
}

function amountAs(kind: Kind, sum: number): { readonly measure: Measure } & Partial<Record<Kind, number>> {
  const [small, large] =
    kind === 'tablets'
      ? (['tablets', 'tablets'] as const)
      : kind === 'mass_g'
        ? (['g', 'kg'] as const)
        : (['mL', 'L'] as const);
  const measure: Measure =
    kind === 'tablets' || sum < 1000
      ? { value: sum, unit: small }
      : { value: Number((sum / 1000).toFixed(5)), unit: large };
  return { [kind]: sum, measure };
}
