import type { DoseAnswer } from '../../../core/dose/answer.ts';
import { factWarnings } from '../../../core/dose/shared-warnings.ts';
import type { Reading } from '../../reader/understood.ts';
import { assumedLines } from '../lines/assumed.ts';
import { factLines } from '../lines/facts.ts';
import { line } from '../lines/line.ts';
import { vesselText } from '../lines/vessel.ts';
import type { Outcome, Turn } from '../outcome.ts';

/**
 * Ammonium bisulfite for a wine that is no must: whom to ask, and no amount; undefined for everything else. Nothing is
 * asked first, as no answer would change it.
 */
export function notPermitted(reading: Reading, answer: DoseAnswer, { manner }: Turn): Outcome | undefined {
  const id = reading.fields.additive ?? reading.assumed.additive;
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
