import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import type { SolutionAnswer } from '../../../core/dose/answer.ts';
import type { SolutionRequest } from '../../../core/dose/request.ts';
import { solution } from '../../../core/dose/solution.ts';
import type { Step } from '../../../core/working.ts';
import type { Reading } from '../../reader/understood.ts';
import { massText, measureText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { volumeText } from '../../replies/volume-text.ts';
import { buttonsFor } from '../buttons.ts';
import { additiveVolumeText } from '../lines/amount-text.ts';
import { assumedLines } from '../lines/assumed.ts';
import { cautionLines } from '../lines/cautions.ts';
import { factLines } from '../lines/facts.ts';
import { line } from '../lines/line.ts';
import { afterUseLines, recipeLines, solubilityLines, stockLines } from '../lines/solution.ts';
import { workingLines } from '../lines/working.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { toSolutionRequest } from '../to-requests.ts';
import { missing } from './missing.ts';

/** A solution in water: a stock, a holding solution or a rinse. Never a dose for wine, and nothing of it is logged. */
export function answerSolution(reading: Reading, turn: Turn): Outcome {
  const request = toSolutionRequest(reading);
  if (request === undefined) return missing(reading, turn);
  const answer = solution(request);
  if (answer.citric_acid_g !== undefined) return byRecipe(reading, request, answer, turn);
  if (reading.asks.length > 0) return missing(reading, turn);
  if (answer.solubility?.says === 'too-much') return tooMuch(reading, answer, turn);
  const { id } = request.additive;
  if (answer.salt_g === undefined && answer.additive_volume_mL === undefined)
    return fromPowder(reading, turn);
  const first = firstOfSolution(answer, id, turn);
  return whole(reading, request, answer, turn, [
    first,
    ...(answer.use === undefined ? stockLines(answer, turn) : afterUseLines(reading, answer.use)),
    ...solubilityLines(answer, whatGoesIn(id), turn.manner),
  ]);
}

function byRecipe(reading: Reading, request: SolutionRequest, answer: SolutionAnswer, turn: Turn): Outcome {
  return whole(reading, request, answer, turn, recipeLines(reading, request, answer, turn.manner));
}

/** The working of a solution, with the lines about a barrel. */
export const stepsOfSolution = ({ steps, per_barrel }: SolutionAnswer): readonly Step[] => [
  ...steps,
  ...(per_barrel?.steps ?? []),
];

/** More than surely dissolves gets no figures to make it by. */
function tooMuch(reading: Reading, answer: SolutionAnswer, { manner }: Turn): Outcome {
  const id = whatGoesIn(reading.fields.additive ?? reading.assumed.additive ?? 'potassium-metabisulfite');
  const lines = solubilityLines(answer, id, manner);
  return { answer, inRound: lines, lines: [...lines, ...factLines(reading, manner)], buttons: [] };
}

function whole(
  reading: Reading,
  request: SolutionRequest,
  answer: SolutionAnswer,
  turn: Turn,
  lines: readonly Line[],
): Outcome {
  const { manner } = turn;
  const inFull = !turn.cautioned.has(request.additive.id);
  const isAcid = answer.citric_acid_g !== undefined;
  return {
    answer,
    inRound: lines.slice(0, 1),
    lines: [
      ...lines,
      ...factLines(reading, manner),
      ...assumedLines(reading, manner),
      ...workingLines(stepsOfSolution(answer), manner),
      ...cautionLines(request.additive, inFull || isAcid, isAcid ? 'water-with-acid' : 'water'),
    ],
    buttons: buttonsFor(turn.ref, inFull || isAcid ? ['w'] : ['w', 's']),
  };
}

/** A solution that is bought as it is cannot be made up here: only a stock of powder can. */
function fromPowder(reading: Reading, { manner }: Turn): Outcome {
  const written = reading.where.volume_L?.text;
  const volume = written ?? volumeText(reading.fields.volume_L ?? 0, manner.volumeUnit, manner.mark);
  const first = line('first', 'solution-from-powder', { volume });
  return { answer: null, inRound: [first], lines: [first, ...factLines(reading, manner)], buttons: [] };
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
