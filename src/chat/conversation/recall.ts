import type { AdditiveNoted } from '../../core/cellar/entry.ts';
import { TRAIT_NAMES } from '../../core/cellar/trait-names.ts';
import type { Vessel } from '../../core/cellar/vessel.ts';
import { DAY_ms } from '../../core/time/durations.ts';
import { finishReading } from '../reader/finish-reading.ts';
import type { FieldName, Fields, Reading } from '../reader/understood.ts';
import type { Here } from './here.ts';
import type { Plan } from './plan.ts';
import { totalOfVessel } from './total-of-vessel.ts';

/** What is filled in from memory, by what is asked. Free SO2 never is: it is measured. */
const FILLED: Readonly<Partial<Record<Reading['intent'], readonly FieldName[]>>> = {
  dose: ['volume_L', 'ph', 'total_mg_L', ...TRAIT_NAMES],
  effect: ['volume_L', 'total_mg_L', ...TRAIT_NAMES],
  added: ['volume_L'],
};

type Facts = Partial<Record<FieldName, { readonly value: unknown; readonly at: number }>>;

/** The facts about a vessel by the names of the fields that they stand for. */
function factsOf(vessel: Vessel, oldest_pH: number): Facts {
  const { volume_L, ph, traits } = vessel;
  const total = totalOfVessel(vessel);
  return {
    ...traits,
    ...(total && { total_mg_L: { value: total.total_mg_L, at: total.at } }),
    ...(volume_L && { volume_L }),
    ...(ph && ph.at >= oldest_pH && { ph }),
  };
}

/** The additive where none is named: of an addition what was planned, else what is used for this vessel. */
function additiveFor(
  { intent, fields, marks }: Reading,
  name: string,
  here: Here,
): { readonly value: AdditiveNoted; readonly at: number } | undefined {
  if (fields.additive !== undefined || marks.unnamedAdditive || marks.campden) return undefined;
  const plan = intent === 'added' ? here.plans.get(name) : undefined;
  if (plan && isMeasuredAlike(plan, fields)) return { value: plan, at: plan.at };
  return here.vessels.get(name)?.usual;
}

/** Grams were planned and grams went in; a solution is planned and told in millilitres, Campden tablets by their number. */
function isMeasuredAlike(plan: Plan, fields: Fields): boolean {
  if (fields.added_mg_L !== undefined) return true;
  return (['mass_g', 'additive_volume_mL', 'tablets'] as const).some(
    (amount) => plan[amount] !== undefined && fields[amount] !== undefined,
  );
}

function additiveFacts({ value: noted, at }: { readonly value: AdditiveNoted; readonly at: number }): Facts {
  const names = ['additive', 'strength_percent', 'tablet_SO2_g', 'tablet_salt_g'] as const;
  return Object.fromEntries(
    names.flatMap((name) => (noted[name] === undefined ? [] : [[name, { value: noted[name], at }]])),
  );
}

/** A dose that is computed from a target, where neither an allowance nor a share was said, gets the cellar's allowance. */
export function withAllowance(reading: Reading, { settings }: Pick<Here, 'settings'>): Reading {
  const { intent, fields, recalled, problems } = reading;
  const { allowance_percent: percent } = settings;
  if (percent === undefined || intent !== 'dose' || problems.length > 0) return reading;
  if (fields.binding_allowance_percent !== undefined || fields.binding_share !== undefined) return reading;
  if (fields.target !== undefined && 'add_mg_L' in fields.target) return reading;
  return {
    ...reading,
    fields: { ...fields, binding_allowance_percent: percent },
    // Of no time: it is a setting.
    recalled: { ...recalled, binding_allowance_percent: 0 },
  };
}

/**
 * A reading with what is known of its vessel in the place of what it does not say; what was said always goes first, and
 * every fact that was filled in stands in `recalled` with the time it is of.
 */
export function recall(reading: Reading, here: Here): Reading {
  const { fields, intent, problems, marks } = reading;
  const names = FILLED[intent];
  if (fields.vessel === undefined || names === undefined || problems.length > 0) return reading;
  const vessel = here.vessels.get(fields.vessel);
  const facts = vessel ? factsOf(vessel, here.message.at - here.settings.ph_days * DAY_ms) : {};
  const additive = additiveFor(reading, fields.vessel, here);
  const wanted = { ...(additive && additiveFacts(additive)), ...only(facts, names) };
  const isAddition = fields.target !== undefined && 'add_mg_L' in fields.target;
  const isAsked = marks.volumeChoices ?? marks.fruitByWeight ?? marks.eachOrTotal;
  const fresh = Object.entries(wanted).filter(
    ([name]) =>
      fields[name as keyof Fields] === undefined &&
      !(name === 'volume_L' && isAsked) &&
      !(name === 'total_mg_L' && isBelowFree(wanted, fields)) &&
      !(name === 'ph' && isAddition),
  );
  if (fresh.length === 0) return reading;
  const { assumed: _assumed, asks: _asks, ...draft } = reading;
  const isSalt = additive?.value.strength_of === 'salt' && fields.strength_percent === undefined;
  return finishReading(
    {
      ...draft,
      fields: { ...fields, ...Object.fromEntries(fresh.map(([name, known]) => [name, known.value])) },
      ...totalOf(vessel, fresh),
      // A strength of the salt is no strength of SO2: it goes with the figure.
      ...(isSalt && { strength_of: 'salt' as const }),
      recalled: { ...reading.recalled, ...Object.fromEntries(fresh.map(([name, { at }]) => [name, at])) },
    },
    here.settings,
  );
}

/** A total that was measured before and lies below what is free now tells nothing of this wine. */
const isBelowFree = ({ total_mg_L }: Facts, { free_mg_L }: Fields): boolean =>
  free_mg_L !== undefined && typeof total_mg_L?.value === 'number' && total_mg_L.value < free_mg_L;

/** How a total that was filled in comes about. */
function totalOf(
  vessel: Vessel | undefined,
  fresh: readonly (readonly [string, unknown])[],
): Pick<Reading, 'totalOf'> {
  const total = vessel && totalOfVessel(vessel);
  if (total === undefined || total.since_mg_L === 0 || fresh.every(([name]) => name !== 'total_mg_L'))
    return {};
  return { totalOf: { measured_mg_L: total.measured_mg_L, since_mg_L: total.since_mg_L } };
}

function only(facts: Facts, names: readonly FieldName[]): Facts {
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
  const { recalled: _recalled, totalOf: _sum, ...said } = reading;
  return { ...said, fields: saidFields(reading) };
}
