import { DEFAULT_SETTINGS, type Settings } from '../../chat/conversation/settings.ts';
import { machineZone } from '../machine-zone.ts';

/** What holds in a terminal where the cellar has set nothing: the clock is that of the machine. */
export function terminalSettings(): Settings {
  const zone = machineZone();
  return { ...DEFAULT_SETTINGS, ...(zone !== undefined && { zone }) };
}
