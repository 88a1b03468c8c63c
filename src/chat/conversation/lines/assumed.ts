import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import { ADDITIVES } from '../../../core/additives/additives.ts';
import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { volumeText } from '../../replies/volume-text.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import type { Manner } from '../manner.ts';
import { countOf } from '../to-requests.ts';
import { listLine, part } from './line.ts';
import { noteParts } from './notes.ts';
import { targetValues } from './target-text.ts';

type Part = Omit<Line, 'room'>;

/**
 * What the bot filled in, how it read what could be read otherwise, and which figures it did not use. Without a dose
 * (`weighs` false) no additive is spoken of.
 */
export function assumedLines(reading: Reading, manner: Manner, weighs = true): Line[] {
  const set = reading.setAside.map((text) => part('set-aside-figure', { text }));
  return [
    ...listLine('assumed', 'assumed', [...filledIn(reading, manner, weighs), ...noteParts(reading, manner)]),
    ...listLine('assumed', 'set-aside', set),
  ];
}

function filledIn(reading: Reading, manner: Manner, weighs: boolean): Part[] {
  const { assumed, fields, asks } = reading;
  const parts: Part[] = [];
  const additive = assumed.additive ?? powderWithoutPurity(reading);
  if (weighs && additive !== undefined && !asks.includes('additive'))
    parts.push(part('assumed-additive', { additive }));
  if (assumed.target) parts.push(part(targetKey(fields), targetValues(assumed.target, manner)));
  if (assumed.gallon) parts.push(part('assumed-gallon', { gallon: assumed.gallon }));
  if (assumed.volume_L !== undefined)
    parts.push(
      part('assumed-barrels', {
        volume: volumeText(assumed.volume_L, 'L', manner.mark),
        count: countOf(reading) === undefined ? 'one' : 'several',
      }),
    );
  return parts;
}

/** A powder that was named without its purity is reckoned as pure too. */
function powderWithoutPurity({ intent, fields, marks }: Reading): AdditiveId | undefined {
  const { additive, strength_percent, tablet_salt_g } = fields;
  if (additive === undefined || ADDITIVES[additive].kind !== 'powder' || marks.campden) return undefined;
  if (strength_percent !== undefined || tablet_salt_g !== undefined) return undefined;
  return intent === 'dose' || intent === 'effect' || intent === 'added' ? additive : undefined;
}

function targetKey(fields: Reading['fields']): SentenceKey {
  if (fields.category === 'sweet') return 'assumed-target-sweet';
  return fields.style === 'red' ? 'assumed-target-red' : 'assumed-target';
}
