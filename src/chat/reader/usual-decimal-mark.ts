import type { Language, Understood } from './understood.ts';
import { ALL_WORDS } from './words/all.ts';

/**
 * The mark that parts decimals in a language, for whoever has not yet shown which one they write: a comma, but where a
 * comma groups thousands.
 *
 * @param language The language in which somebody is answered.
 * @example
 * ```ts
 * usualDecimalMark('es') // => ","
 * usualDecimalMark('en') // => "."
 * ```
 */
export function usualDecimalMark(language: Language): Understood['decimalMark'] {
  return ALL_WORDS.find((words) => words.language === language)?.groups === ',' ? '.' : ',';
}
