import type { Measurement, VesselChange } from '../../core/cellar/entry.ts';
import { TRAIT_NAMES } from '../../core/cellar/trait-names.ts';
import type { FieldName, Fields, Reading } from '../reader/understood.ts';
import type { Here } from './here.ts';
import type { Note } from './note.ts';
import { saidFields } from './recall.ts';
import { vesselsIn } from './vessels-named.ts';
import { whenOf } from './when.ts';

const MEASURED = ['ph', 'free_mg_L', 'total_mg_L', 'temperature_C'] as const;
/** The fields of a reading that the log takes. */
export const LOGGED_FIELDS: readonly FieldName[] = [...MEASURED, ...TRAIT_NAMES, 'volume_L'];

/**
 * What a message about a vessel leaves in the log: what was measured, and what was told beside it. Nothing where the
 * message says "if", where something in it is wrong, and of what the log has had before.
 */
export function notesOfReading(reading: Reading, here: Here): Note[] {
  const { intent, problems, marks, noted = [] } = reading;
  const vessels = vesselsIn(reading.fields);
  if (vessels.length === 0 || problems.length > 0 || marks.conditional) return [];
  if (intent !== 'dose' && intent !== 'reading' && intent !== 'effect') return [];
  const fresh = without(saidFields(reading), noted);
  const measured = pick(fresh, MEASURED);
  const traits = pick(fresh, TRAIT_NAMES);
  const volume_L = fresh.volume_L === undefined ? undefined : fresh.volume_L / vessels.length;
  const beside = { vessels, ...traits, ...(volume_L !== undefined && { volume_L }), ...remarkOf(reading) };
  const { at } = whenOf(reading, here, lastAdditionAt(vessels, here));
  if (Object.keys(measured).length > 0) {
    const happening: Measurement = { kind: 'reading', ...measured, ...beside };
    return [{ happening, at }];
  }
  const isTold = Object.keys(traits).length > 0 || volume_L !== undefined;
  if (!isTold || intent !== 'dose') return [];
  const happening: VesselChange = { kind: 'vessel', event: 'told', ...beside };
  // What a button tells of the wine is told when it is pressed.
  return [{ happening, at: reading.said_at === undefined ? at : here.message.at }];
}

/** When something last went into one of these vessels, in milliseconds since 1970. */
export function lastAdditionAt(vessels: readonly string[], { vessels: known }: Here): number | undefined {
  const times = vessels.flatMap((name) => known.get(name)?.additions.at(-1)?.at ?? []);
  return times.length === 0 ? undefined : Math.max(...times);
}

/** What was remarked; that the sample was mixed from several vessels is a remark too, as its figures are those of none. */
function remarkOf({ remark, marks }: Reading): { remark?: string } {
  const said = [marks.mixedSample, remark].filter((one) => one !== undefined).join('; ');
  return said === '' ? {} : { remark: said };
}

function without(fields: Fields, names: readonly FieldName[]): Fields {
  return Object.fromEntries(Object.entries(fields).filter(([name]) => !names.includes(name as FieldName)));
}

function pick<K extends keyof Fields>(fields: Fields, keys: readonly K[]): Pick<Fields, K> {
  return Object.fromEntries(
    keys.flatMap((key) => (fields[key] === undefined ? [] : [[key, fields[key]]])),
  ) as Pick<Fields, K>;
}
