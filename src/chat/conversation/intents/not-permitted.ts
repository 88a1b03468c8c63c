import type { DoseAnswer } from '../../../core/dose/answer.ts';
import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import { factWarnings } from '../../../core/dose/shared-warnings.ts';
import { notPermittedBy } from '../../../core/limits/permitted.ts';
import type { Reading } from '../../reader/understood.ts';
import { assumedLines } from '../lines/assumed.ts';
import { factLines } from '../lines/facts.ts';
import { line } from '../lines/line.ts';
import { vesselText } from '../lines/vessel.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { organicOf } from '../to-requests.ts';

/**
 * What may not go in: ammonium bisulfite where it is no must, sodium salts and ammonium in organic wine of the EU and the
 * UK, any sulfite in organic wine of the US. Whom to ask, and no amount; undefined for everything else. Nothing is asked
 * first, as no answer would change it.
 */
export function notPermitted(reading: Reading, answer: DoseAnswer, turn: Turn): Outcome | undefined {
  const { manner } = turn;
  const id = reading.fields.additive ?? reading.assumed.additive;
  const refused = id && refusedAsOrganic(id, reading, answer, turn);
  if (refused) return refused;
  if (id !== 'ammonium-bisulfite-solution') return undefined;
  const { stage = 'finished' } = reading.fields;
  if (factWarnings({ additive: { id }, stage }).length === 0) return undefined;
  const first = line('first', 'refused-ammonium', { vessel: vesselText(reading) });
  return {
    answer,
    inRound: [first],
    lines: [
      first,
      line('effect', 'refused-ammonium-must', {
        stage: reading.assumed.stage === undefined ? 'said' : 'assumed',
      }),
      ...factLines(reading, manner),
      ...assumedLines(reading, manner, false),
    ],
    buttons: [],
  };
}

function refusedAsOrganic(
  additive: AdditiveId,
  reading: Reading,
  answer: DoseAnswer,
  { manner, settings: { region } }: Turn,
): Outcome | undefined {
  const { stage, product } = reading.fields;
  const organic = organicOf(reading, region);
  const against = notPermittedBy(additive, {
    region,
    ...(organic !== undefined && { organic }),
    ...(stage && { stage }),
    ...(product && { product }),
  });
  if (against?.reason !== 'organic' && against?.reason !== 'organic-none') return undefined;
  const { reason } = against;
  const first = line('first', 'refused-organic', { vessel: vesselText(reading), region, reason, additive });
  return {
    answer,
    inRound: [first],
    lines: [
      first,
      line('effect', 'refused-organic-instead', { reason }),
      ...factLines(reading, manner),
      ...assumedLines(reading, manner, false),
    ],
    buttons: [],
  };
}
