import { CHECK_DEFAULTS, type CheckSettings } from '../../core/cellar/check-settings.ts';
import { neededOf } from '../attachments/chart/needed-of.ts';
import type { Settings } from './settings.ts';

/** When vessels are to be measured, as the cellar has set it; and what free SO2 they need by its targets. */
export function checkSettingsOf({ usual_days, often_days, targets, basis }: Settings): CheckSettings {
  return {
    ...CHECK_DEFAULTS,
    usual_days,
    often_days,
    neededOf: (vessel) => {
      const needed = neededOf(vessel, vessel.last_at, { targets, basis });
      return 'needed_mg_L' in needed ? needed.needed_mg_L : undefined;
    },
  };
}
