import type { Vessel } from '../../../core/cellar/vessel.ts';
import type { Standing } from '../projection/standing.ts';
import type { StandingRow } from './tables.ts';

/** How a vessel stood, as a row. */
export function toStandingRow(cellar: string, { vessel, at, entry, run, state }: Standing): StandingRow {
  return { cellar, vessel, at, entry, run, state: state === undefined ? null : JSON.stringify(state) };
}

/** How a vessel stood, out of its row. */
export function toStanding({ vessel, at, entry, run, state }: StandingRow): Standing {
  return { vessel, at, entry, run, state: toVessel(state) };
}

/** A vessel out of its JSON. */
export const toVessel = (state: string | null): Vessel | undefined =>
  state === null ? undefined : (JSON.parse(state) as Vessel);
