import type { Happening } from './entry.ts';

/**
 * The vessels that an entry is about: those that it names, and the one that wine was brought into.
 *
 * @param happening what the entry holds; volumes in it are litres
 *
 * @example
 * ```ts
 * touches({ kind: 'vessel', event: 'moved', vessels: ['tank 4'], to: 'tank 9' }) // => ['tank 4', 'tank 9']
 * ```
 */
export function touches(happening: Happening): readonly string[] {
  const to = happening.kind === 'vessel' ? happening.to : undefined;
  return to === undefined || happening.vessels.includes(to) ? happening.vessels : [...happening.vessels, to];
}
