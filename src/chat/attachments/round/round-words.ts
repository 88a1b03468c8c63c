import type { Line } from '../../replies/reply.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';

/** What a weigh-out sheet says in words: its headings, and what is said once. */
export const ROUND_WORDS = [
  'vessel',
  'volume',
  'ph',
  'free',
  'free-short',
  'total',
  'dose',
  'weigh',
  'measure',
  'tablets',
  'additive',
  'strength',
  'after',
  'note',
  'done',
  'in-all',
  'nothing',
  'limit',
  'title',
  'open',
  'caution',
] as const;

/** The name of one of them. */
export type RoundWord = (typeof ROUND_WORDS)[number];

/** The words of a sheet in a language. */
export type RoundWords = Readonly<Record<RoundWord, string>>;

/** Says a line of a reply as a text. */
export type SayLine = (line: Line) => string;

/** The words of a sheet, said. */
export function roundWords(sayLine: SayLine): RoundWords {
  return Object.fromEntries(
    ROUND_WORDS.map((word) => [
      word,
      sayLine({ room: 'first', key: `sheet-${word}` satisfies SentenceKey, values: {} }),
    ]),
  ) as Record<RoundWord, string>;
}
