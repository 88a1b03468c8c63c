import { amountFor } from '../../../core/additives/amount-for.ts';
import { pKOf } from '../../../core/chemistry/dissociation.ts';
import { doseRange } from '../../../core/laboratory/dose-range.ts';
import type { DoseRange } from '../../../core/laboratory/range-request.ts';
import type { Reading } from '../../reader/understood.ts';
import type { Settings } from '../settings.ts';
import { toDoseRequest } from '../to-requests.ts';
import type { RangeData } from './lab-answer.ts';

/** How far a reading's dose may be off, and as data with the amounts; undefined where nothing was aimed at or measured. */
export function rangeOf(
  reading: Reading,
  settings: Pick<Settings, 'basis' | 'region' | 'targets'>,
): { readonly range: DoseRange; readonly data: RangeData } | undefined {
  const request = toDoseRequest(reading, settings);
  const { ph, free_mg_L, target, volume_L, additive } = request;
  if (ph === undefined || free_mg_L === undefined || target === undefined || 'add_mg_L' in target)
    return undefined;
  const { ph_plus_minus, free_plus_minus_mg_L } = reading.marks;
  const { binding_allowance_percent, binding_share } = request;
  const range = doseRange({
    ph,
    free_mg_L,
    target,
    dissociation: pKOf(request.basis, request.alcohol_percent, request.temperature_C),
    ...(binding_allowance_percent !== undefined && { binding_allowance_percent }),
    ...(binding_share !== undefined && { binding_share }),
    ...(ph_plus_minus !== undefined && { ph_plus_minus }),
    ...(free_plus_minus_mg_L !== undefined && { free_plus_minus_mg_L }),
  });
  const [low, high] = range.dose_mg_L.map((dose_mg_L) =>
    volume_L === undefined || additive === undefined
      ? undefined
      : amountFor((dose_mg_L * volume_L) / 1000, additive),
  );
  const both = (
    name: 'mass_g' | 'additive_volume_mL' | 'tablets',
  ): Partial<Record<typeof name, readonly [number, number]>> => {
    const [from, to] = [low?.[name], high?.[name]];
    return from === undefined || to === undefined ? {} : { [name]: [from, to] };
  };
  const { dose_mg_L, molecular_sure_mg_L } = range;
  return {
    range,
    data: {
      dose_mg_L,
      ...both('mass_g'),
      ...both('additive_volume_mL'),
      ...both('tablets'),
      molecular_sure_mg_L,
      ph_plus_minus: range.ph_plus_minus,
      free_plus_minus_mg_L: range.free_plus_minus_mg_L,
    },
  };
}
