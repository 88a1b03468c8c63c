import { STAGES_WITHOUT_TARGET } from '../../../core/wine.ts';
import { hasNoUsualTarget } from '../../reader/finish-reading.ts';
import type { AskedField, Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { volumeText } from '../../replies/volume-text.ts';
import type { Manner } from '../manner.ts';
import type { Settings } from '../settings.ts';
import { vesselText } from './vessel.ts';
import { noteText } from './notes.ts';
import { wholeExample } from './whole-example.ts';

/** The one question for a field, with an example of an answer. */
export function questionLine(
  field: AskedField,
  reading: Reading,
  manner: Manner,
  settings: Settings,
  room: Line['room'] = 'question',
): Line {
  const { key, values } = questionOf(field, reading, manner, settings);
  return { room, key, values: { vessel: vesselText(reading), ...values } };
}

function questionOf(
  field: AskedField,
  reading: Reading,
  manner: Manner,
  settings: Settings,
): Omit<Line, 'room'> {
  if (field === 'volume_L') {
    if (noteText(reading, 'fruit-by-weight') !== undefined) return { key: 'ask-fruit', values: {} };
    if (reading.intent === 'solution') return { key: 'ask-solution-volume', values: { use: useOf(reading) } };
    const { volumeChoices: [said_L, known_L] = [] } = reading.marks;
    if (said_L !== undefined) return whichVolume(said_L, known_L, manner);
    return { key: 'ask-volume_L', values: { unit: settings.volumeUnit, count: countText(reading) } };
  }
  if (field === 'target') return targetQuestion(reading, manner, settings);
  if (field === 'additive' && reading.asks.includes('tablet_salt_g'))
    return { key: 'ask-tablet-additive', values: {} };
  if (field === 'mass_g' && noteText(reading, 'spoon') !== undefined)
    return { key: 'ask-mass-spoon', values: {} };
  if (field === 'strength_percent')
    return { key: 'ask-strength_percent', values: { named: reading.fields.additive ?? 'other' } };
  return { key: `ask-${field}`, values: { unit: manner.unit } };
}

function useOf({ marks: { solutionUse } }: Reading): string {
  if (solutionUse === 'cleaning') return 'rinse';
  return solutionUse === 'holding' ? 'holding' : 'stock';
}

/** A volume that is far from the one known, or more than the vessel holds. */
function whichVolume(said_L: number, known_L: number | undefined, manner: Manner): Omit<Line, 'room'> {
  const text = (volume_L: number): string => volumeText(volume_L, manner.volumeUnit, manner.mark);
  return {
    key: 'ask-volume-which',
    values: { said: text(said_L), known: known_L === undefined ? 'none' : text(known_L) },
  };
}

function countText({ fields }: Reading): string {
  return fields.vessels === undefined ? 'one' : 'several';
}

/** At some stages it is asked what is added; and some wine has no usual target, which is said. */
function targetQuestion(reading: Reading, manner: Manner, settings: Settings): Omit<Line, 'room'> {
  const { fields } = reading;
  if (STAGES_WITHOUT_TARGET.includes(fields.stage ?? 'finished'))
    return { key: 'ask-target-stage', values: wholeExample(reading, manner, settings) };
  return { key: 'ask-target', values: { usual: hasNoUsualTarget(fields) ? 'none' : 'some' } };
}
