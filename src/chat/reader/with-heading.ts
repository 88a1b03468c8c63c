import type { Draft } from './understood.ts';

/** What the first line of a round says of all lines beside their fields. */
export type Heading = Pick<Draft, 'when' | 'chemical_lot'>;

/**
 * A line with when and with which lot, as the first line of its round says, where it does not say it itself.
 *
 * @param draft What the line says.
 * @param heading What the first line says of all.
 */
export function withHeading(draft: Draft, { when, chemical_lot }: Heading): Draft {
  if (draft.intent === 'effect') return draft;
  const isNamed =
    draft.when?.day !== undefined || draft.when?.hours_ago !== undefined || when?.hours_ago !== undefined;
  const own = draft.when && when?.day && !isNamed ? { ...draft.when, day: when.day } : draft.when;
  const moment = own ?? when;
  const lot = draft.chemical_lot ?? (draft.intent === 'added' ? chemical_lot : undefined);
  return { ...draft, ...(moment && { when: moment }), ...(lot !== undefined && { chemical_lot: lot }) };
}
