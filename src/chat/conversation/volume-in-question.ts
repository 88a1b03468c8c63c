import { STAGES_WITHOUT_TARGET } from '../../core/wine.ts';
import { finishReading } from '../reader/finish-reading.ts';
import type { Reading } from '../reader/understood.ts';
import type { Here } from './here.ts';

/** A volume may be so far from the one known and is still the same (share of it; own choice). */
const SAME_VOLUME_share = 0.05;

/** A vessel may hold so much more than its capacity before that is asked about: both are read off marks. */
const OVER_CAPACITY_share = 0.01;

/**
 * The reading with its volume in question, where that is far from what the vessel is known to hold, or more than it
 * can hold; undefined where it may stand. Asked once: what is answered then counts.
 */
export function volumeInQuestion(reading: Reading, here: Here): Reading | undefined {
  const { fields, marks, recalled, problems, intent } = reading;
  const { vessel: name, volume_L } = fields;
  const vessel = name === undefined ? undefined : here.vessels.get(name);
  // Where no dose is given, nothing hangs on it: the volume is taken as it was told.
  const stage = fields.stage ?? vessel?.traits.stage?.value ?? 'finished';
  if (fields.target === undefined && STAGES_WITHOUT_TARGET.includes(stage)) return undefined;
  if (vessel === undefined || volume_L === undefined || recalled?.volume_L !== undefined) return undefined;
  // What went in is a fact, whatever volume it is told with.
  if (intent !== 'dose' && intent !== 'effect' && intent !== 'reading') return undefined;
  if (problems.length > 0 || marks.volumeChoices || marks.conditional) return undefined;
  const known_L = vessel.volume_L?.value;
  const capacity_L = vessel.capacity_L?.value;
  const isOther = known_L !== undefined && Math.abs(volume_L - known_L) > SAME_VOLUME_share * known_L;
  const isOver = capacity_L !== undefined && volume_L > capacity_L * (1 + OVER_CAPACITY_share);
  if (!isOther && !isOver) return undefined;
  const { volume_L: _asked, ...others } = fields;
  const { assumed: _assumed, asks: _asks, ...draft } = reading;
  const choices = isOther ? [volume_L, known_L] : [volume_L];
  return finishReading(
    { ...draft, fields: others, marks: { ...marks, volumeChoices: choices } },
    here.settings,
  );
}
