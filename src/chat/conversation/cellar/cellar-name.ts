import type { Person } from '../../../core/cellar/cellar-store.ts';
import type { Line } from '../../replies/reply.ts';
import { part } from '../lines/line.ts';
import type { CellarPlace } from '../ports.ts';
import { keepersOf } from './role-of.ts';
import type { Roster } from './roster.ts';

/** What a cellar goes by: its own name, else its chat's, else its first keeper's. */
export function placeOf(
  cellar: string,
  { roster, people, title }: { roster: Roster; people: readonly Person[]; title?: string | undefined },
): CellarPlace {
  const name = roster.name ?? title ?? roster.title;
  const keeper = keepersOf(roster, people).find((one) => one.name !== undefined)?.name;
  return { cellar, ...(name !== undefined && { name }), ...(keeper !== undefined && { keeper }) };
}

/** A cellar as it is named in a sentence. */
export function cellarPart({ name, keeper }: CellarPlace): Omit<Line, 'room'> {
  return part('cellar-called', { cellar: name ?? 'none', keeper: keeper ?? 'none' });
}
