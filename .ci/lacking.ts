import { EVERYWHERE } from '../src/chat/reader/words/everywhere.ts';
import type { Words } from '../src/chat/reader/words/words.ts';

/** What the lists of a language may hold: each with the concepts under it that have words. */
function conceptsOf({
  says,
  own = {},
  danger,
  months = [],
  weekdays = [],
  languages = {},
  ...rest
}: Words): string[] {
  const named = (room: string, lists: object): string[] =>
    Object.entries(lists).flatMap(([id, words]) =>
      (words as readonly unknown[]).length > 0 ? [`${room} ${id}`] : [],
    );
  const more = Object.entries(rest).flatMap(([room, lists]) =>
    typeof lists === 'object' && !Array.isArray(lists) ? named(room, lists as object) : [],
  );
  const whole = [...(months.length === 12 ? ['months'] : []), ...(weekdays.length === 7 ? ['weekdays'] : [])];
  return [
    ...named('says', says),
    ...named('own', own),
    ...named('danger', danger),
    ...named('languages', languages),
    ...more,
    ...whole,
  ];
}

/** Concepts that a language may have no word of: it says them by its grammar, or has them in common with all. */
const MAY_LACK = new Set([
  'says cue:rises-too', 'says cue:tap-too', 'says cue:put', 'says cue:one', 'says cue:many', 'says cue:from-too', 'says cue:also-at', 'says cue:add-behind',
  'says cue:past-if-accented', 'says cue:is-if-accented', 'says cue:if-if-accented', 'says cue:half-if-accented', 'says cue:size', 'own ordinal', 'own ago', 'own ago-before', 'own over', 'danger idiom', 'says stage:malolactic', 'says stage:finished',
]); // prettier-ignore

/** What other languages have words for and this one has not. */
export function lacking(language: Words, all: readonly Words[]): string[] {
  const has = new Set([...conceptsOf(language), ...Object.keys(EVERYWHERE).map((tag) => `says ${tag}`)]);
  const wanted = new Set(all.flatMap(conceptsOf));
  return [...wanted].filter((concept) => !has.has(concept) && !MAY_LACK.has(concept));
}
