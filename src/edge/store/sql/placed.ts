import { sql, type RawBuilder } from 'kysely';
import type { Point } from '../projection/point.ts';

/** Says of the rows of a table where they lie in the order in which entries count. */
export const placed = (
  table: 'entry' | 'touched' | 'waypoint',
  how: '<' | '>=' | '>',
  { at, entry }: Point,
): RawBuilder<boolean> =>
  sql<boolean>`(${sql.ref(`${table}.at`)}, ${sql.ref(`${table}.entry`)}) ${sql.raw(how)} (${at}, ${entry})`;
