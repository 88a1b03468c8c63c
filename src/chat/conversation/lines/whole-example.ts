import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { litresTo } from '../../../core/units/volume.ts';
import { numberText } from '../../replies/number-text.ts';
import type { Manner } from '../manner.ts';
import { vesselText } from './vessel.ts';
import type { Settings } from '../settings.ts';

/** What stands for a figure that the person has to put in: none is made up for them. */
const TO_FILL_IN = '…';

/** How a volume is written in a message, by its unit. */
const WRITTEN = {
  L: 'L',
  hL: 'hl',
  mL: 'mL',
  m3: 'm3',
  galUS: 'gal',
  galUK: 'imp gal',
  barrel: 'L',
} as const;

/** A whole message about a wine, made of its own vessel, volume and stage, as values of the sentence that shows it. */
export function wholeExample(
  reading: Reading,
  manner: Manner,
  settings: Settings,
  adds: string = TO_FILL_IN,
): Line['values'] {
  const vessel = vesselText(reading);
  const wine = [...(vessel === 'none' ? [] : [vessel]), volumeOf(reading, manner, settings)].join(' ');
  const count = reading.fields.vessels === undefined ? 'one' : 'several';
  return { wine, count, stage: reading.fields.stage ?? 'none', adds, unit: manner.unit };
}

/** The volume in the person's words, else as it was read; what is not known is to be filled in. */
function volumeOf({ fields, assumed, where }: Reading, manner: Manner, settings: Settings): string {
  const volume_L = fields.volume_L ?? assumed.volume_L;
  if (volume_L === undefined) return `${TO_FILL_IN} ${WRITTEN[settings.volumeUnit]}`;
  if (fields.vessels === undefined && where.volume_L !== undefined) return where.volume_L.text;
  const unit = manner.volumeUnit === 'barrel' ? 'L' : manner.volumeUnit;
  const value = numberText(litresTo(volume_L, unit), 2, '.').replace(/\s/g, '');
  return `${value} ${WRITTEN[unit]}`;
}
