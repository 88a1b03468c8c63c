import type { AdditiveAtHand } from '../additives/additive-id.ts';
import { ADDITIVES } from '../additives/additives.ts';
import { SO2ContentOf, SO2Per } from '../additives/so2-content.ts';
import { dissolves, SOLUBILITIES, type SolublePowder } from '../additives/solubility.ts';
import { SO2In } from '../additives/so2-in.ts';
import { assertWithinBounds } from '../bounds.ts';
import type { StepName } from '../step-names.ts';
import { shown } from '../units/shown.ts';
import { over, times } from '../working.ts';
import type { SolubilityNote, SolutionAnswer } from './answer.ts';
import { effectSteps } from './effect-steps.ts';
import { line, printAlike, withEnoughDigits } from './line.ts';
import { recipeSolution } from './recipe-solution.ts';
import type { SolutionRequest } from './request.ts';
import { measureOf, toStep } from './rounding.ts';
import { stockPerBarrel } from './stock-per-barrel.ts';
import { number } from './terms.ts';
import { volumeInLitres } from './volume-in-litres.ts';

const mL_of = (volume_L: number): number => volume_L * 1000;

/** 100 mL as the working shows it beside litres. */
const TENTH_L = shown(0.1, 'L');

/** A stock of 100 mL holds just its strength, so that nothing is left to reckon. */
const isHundred_mL = (volume_L: number): boolean => Math.abs(volume_L - 0.1) < 1e-12;

/** A stock of a stated strength: what salt to weigh, filled up to the volume. */
function byStrength(request: SolutionRequest): SolutionAnswer {
  const { volume_L, additive } = request;
  const content = SO2ContentOf(additive);
  if (content === undefined || content.per !== 'mL') return { volume_L, steps: [] };
  const strength_SO2_g_per_100_mL = 100 * SO2Per(content);
  const whole = { volume_L, strength_SO2_g_per_100_mL };
  const perHundred = content.of === 'salt-solution' ? content.salt_g_per_100_mL : undefined;
  const isWeighed = ADDITIVES[additive.id].formula.endsWith('S2O5');
  if (perHundred === undefined || !isWeighed) return { ...whole, steps: [] };
  const salt_g = (perHundred / 100) * mL_of(volume_L);
  const rounded = measureOf(salt_g, 'scale');
  const make = (digits: number) => {
    // In grams per 100 mL the figure is what 100 mL hold, in grams.
    const held = shown(perHundred, 'g');
    const share = number(ADDITIVES[additive.id].SO2_share, digits);
    const SO2 = line('solution-strength-by-salt', times(held, share), 'g', digits);
    if (isHundred_mL(volume_L)) return { lines: [SO2], salt_g };
    const { volume, lines } = volumeInLitres(volume_L, request.volume_display, digits);
    const salt = line('salt-mass', times(over(held, TENTH_L), volume), 'g', digits);
    return { lines: [SO2, ...lines, salt], salt_g: salt.step.result.value };
  };
  const made = withEnoughDigits(
    make,
    (printed) => toStep(printed.salt_g, rounded.step) === toStep(salt_g, rounded.step),
  );
  return { salt_g, ...whole, measure: rounded.measure, steps: made.lines.map(({ step }) => step) };
}

/** A stock of what is said to go in: how strong it is. */
function byAmount(request: SolutionRequest, additive: AdditiveAtHand): SolutionAnswer {
  const { volume_L, volume_display, ...goesIn } = request;
  const { mass_g, additive_volume_mL } = goesIn;
  const amount = {
    ...(mass_g === undefined ? {} : { salt_g: mass_g }),
    ...(additive_volume_mL === undefined ? {} : { additive_volume_mL }),
  };
  const SO2_g = SO2In(request, additive);
  if (SO2_g === undefined) return { ...amount, volume_L, steps: [] };
  const strength_SO2_g_per_100_mL = (100 * SO2_g) / mL_of(volume_L);
  const rounded = measureOf(mass_g ?? additive_volume_mL ?? 0, mass_g === undefined ? 'cylinder' : 'scale');
  const content = SO2ContentOf(additive);
  const [first] = effectSteps({
    request: { ...goesIn, additive },
    ...(content === undefined ? {} : { content }),
    leadsTo: undefined,
  });
  const strength = withEnoughDigits(
    (digits) => {
      if (isHundred_mL(volume_L)) return [];
      const SO2 = shown(first?.result.value ?? SO2_g, 'g', digits);
      const { volume, lines } = volumeInLitres(volume_L, volume_display, digits);
      return [...lines, line('solution-strength', times(over(SO2, volume), TENTH_L), 'g', digits)];
    },
    (lines) =>
      printAlike(lines.at(-1)?.step.result.value ?? strength_SO2_g_per_100_mL, strength_SO2_g_per_100_mL),
  );
  return {
    ...amount,
    volume_L,
    strength_SO2_g_per_100_mL,
    measure: rounded.measure,
    steps: [...(first === undefined ? [] : [first]), ...strength.map(({ step }) => step)],
  };
}

/**
 * A stock in water: what to weigh and fill up to the volume, and its strength in grams of SO2 per 100 mL; or, where
 * it is said what goes in, the strength that this gives. Only metabisulfite is weighed; of other solutions the answer
 * is the strength alone; where neither strength nor amount is known, no figure. More than surely dissolves gets no
 * figure either. A holding solution or a rinse without strength and amount is made by the usual recipe.
 *
 * @param request volume in L; additive with its strength (grams per 100 mL), or a mass in g, or mL of a stronger solution
 * @throws RangeError for figures outside `BOUNDS`
 *
 * Source: shares of SO2 from `additives`; `SOLUBILITIES`; `SOLUTION_RECIPES`.
 *
 * @example
 * ```ts
 * solution({ volume_L: 5, additive: { id: 'potassium-metabisulfite-solution', strength_percent: 10 } }).salt_g // => 500
 * solution({ volume_L: 0.1, mass_g: 10, additive: { id: 'potassium-metabisulfite' } }).strength_SO2_g_per_100_mL // => 5.7629
 * ```
 */
export function solution(request: SolutionRequest): SolutionAnswer {
  assertWithinBounds('make up a solution', 'volume_L', request.volume_L);
  assertWithinBounds('make up a solution', 'mass_g', request.mass_g);
  assertWithinBounds('make up a solution', 'additive_volume_mL', request.additive_volume_mL);
  assertWithinBounds('make up a solution', 'temperature_C', request.temperature_C);
  const { additive, mass_g, additive_volume_mL, use } = request;
  const isByAmount = mass_g !== undefined || additive_volume_mL !== undefined;
  if (use !== undefined && !isByAmount && additive.strength_percent === undefined)
    return recipeSolution(request, use);
  const answer = isByAmount ? byAmount(request, weighed(additive, mass_g)) : byStrength(request);
  const powder = powderOf(additive);
  const solubility = powder === undefined ? undefined : solubilityOf(powder, answer, request.temperature_C);
  if (solubility?.says === 'too-much') return { volume_L: request.volume_L, solubility, steps: [] };
  return {
    ...answer,
    ...(use === undefined ? ofStock(answer, request) : { use }),
    ...(solubility === undefined ? {} : { solubility }),
  };
}

/** The lines that print how strong a stock is; of 100 mL it is the SO2 that goes in. */
const STRENGTH_LINES: readonly StepName[] = [
  'solution-strength-by-salt',
  'solution-strength',
  'so2-in-amount',
];

/** How long a stock may be trusted, and what it brings into a barrel; nothing where it is not known how strong it is. */
function ofStock(answer: SolutionAnswer, { rise_mg_L }: SolutionRequest): Partial<SolutionAnswer> {
  const { strength_SO2_g_per_100_mL: strength } = answer;
  const isMade = answer.salt_g !== undefined || answer.additive_volume_mL !== undefined;
  if (!isMade || strength === undefined || strength <= 0) return {};
  const printed_g = answer.steps.find(({ name }) => STRENGTH_LINES.includes(name))?.result.value;
  return { keeps: 'days-to-weeks', per_barrel: stockPerBarrel(strength, { rise_mg_L, printed_g }) };
}

/** The powder of which a stock is made. */
function powderOf({ id }: AdditiveAtHand): SolublePowder | undefined {
  const isPotassium = id === 'potassium-metabisulfite' || id === 'potassium-metabisulfite-solution';
  if (isPotassium) return 'potassium-metabisulfite';
  const isSodium = id === 'sodium-metabisulfite' || id === 'sodium-metabisulfite-solution';
  return isSodium ? 'sodium-metabisulfite' : undefined;
}

/** That so much salt does not surely dissolve, or that no figure is known for water so cold. */
function solubilityOf(
  powder: SolublePowder,
  { salt_g, volume_L }: SolutionAnswer,
  temperature_C: number | undefined,
): SolubilityNote | undefined {
  if (salt_g === undefined) return undefined;
  const salt_g_per_L = salt_g / volume_L;
  const published = SOLUBILITIES[powder];
  const { at_C } = published[0];
  const values = {
    salt_g_per_L,
    least_g_per_L: published[0].salt_g_per_L,
    most_g_per_L: published.at(-1)?.salt_g_per_L ?? published[0].salt_g_per_L,
    at_C,
    ...(temperature_C === undefined ? {} : { temperature_C }),
  };
  if (!dissolves(powder, salt_g_per_L, temperature_C)) return { says: 'too-much', ...values };
  if (temperature_C === undefined || temperature_C >= at_C) return undefined;
  return { says: 'unknown-when-colder', ...values };
}

/** Grams beside a metabisulfite "solution" are grams of the powder that goes in. */
function weighed(additive: AdditiveAtHand, mass_g: number | undefined): AdditiveAtHand {
  if (mass_g === undefined) return additive;
  if (additive.id === 'potassium-metabisulfite-solution') return { id: 'potassium-metabisulfite' };
  if (additive.id === 'sodium-metabisulfite-solution') return { id: 'sodium-metabisulfite' };
  return additive;
}
