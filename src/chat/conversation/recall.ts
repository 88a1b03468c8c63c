import type { Known, Vessel } from '../../core/cellar/vessel.ts';
import { DAY_ms } from '../../core/time/durations.ts';
import { finishReading } from '../reader/finish-reading.ts';
import type { FieldName, Fields, Reading } from '../reader/understood.ts';
import type { Here } from './here.ts';

/** What is filled in from memory, by what is asked. Free SO2 never is: it is measured. */
const FILLED: Readonly<Partial<Record<Reading['intent'], readonly FieldName[]>>> = {
  dose: [
    'volume_L',
    'ph',
    'style',
    'category',
    'product',
    'organic',
    'stage',
    'alcohol_percent',
    'sugar_g_L',
  ],
  effect: ['volume_L', 'style', 'category', 'product', 'organic', 'stage', 'alcohol_percent', 'sugar_g_L'],
  added: ['volume_L'],
};

/** The facts about a vessel by the names of the fields that they stand for. */
function factsOf(vessel: Vessel, oldest_pH: number): Partial<Record<FieldName, Known<unknown>>> {
  const { volume_L, ph, traits } = vessel;
  return {
    ...traits,
    ...(volume_L && { volume_L }),
    ...(ph && ph.at >= oldest_pH && { ph }),
  };
}

/** The additive that is used for this vessel, where none is named. */
function usualOf({ usual }: Vessel, { fields, marks }: Reading): Partial<Record<FieldName, Known<unknown>>> {
  if (usual === undefined || fields.additive !== undefined || marks.unnamedAdditive || marks.campden)
    return {};
  const { additive, strength_percent } = usual.value;
  return {
    ...(additive && { additive: { ...usual, value: additive } }),
    ...(strength_percent !== undefined && { strength_percent: { ...usual, value: strength_percent } }),
  };
}

/**
 * A reading with what is known of its vessel in the place of what it does not say; what was said always goes first, and
 * every fact that was filled in stands in `recalled` with the time it is of.
 */
export function recall(reading: Reading, here: Here): Reading {
  const { fields, intent, problems, marks } = reading;
  const vessel = fields.vessel === undefined ? undefined : here.vessels.get(fields.vessel);
  const names = FILLED[intent];
  if (vessel === undefined || names === undefined || problems.length > 0) return reading;
  const facts = factsOf(vessel, here.message.at - here.settings.ph_days * DAY_ms);
  const wanted = { ...usualOf(vessel, reading), ...only(facts, names) };
  const fresh = Object.entries(wanted).filter(
    ([name]) =>
      fields[name as keyof Fields] === undefined &&
      !(name === 'volume_L' && (marks.volumeChoices || marks.fruitByWeight || marks.eachOrTotal)),
  );
  if (fresh.length === 0) return reading;
  const { assumed: _assumed, asks: _asks, ...draft } = reading;
  return finishReading(
    {
      ...draft,
      fields: { ...fields, ...Object.fromEntries(fresh.map(([name, known]) => [name, known.value])) },
      recalled: { ...reading.recalled, ...Object.fromEntries(fresh.map(([name, { at }]) => [name, at])) },
    },
    here.settings,
  );
}

function only<T>(
  facts: Partial<Record<FieldName, T>>,
  names: readonly FieldName[],
): Partial<Record<FieldName, T>> {
  return Object.fromEntries(
    names.flatMap((name) => (facts[name] === undefined ? [] : [[name, facts[name]]])),
  );
}

/** The fields that were said, without those that stand for what is known of the vessel. */
export function saidFields({ fields, recalled }: Reading): Fields {
  if (recalled === undefined) return fields;
  return Object.fromEntries(Object.entries(fields).filter(([name]) => !(name in recalled)));
}

/** The reading as it was said, before anything was filled in from memory. */
export function asSaid(reading: Reading): Reading {
  const { recalled: _recalled, ...said } = reading;
  return { ...said, fields: saidFields(reading) };
}
