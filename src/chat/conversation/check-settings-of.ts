import { CHECK_DEFAULTS, type CheckSettings } from '../../core/cellar/check-settings.ts';
import type { Settings } from './settings.ts';

/** When vessels are to be measured, as the cellar has set it. */
export function checkSettingsOf({ usual_days, often_days }: Settings): CheckSettings {
  return { ...CHECK_DEFAULTS, usual_days, often_days };
}
