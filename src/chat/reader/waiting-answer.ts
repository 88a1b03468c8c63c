import { litresFrom } from '../../core/units/volume.ts';
import { readDecimal, readNumeral } from './numbers.ts';
import { problemOf } from './refine/bounds.ts';
import { MOST_BARE_MOLECULAR_mg_L } from './finders/aim.ts';
import type { AwaitedField, FieldName, Fields, Reading, ReaderSettings } from './understood.ts';

/** Beyond any figure of a cellar, whatever its unit. */
const HUGE = 1e12;

const bare = /^([+-]?)(\d+(?:[.,']\d+)?|\d{1,3}(?: \d{3})+)\s*(%|g|ppm|mg\/l|l|ph)?[.!]?$/;

/** The fields that a bare number means while the bot waits for one. */
function fieldsFor(
  field: AwaitedField['field'],
  value: number,
  unit: string | undefined,
  settings: ReaderSettings,
  isOfFruit = false,
): Fields | undefined {
  const asked = (allowed: readonly (string | undefined)[]): boolean => allowed.includes(unit);
  switch (field) {
    case 'volume_L':
      // A yield is asked for too: a bare number may be either.
      if (settings.volumeUnit === 'barrel' || isOfFruit) return undefined;
      return asked([undefined]) ? { volume_L: litresFrom(value, settings.volumeUnit) } : undefined;
    case 'ph':
      return asked([undefined, 'ph']) ? { ph: value } : undefined;
    case 'free_mg_L':
      return asked([undefined, 'ppm', 'mg/l']) ? { free_mg_L: value } : undefined;
    case 'target':
      if (!asked([undefined, 'ppm', 'mg/l'])) return undefined;
      return { target: value <= MOST_BARE_MOLECULAR_mg_L ? { molecular_mg_L: value } : { free_mg_L: value } };
    case 'strength_percent':
      return asked([undefined, '%']) ? { strength_percent: value } : undefined;
    case 'tablet_salt_g':
      return asked([undefined, 'g']) ? { tablet_salt_g: value } : undefined;
    case 'tablet_SO2_g':
      return asked([undefined, 'g']) ? { tablet_SO2_g: value } : undefined;
    case 'mass_g':
      return asked([undefined, 'g']) ? { mass_g: value } : undefined;
    case 'vessel':
      return asked([undefined]) && Number.isInteger(value) ? { vessel: `tank ${value}` } : undefined;
    case 'additive':
      return undefined;
  }
}

/**
 * Reads a bare number as the answer to the question that the bot asked.
 *
 * @param text The folded message.
 * @returns A reading with that one field, or undefined where the message is more than a number.
 */
export function readWaiting(
  text: string,
  waiting: AwaitedField,
  settings: ReaderSettings,
): Reading | undefined {
  const match = bare.exec(text);
  // With a plus it says by itself what it is: so much to add.
  if (!match || match[1] === '+') return undefined;
  const raw = match[2] ?? '';
  const numeral =
    waiting.field === 'ph'
      ? { value: readDecimal(raw), unsure: false }
      : readNumeral(raw, { point: settings.language !== 'en', comma: settings.language === 'en' });
  const value = match[1] === '-' ? -numeral.value : numeral.value;
  const isHuge = !(Math.abs(value) < HUGE);
  const fields =
    numeral.unsure || isHuge
      ? undefined
      : fieldsFor(waiting.field, value, match[3], settings, waiting.reading.marks.fruitByWeight === true);
  const problems = isHuge
    ? [{ code: 'value-out-of-range' as const, about: raw.slice(0, 20) }]
    : numeral.unsure
      ? [{ code: 'ambiguous-number' as const, about: raw }]
      : outOfBounds(fields ?? {}, text);
  if (!fields && problems.length === 0) return undefined;
  return {
    intent: waiting.reading.intent,
    fields: problems.length > 0 ? {} : (fields ?? {}),
    assumed: {},
    asks: [],
    problems,
    setAside: [],
    notes: [],
    marks: {},
    where: {},
  };
}

const outOfBounds = (fields: Fields, about: string): Reading['problems'] =>
  Object.entries(fields).flatMap(([field, value]: [string, Fields[FieldName]]) => {
    const code = problemOf(field as FieldName, value);
    return code === undefined ? [] : [{ code, about }];
  });
