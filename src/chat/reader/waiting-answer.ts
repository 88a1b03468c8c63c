import { litresFrom } from '../../core/units/volume.ts';
import { readDecimal, readNumeral } from './numbers.ts';
import type { AwaitedField, Fields, Reading, ReaderSettings } from './understood.ts';

const bare = /^([+-]?)(\d+(?:[.,']\d+)?|\d{1,3}(?: \d{3})+)\s*(%|g|ppm|mg\/l|l|ph)?[.!]?$/;

/** The fields that a bare number means while the bot waits for one. */
function fieldsFor(
  field: AwaitedField['field'],
  value: number,
  unit: string | undefined,
  settings: ReaderSettings,
): Fields | undefined {
  const asked = (allowed: readonly (string | undefined)[]): boolean => allowed.includes(unit);
  switch (field) {
    case 'volume_L':
      if (settings.volumeUnit === 'barrel') return undefined;
      return asked([undefined]) ? { volume_L: litresFrom(value, settings.volumeUnit) } : undefined;
    case 'ph':
      return asked([undefined, 'ph']) ? { ph: value } : undefined;
    case 'free_mg_L':
      return asked([undefined, 'ppm', 'mg/l']) ? { free_mg_L: value } : undefined;
    case 'target':
      if (!asked([undefined, 'ppm', 'mg/l'])) return undefined;
      return { target: value <= 2 ? { molecular_mg_L: value } : { free_mg_L: value } };
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
  const fields = numeral.unsure ? undefined : fieldsFor(waiting.field, value, match[3], settings);
  const problems = numeral.unsure
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

const outOfBounds = (fields: Fields, about: string): Reading['problems'] => {
  const { ph, volume_L, free_mg_L } = fields;
  if (ph !== undefined && (ph < 2.5 || ph > 4.8)) return [{ code: 'ph-out-of-range', about }];
  if (volume_L !== undefined && volume_L <= 0) return [{ code: 'volume-not-positive', about }];
  if (volume_L !== undefined && volume_L > 10_000_000) return [{ code: 'value-out-of-range', about }];
  if (free_mg_L !== undefined && free_mg_L < 0) return [{ code: 'negative-value', about }];
  if (free_mg_L !== undefined && free_mg_L > 1000) return [{ code: 'value-out-of-range', about }];
  return [];
};
