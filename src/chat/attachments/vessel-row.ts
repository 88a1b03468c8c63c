import type { VesselChange, WineTraits } from '../../core/cellar/entry.ts';
import type { Noting } from '../../core/cellar/entry.ts';

/** What a line of a list tells of a vessel, or of several equal ones; litres in each. */
export interface VesselRow {
  readonly line: number; // counted from 1: a position
  readonly vessels: readonly string[];
  readonly traits: WineTraits;
  readonly volume_L?: number;
  readonly capacity_L?: number;
  readonly lot?: string;
  readonly empty?: true;
}

/** Names the import that makes entries, when it is made and by whom; `key` is the beginning of their keys. */
export interface ImportNoting {
  readonly key: string;
  readonly at: number;
  readonly by: number; // the number of a person
}

type Change = VesselChange & Noting;

/** The entries of a line: what the vessel is, the lot in it, or that it is empty. */
export function changesOf(row: VesselRow, { key, at, by }: ImportNoting): Change[] {
  const noting = (what: string) => ({ key: `${key}:${row.line}${what}`, at, noted_at: at, by });
  const { vessels, traits, volume_L, capacity_L, lot } = row;
  const told: Change = {
    kind: 'vessel',
    event: 'told',
    vessels,
    ...traits,
    ...(volume_L !== undefined && { volume_L }),
    ...(capacity_L !== undefined && { capacity_L }),
    ...noting(''),
  };
  return [
    told,
    ...(lot === undefined
      ? []
      : [{ kind: 'vessel', event: 'lot', vessels, lot, ...noting(':lot') } as const]),
    ...(row.empty ? [{ kind: 'vessel', event: 'emptied', vessels, ...noting(':empty') } as const] : []),
  ];
}
