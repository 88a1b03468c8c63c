import type { Settings } from './settings.ts';

/** The zone whose clock is meant: the cellar's, and UTC until somebody tells it. */
export function zoneOf({ zone }: Pick<Settings, 'zone'>): string {
  return zone ?? 'UTC';
}
