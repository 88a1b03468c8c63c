import type { CellarFacts, Here } from './here.ts';

/**
 * A person's name as it stands in a sentence: `you` who writes, `somebody` who asked to be forgotten or has none. The
 * sentences select on both.
 */
export function whoText(by: number, { me, people }: Pick<Here, 'me'> & Pick<CellarFacts, 'people'>): string {
  return by === me ? 'you' : nameText(by, { people });
}

/** A person's name as it stands in a sheet; `person-3` where there is none any more. */
export function nameText(by: number, { people }: Pick<CellarFacts, 'people'>): string {
  return people.get(by)?.name ?? `person ${by}`;
}
