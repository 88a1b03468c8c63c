import { phrasesOf } from '../../src/chat/reader/spellings.ts';
import type { OwnWordId, Words } from '../../src/chat/reader/words/words.ts';

/** Kinds of things of which a word names one. */
const KINDS = ['unit:', 'label:', 'additive:', 'style:', 'category:', 'product:', 'stage:', 'vessel:'];

/** Meanings of which one word may not have two: a misread one is another dose. */
const APART: readonly (readonly string[])[] = [
  ['cue:target', 'cue:raise'],
  ['cue:target', 'cue:add'],
  ['cue:target', 'cue:past'],
  ['cue:past', 'cue:raise'],
  ['cue:past', 'cue:add'],
  ['cue:past', 'cue:if'],
  ['cue:past', 'cue:not'],
  ['cue:target', 'cue:need'],
  ['cue:third', 'cue:half', 'cue:quarter', 'cue:two-thirds', 'cue:three-quarters'],
  ['cue:each', 'cue:altogether'],
  ['cue:ml-over', 'cue:ml-without'],
  ['cue:over', 'cue:ml-bugs'],
];

/** The bot's own words that do something: one word does one of them. */
const ACTS: readonly OwnWordId[] = [
  'undo', 'strike', 'order', 'export', 'import', 'backup', 'forget', 'forget-me', 'watch', 'unwatch', 'settings', 'invite',
  'remove', 'racked', 'moved', 'topped', 'emptied', 'acidified', 'language',
]; // prettier-ignore

function byWord(list: Words, lists: object): Map<string, Set<string>> {
  const meanings = new Map<string, Set<string>>();
  for (const [id, entries] of Object.entries(lists) as [string, readonly string[]][])
    for (const phrase of entries.flatMap((entry) => phrasesOf(entry, list)))
      meanings.set(phrase, (meanings.get(phrase) ?? new Set()).add(id));
  return meanings;
}

/** Words of a language that stand for two things of one kind, or for two meanings that have to be apart. */
export function shares(list: Words): string[] {
  return [...byWord(list, list.says)].flatMap(([word, tags]) => {
    const groups = [
      ...KINDS.map((kind) => [...tags].filter((tag) => tag.startsWith(kind))),
      ...APART.map((apart) => [...tags].filter((tag) => apart.includes(tag))),
    ];
    return groups.filter((same) => same.length > 1).map((same) => `${word}: ${same.join(', ')}`);
  });
}

/** Words of a language that tell the bot to do two things. */
export function ownShares(list: Words): string[] {
  return [...byWord(list, list.own ?? {})].flatMap(([word, ids]) => {
    const acts = ACTS.filter((id) => ids.has(id));
    return acts.length > 1 ? [`${word}: ${acts.join(', ')}`] : [];
  });
}
