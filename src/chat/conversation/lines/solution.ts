import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import { SOLUBILITIES, type SolublePowder } from '../../../core/additives/solubility.ts';
import type { SolutionAnswer } from '../../../core/dose/answer.ts';
import type { SolutionRequest } from '../../../core/dose/request.ts';
import { SOLUTION_RECIPES, type SolutionUse } from '../../../core/dose/solution-recipes.ts';
import { SOURCES } from '../../../core/sources.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import { massText, measureText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { volumeText } from '../../replies/volume-text.ts';
import type { Manner } from '../manner.ts';
import type { Turn } from '../outcome.ts';
import type { Settings } from '../settings.ts';
import { additiveVolumeText } from './amount-text.ts';
import { line } from './line.ts';
import { vesselText } from './vessel.ts';

/** Where the rule on water holds, and where nobody has set a market yet. */
const WATER_IS_LIMITED: readonly Settings['region'][] = ['us', 'oiv'];

/** How strong a stock is, how long that holds, what it brings into a barrel, and that it brings water. */
export function stockLines(
  { strength_SO2_g_per_100_mL: SO2_g, per_barrel, keeps }: SolutionAnswer,
  { manner, settings }: Turn,
): Line[] {
  const { mark } = manner;
  return [
    ...(SO2_g === undefined
      ? []
      : [line('effect', 'solution-strength', { strength: numberText(SO2_g, 2, mark) })]),
    ...(per_barrel === undefined
      ? []
      : [
          line('effect', 'solution-per-barrel', {
            barrel: volumeText(per_barrel.barrel_L, 'L', mark),
            adds: numberText(per_barrel.one_mL_adds_mg_L, 3, mark),
            rise: numberText(per_barrel.rise_mg_L, 1, mark),
            amount: additiveVolumeText(per_barrel.additive_volume_mL, mark),
          }),
          ...(WATER_IS_LIMITED.includes(settings.region) ? [line('effect', 'solution-us-water')] : []),
        ]),
    ...(keeps === undefined ? [] : [line('effect', 'solution-fresh')]),
  ];
}

/** What becomes of a holding solution or a rinse: never wine, the air, the drain. */
export function afterUseLines(reading: Reading, use: SolutionUse): Line[] {
  return [
    line('effect', 'solution-air'),
    line('effect', use === 'holding' ? 'solution-for-holding' : 'solution-for-rinse'),
    line('effect', 'solution-drain'),
    line('effect', 'solution-not-wine', { vessel: vesselText(reading) }),
  ];
}

/** A holding solution or a rinse by the usual recipe: what goes in, in which order, and whose figures these are. */
export function recipeLines(
  reading: Reading,
  { additive: { id } }: SolutionRequest,
  answer: SolutionAnswer,
  { mark, volumeUnit }: Manner,
): Line[] {
  const { use = 'rinse', salt_g = 0, citric_acid_g = 0, volume_L } = answer;
  const recipe = SOLUTION_RECIPES[use];
  return [
    line('first', `solution-${use}`, {
      volume: volumeText(volume_L, volumeUnit, mark),
      acid: massText(citric_acid_g, mark),
      amount: answer.measure ? measureText(answer.measure, mark) : massText(salt_g, mark),
      additive: id,
    }),
    line('effect', 'solution-order'),
    ...afterUseLines(reading, use),
    line('effect', 'solution-practice', {
      use,
      salt: numberText(recipe.salt_g_per_L, 1, mark),
      acid: numberText(recipe.citric_acid_g_per_L, 1, mark),
      litres: numberText(volume_L, 0, mark),
    }),
  ];
}

/** That so much does not surely dissolve, with the published figures; or that there is none for water so cold. */
export function solubilityLines(
  { solubility }: SolutionAnswer,
  additive: AdditiveId,
  { mark }: Manner,
): Line[] {
  if (solubility === undefined) return [];
  const { says, salt_g_per_L, least_g_per_L, most_g_per_L, at_C, temperature_C } = solubility;
  const celsius = numberText(at_C, 0, mark);
  if (says === 'unknown-when-colder') return [line('effect', 'solution-colder', { celsius })];
  const wanted = numberText(salt_g_per_L, 0, mark);
  const titles = SOLUBILITIES[additive as SolublePowder].map((one) => SOURCES[one.source].title);
  if (salt_g_per_L <= least_g_per_L)
    return [
      line('first', 'solution-too-cold', {
        wanted,
        water: numberText(temperature_C ?? at_C, 1, mark),
        most: numberText(least_g_per_L, 0, mark),
        celsius,
        source: titles[0] ?? '',
      }),
    ];
  return [
    line('first', 'solution-too-much', {
      wanted,
      additive,
      celsius,
      least: least_g_per_L === most_g_per_L ? 'none' : numberText(least_g_per_L, 0, mark),
      most: numberText(most_g_per_L, 0, mark),
      source: titles.join('; '),
    }),
  ];
}
