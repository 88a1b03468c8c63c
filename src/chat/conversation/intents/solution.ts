import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import { solution } from '../../../core/dose/solution.ts';
import type { SolutionAnswer } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import { massText, measureText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { volumeText } from '../../replies/volume-text.ts';
import { buttonsFor } from '../buttons.ts';
import { additiveVolumeText } from '../lines/amount-text.ts';
import { assumedLines } from '../lines/assumed.ts';
import { cautionLines } from '../lines/cautions.ts';
import { factLines } from '../lines/facts.ts';
import { line } from '../lines/line.ts';
import { workingLines } from '../lines/working.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { toSolutionRequest } from '../to-requests.ts';
import { missing } from './missing.ts';

/** A stock of salt in water: what to weigh, what to fill up to, how strong it is. Never a dose for wine. */
export function answerSolution(reading: Reading, turn: Turn): Outcome {
  const request = toSolutionRequest(reading);
  if (reading.asks.length > 0 || request === undefined) return missing(reading, turn);
  const { manner } = turn;
  const answer = solution(request);
  if (answer.salt_g === undefined && answer.strength_SO2_g_per_100_mL === undefined)
    return noRecipe(reading, turn);
  const { id } = request.additive;
  if (answer.salt_g === undefined && answer.additive_volume_mL === undefined)
    return fromPowder(reading, turn);
  const inFull = !turn.cautioned.has(id);
  const first = firstOfSolution(answer, id, turn);
  return {
    answer,
    inRound: [first],
    lines: [
      first,
      ...strengthLine(answer, turn),
      line('effect', 'solution-fresh'),
      ...factLines(reading, manner),
      ...assumedLines(reading, manner),
      ...workingLines(answer.steps, manner),
      ...cautionLines(request.additive, inFull, 'water'),
    ],
    buttons: buttonsFor(turn.ref, inFull ? ['w'] : ['w', 's']),
  };
}

/** A solution to hold barrels or to clean with has a recipe of its own, which is not served yet. */
function noRecipe(reading: Reading, { manner }: Turn): Outcome {
  const first = line('first', 'solution-no-recipe');
  return { answer: null, inRound: [first], lines: [first, ...factLines(reading, manner)], buttons: [] };
}

/** A solution that is bought as it is cannot be made up here: only a stock of powder can. */
function fromPowder(reading: Reading, { manner }: Turn): Outcome {
  const written = reading.where.volume_L?.text;
  const volume = written ?? volumeText(reading.fields.volume_L ?? 0, manner.volumeUnit, manner.mark);
  const first = line('first', 'solution-from-powder', { volume });
  return { answer: null, inRound: [first], lines: [first, ...factLines(reading, manner)], buttons: [] };
}

function strengthLine({ strength_SO2_g_per_100_mL: SO2_g }: SolutionAnswer, { manner }: Turn): Line[] {
  if (SO2_g === undefined) return [];
  return [line('effect', 'solution-strength', { strength: numberText(SO2_g, 2, manner.mark) })];
}

/** A metabisulfite stock is made from its powder; other solutions are bought and only made weaker. */
function whatGoesIn(id: AdditiveId): AdditiveId {
  if (id === 'potassium-metabisulfite-solution') return 'potassium-metabisulfite';
  return id === 'sodium-metabisulfite-solution' ? 'sodium-metabisulfite' : id;
}

function firstOfSolution(answer: SolutionAnswer, id: AdditiveId, { manner }: Turn): Line {
  const { mark } = manner;
  const values = { vessel: 'none', volume: volumeText(answer.volume_L, manner.volumeUnit, mark) };
  if (answer.salt_g !== undefined) {
    const amount = answer.measure ? measureText(answer.measure, mark) : massText(answer.salt_g, mark);
    return line('first', 'solution-weigh', { ...values, amount, additive: whatGoesIn(id) });
  }
  const amount = additiveVolumeText(answer.additive_volume_mL ?? 0, mark);
  return line('first', 'solution-measure', { ...values, amount, additive: id });
}
