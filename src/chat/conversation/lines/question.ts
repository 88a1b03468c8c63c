import type { AskedField, Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import type { Settings } from '../settings.ts';
import { vesselText } from './vessel.ts';
import { noteText } from './notes.ts';

/** The one question for a field, with an example of an answer. */
export function questionLine(
  field: AskedField,
  reading: Reading,
  settings: Settings,
  room: Line['room'] = 'question',
): Line {
  const { key, values } = questionOf(field, reading, settings);
  return { room, key, values: { vessel: vesselText(reading), ...values } };
}

function questionOf(field: AskedField, reading: Reading, settings: Settings): Omit<Line, 'room'> {
  const unit = reading.concentrationUnit === 'ppm' ? 'ppm' : 'mg/L';
  if (field === 'volume_L') {
    const each = noteText(reading, 'each-or-total');
    if (each !== undefined) return { key: 'ask-each-or-total', values: { text: each } };
    if (noteText(reading, 'fruit-by-weight') !== undefined) return { key: 'ask-fruit', values: {} };
    return { key: 'ask-volume_L', values: { unit: settings.volumeUnit } };
  }
  if (field === 'target') return targetQuestion(reading);
  if (field === 'additive' && reading.asks.includes('tablet_salt_g'))
    return { key: 'ask-tablet-additive', values: {} };
  if (field === 'mass_g' && noteText(reading, 'spoon') !== undefined)
    return { key: 'ask-mass-spoon', values: {} };
  return { key: `ask-${field}`, values: { unit } };
}

/** At some stages it is asked what is added; and some wine has no usual target, which is said. */
function targetQuestion({ fields }: Reading): Omit<Line, 'room'> {
  if (fields.stage === 'must' || fields.stage === 'base')
    return { key: 'ask-target-stage', values: { stage: fields.stage } };
  const unusual = fields.category === 'sparkling' || fields.category === 'fortified';
  return {
    key: 'ask-target',
    values: { usual: unusual || (fields.alcohol_percent ?? 0) >= 17 ? 'none' : 'some' },
  };
}
