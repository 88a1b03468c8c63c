import { READ_IN_FULL } from '../words/read-in-full.ts';
import type { Words } from '../words/words.ts';

function numbered(names: readonly Words['months'][]): ReadonlyMap<string, number> {
  return new Map(
    names.flatMap((list = []) =>
      list.flatMap((same, i) => same.map((name): [string, number] => [name, i + 1])),
    ),
  );
}

/** Months by their names, January is 1. */
export const MONTHS = numbered(READ_IN_FULL.map(({ months }) => months));
/** Days of the week by their names, Monday is 1. */
export const WEEKDAYS = numbered(READ_IN_FULL.map(({ weekdays }) => weekdays));
