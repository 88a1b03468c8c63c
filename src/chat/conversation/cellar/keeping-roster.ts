import type { Write } from '../../../core/cellar/cellar-store.ts';
import { ROSTER_KEY } from '../keys.ts';
import type { Roster } from './roster.ts';

/** The write that keeps the roster. */
export function keepingRoster(roster: Roster): Write {
  return { kind: 'keep', key: ROSTER_KEY, text: JSON.stringify(roster) };
}
