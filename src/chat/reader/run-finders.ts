import type { Board, Finder } from './board.ts';
import { findAdditiveVolume } from './finders/additive-volume.ts';
import { findAdditive } from './finders/additive.ts';
import { findAllowance } from './finders/allowance.ts';
import { findBottling } from './finders/bottling.ts';
import { findFruitState, findYield } from './finders/fruit.ts';
import { findBarrels } from './finders/barrels.ts';
import { findLawFacts } from './finders/law-facts.ts';
import { findKind } from './finders/kind.ts';
import { findLabelled } from './finders/labels.ts';
import { findLetterPair } from './finders/letter-pair.ts';
import { findLookAlike } from './finders/look-alike.ts';
import { findMass } from './finders/mass.ts';
import { findMixedSample } from './finders/mixed-sample.ts';
import { findNumberWord } from './finders/number-word.ts';
import { findOtherAdditive } from './finders/other-additive.ts';
import { findOtherQuantities } from './finders/other-quantities.ts';
import { findOtherFigures } from './finders/other-figures.ts';
import { findPairs } from './finders/pairs.ts';
import { findPastTense } from './finders/past-tense.ts';
import { findPercentAndDegree } from './finders/percent-and-degree.ts';
import { findPowderOrSO2 } from './finders/powder-or-so2.ts';
import { findRate } from './finders/rate.ts';
import { findSolutionUse } from './finders/solution-use.ts';
import { findSpoon } from './finders/spoon.ts';
import { findStage } from './finders/stage.ts';
import { findTablets } from './finders/tablets.ts';
import { findMolecular } from './finders/molecular.ts';
import { findTarget } from './finders/target.ts';
import { findWay } from './finders/way.ts';
import { findAddition } from './finders/addition.ts';
import { findVessel } from './finders/vessel.ts';
import { findVolume } from './finders/volume.ts';
import { settleBounds } from './refine/bounds.ts';
import { settleConflicts } from './refine/conflicts.ts';
import { readUnlabelled } from './refine/unlabelled.ts';
import { findChemicalLot } from './finders/chemical-lot.ts';
import { findPlusMinus } from './finders/plus-minus.ts';
import { findWhen } from './finders/when.ts';

/** From the most certain to the least: what one has claimed, no later one reads. */
const FINDERS: readonly Finder[] = [
  findMixedSample,
  findStage,
  findPastTense,
  findChemicalLot,
  findWhen,
  findPlusMinus,
  findLookAlike,
  findLetterPair,
  findVessel,
  findLawFacts,
  findBottling,
  findOtherFigures,
  findSolutionUse,
  findOtherQuantities,
  findAllowance,
  findSpoon,
  findYield,
  findRate,
  findTablets,
  findBarrels,
  findAdditive,
  findPowderOrSO2,
  findAdditiveVolume,
  findVolume,
  findMass,
  findFruitState,
  findNumberWord,
  findWay,
  findTarget,
  findMolecular,
  findAddition,
  findLabelled,
  findPercentAndDegree,
  findKind,
  findPairs,
  findOtherAdditive,
  readUnlabelled,
  settleConflicts,
  settleBounds,
];

/** Runs every finder and refiner over a board; what they find stands on it. */
export function runFinders(board: Board): void {
  for (const find of FINDERS) find(board);
}
