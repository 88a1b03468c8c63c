import type { Person } from '../../core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../core/cellar/entry.ts';
import type { Vessel } from '../../core/cellar/vessel.ts';
import { isoWithZone } from '../../core/time/iso-with-zone.ts';
import { nameText } from '../../chat/conversation/people.ts';

/** How what is kept in a cellar is told to a program. */
export interface KeptTelling {
  /** The clock that times are told by. */
  readonly zone: string;
  readonly people: ReadonlyMap<number, Person>;
  /** Named in each line where there are several. */
  readonly cellar?: string;
}

/** The fields that hold a moment, in an entry and in a vessel. */
const MOMENTS: readonly string[] = [
  'at',
  'noted_at',
  'until',
  'since',
  'last_at',
  'added_at',
  'before_at',
  'empty',
  'later',
];

/** An entry of the log as a program reads it. */
export function tellEntry(logged: LoggedEntry, telling: KeptTelling): object {
  const { entry, kind, vessels, at, noted_at, by, key: _key, struck, ...happening } = logged;
  const [vessel, another] = vessels;
  return {
    ...ofCellar(telling),
    entry,
    kind,
    ...(another !== undefined ? { vessels } : vessel !== undefined && { vessel }),
    ...told(happening, telling),
    ...told({ at, noted_at, by }, telling),
    ...(struck && { struck_by: struck.entry }),
  };
}

/** What is known of a vessel as a program reads it. */
export function tellVessel(vessel: Vessel, telling: KeptTelling): object {
  return { ...ofCellar(telling), ...told({ ...vessel }, telling) };
}

function ofCellar({ cellar }: KeptTelling): object {
  return cellar === undefined ? {} : { cellar };
}

/** The same with moments in ISO 8601 and people by the name that is shown, however deep they stand. */
function told(fields: Readonly<Record<string, unknown>>, telling: KeptTelling): object {
  return Object.fromEntries(
    Object.entries(fields).map(([name, value]) => [name, toldValue(name, value, telling)]),
  );
}

function toldValue(name: string, value: unknown, telling: KeptTelling): unknown {
  if (typeof value === 'number' && MOMENTS.includes(name)) return isoWithZone(value, telling.zone);
  if (typeof value === 'number' && name === 'by') return nameText(value, telling);
  if (Array.isArray(value)) return value.map((one: unknown) => toldValue('', one, telling));
  if (typeof value === 'object' && value !== null) return told({ ...value }, telling);
  return value;
}
