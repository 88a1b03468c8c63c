import { readStrength } from '../../core/additives/read-strength.ts';
import { isWithinBounds, type BoundedField } from '../../core/bounds.ts';
import type { Problem } from '../../core/problem.ts';
import type { Target } from '../../core/wine.ts';
import type { FieldName, Fields, Reading } from '../reader/understood.ts';
import { withShared } from './with-shared.ts';

/** A problem, and the fields that it is about. */
interface Fault {
  readonly problem: Problem;
  readonly about: readonly FieldName[];
}

/** Figures that core takes only within bounds, by the same names. */
const BOUNDED = [
  'volume_L',
  'ph',
  'free_mg_L',
  'total_mg_L',
  'temperature_C',
  'alcohol_percent',
  'sugar_g_L',
  'binding_allowance_percent',
  'binding_share',
  'mass_g',
  'additive_volume_mL',
  'tablets',
  'tablet_SO2_g',
  'tablet_salt_g',
  'rate_mg_L',
  'added_mg_L',
] as const satisfies readonly (FieldName & BoundedField)[];

function outOfBounds(fields: Fields): Fault[] {
  return BOUNDED.flatMap((name) => {
    const value = fields[name];
    if (value === undefined || isWithinBounds(name, value)) return [];
    const code = name === 'ph' ? 'ph-out-of-range' : 'value-out-of-range';
    return [{ problem: { code, about: String(value) }, about: [name] } as const];
  });
}

function targetFault(target: Target | undefined): Fault[] {
  return Object.entries(target ?? {}).flatMap(([kind, value]: [string, number]): Fault[] => {
    if (isWithinBounds(`target_${kind}` as BoundedField, value)) return [];
    return [{ problem: { code: 'value-out-of-range', about: String(value) }, about: ['target'] }];
  });
}

function strengthFault(
  { additive, strength_percent: percent }: Fields,
  { strength_of, where }: Reading,
): Fault[] {
  if (additive === undefined || percent === undefined) return [];
  // What was said in one piece the reader has judged by its words; here come figures and additives said apart.
  if (additive === 'sulfur-dioxide-solution' && where.strength_percent !== undefined) return [];
  const read = readStrength(additive, percent, strength_of === 'salt');
  if (!('problem' in read)) return [];
  return [{ problem: { code: read.problem, about: `${percent}%` }, about: ['strength_percent'] }];
}

function totalFault({ free_mg_L, total_mg_L }: Fields): Fault[] {
  if (free_mg_L === undefined || total_mg_L === undefined || total_mg_L >= free_mg_L) return [];
  const problem = { code: 'total-below-free', about: `${free_mg_L}/${total_mg_L}` } as const;
  return [{ problem, about: ['free_mg_L', 'total_mg_L'] }];
}

/** An allowance and a share that binds are two ways to say one thing. */
function bindingFault({ binding_allowance_percent: allowance, binding_share: share }: Fields): Fault[] {
  if (allowance === undefined || share === undefined) return [];
  const problem = {
    code: 'conflicting-values',
    about: `+${allowance}% / ${Number(share.toPrecision(3))}`,
  } as const;
  return [{ problem, about: ['binding_allowance_percent', 'binding_share'] }];
}

/**
 * A reading whose figures fit each other also where they were said apart: in an answer to a question, in the first line
 * of a round. One that does not gets the problem, loses the figures it is about, and asks nothing.
 */
export function checkFields(reading: Reading, shared: Fields = {}): Reading {
  if (reading.problems.length > 0) return reading;
  const whole = withShared(reading, shared);
  const { fields } = whole;
  const faults = [
    ...outOfBounds(fields),
    ...targetFault(fields.target),
    ...strengthFault(fields, whole),
    ...totalFault(fields),
    ...bindingFault(fields),
  ];
  if (faults.length === 0) return reading;
  const about = faults.flatMap((fault) => fault.about);
  const kept = Object.entries(reading.fields).filter(([name]) => !about.includes(name as FieldName));
  return {
    ...reading,
    fields: Object.fromEntries(kept),
    problems: faults.map(({ problem }) => problem),
    asks: [],
  };
}
