import { assertWithinBounds } from '../bounds.ts';
import { shown } from '../units/shown.ts';
import { times, type Step } from '../working.ts';
import type { SolutionAnswer } from './answer.ts';
import { line, printAlike, withEnoughDigits } from './line.ts';
import type { SolutionRequest } from './request.ts';
import { measureOf } from './rounding.ts';
import { SOLUTION_RECIPES, type SolutionUse } from './solution-recipes.ts';
import { volumeInLitres } from './volume-in-litres.ts';

/**
 * A holding solution for an empty barrel, or a rinse for equipment, by the usual recipe: grams of the powder and of
 * citric acid for the volume of water.
 *
 * @param request volume in L, above 0
 * @throws RangeError for a volume outside `BOUNDS`
 *
 * Source: `SOLUTION_RECIPES` (common practice, no source).
 *
 * @example
 * ```ts
 * recipeSolution({ volume_L: 225 }, 'holding').salt_g // => 450
 * recipeSolution({ volume_L: 225 }, 'holding').citric_acid_g // => 225
 * ```
 */
export function recipeSolution(
  request: Pick<SolutionRequest, 'volume_L' | 'volume_display'>,
  use: SolutionUse,
): SolutionAnswer {
  const { volume_L, volume_display } = request;
  assertWithinBounds('make up a solution', 'volume_L', volume_L);
  const { salt_g_per_L, citric_acid_g_per_L } = SOLUTION_RECIPES[use];
  const salt_g = salt_g_per_L * volume_L;
  const citric_acid_g = citric_acid_g_per_L * volume_L;
  const make = (digits: number): readonly Step[] => {
    const { volume, lines } = volumeInLitres(volume_L, volume_display, digits);
    const perLitre = (grams: number) => times(shown(grams, 'g/L'), volume);
    return [
      ...lines,
      line('citric-acid-by-recipe', perLitre(citric_acid_g_per_L), 'g', digits),
      line('salt-by-recipe', perLitre(salt_g_per_L), 'g', digits),
    ].map(({ step }) => step);
  };
  const steps = withEnoughDigits(make, (made) => printAlike(made.at(-1)?.result.value ?? salt_g, salt_g, 3));
  return { use, salt_g, citric_acid_g, volume_L, measure: measureOf(salt_g, 'scale').measure, steps };
}
