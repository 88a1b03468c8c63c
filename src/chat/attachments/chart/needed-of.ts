import type { Vessel } from '../../../core/cellar/vessel.ts';
import { pKOf } from '../../../core/chemistry/dissociation.ts';
import { freeSO2Needed } from '../../../core/chemistry/free-so2-needed.ts';
import { STAGES_WITHOUT_TARGET } from '../../../core/wine.ts';
import type { Basis } from '../../../core/wine.ts';
import { hasNoUsualTarget, usualTarget } from '../../reader/finish-reading.ts';
import type { ReaderSettings } from '../../reader/understood.ts';
import type { NeededStep } from './chart-data.ts';

/** What the free SO2 that a wine needs is reckoned by, as the cellar has set it. */
export interface NeededBy extends Pick<ReaderSettings, 'targets'> {
  readonly basis: Basis;
}

/** The free SO2 that the wine in a vessel needs at a moment (milliseconds since 1970), as a dose would take it. */
export function neededOf(vessel: Vessel, at: number, { targets, basis }: NeededBy): NeededStep {
  const { traits, ph, readings } = vessel;
  const [style, category] = [traits.style?.value, traits.category?.value];
  const alcohol_percent = traits.alcohol_percent?.value;
  const kind = {
    ...(style && { style }),
    ...(category && { category }),
    ...(alcohol_percent !== undefined && { alcohol_percent }),
  };
  const stage = traits.stage?.value ?? 'finished';
  if (STAGES_WITHOUT_TARGET.includes(stage) || hasNoUsualTarget(kind)) return { at, nothing: 'no-target' };
  if (ph === undefined) return { at, nothing: 'no-ph' };
  const { molecular_mg_L } = usualTarget(kind, { targets });
  const { temperature_C } = readings.find(({ entry }) => entry === ph.entry) ?? {};
  const { pK } = pKOf(basis, alcohol_percent, temperature_C);
  const needed_mg_L = freeSO2Needed(molecular_mg_L, ph.value, pK);
  return { at, needed_mg_L, ph: ph.value, ph_at: ph.at, molecular_mg_L };
}
