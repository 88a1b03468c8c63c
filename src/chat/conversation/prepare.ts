import type { FieldName, Reading } from '../reader/understood.ts';
import type { Here } from './here.ts';
import { eventKey } from './keys.ts';
import { LOGGED_FIELDS } from './notes-of-reading.ts';
import { recall, saidFields, withAllowance } from './recall.ts';
import { volumeInQuestion } from './volume-in-question.ts';

/** A reading with what is known of its vessel: a volume that does not fit is in question, the rest is filled in. */
export function prepare(reading: Reading, here: Here): Reading {
  return withAllowance(recall(volumeInQuestion(reading, here) ?? reading, here), here);
}

/**
 * The reading with the fields that the log has had by now, so that what follows on it notes only what is new, and with
 * the event that noted them.
 */
export function asNoted(
  reading: Reading,
  { message, event = eventKey(message) }: Pick<Here, 'message' | 'event'>,
): Reading {
  const { noted = [] } = reading;
  const said = Object.keys(saidFields(reading)) as FieldName[];
  const fresh = said.filter((name) => LOGGED_FIELDS.includes(name) && !noted.includes(name));
  return fresh.length === 0 ? reading : { ...reading, noted: [...noted, ...fresh], event };
}
