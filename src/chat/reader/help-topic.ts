import type { Board } from './board.ts';
import type { Piece } from './own-pieces.ts';
import { READ_IN_FULL } from './words/read-in-full.ts';
import type { HelpTopic } from './words/words.ts';

const TOPICS: ReadonlyMap<string, HelpTopic> = new Map(
  READ_IN_FULL.flatMap(({ topics = {} }) =>
    (Object.entries(topics) as [HelpTopic, readonly string[]][]).flatMap(([topic, words]) =>
      words.map((word) => [word, topic] as const),
    ),
  ),
);

const isHelpIn =
  ({ phrases }: Board['lexicon']) =>
  ({ text }: Piece): boolean =>
    phrases.get(text)?.tags.includes('cue:help') === true;

/** What may stand between `help` and its topic, or around both. */
const SMALL: ReadonlySet<string> = new Set(['filler', 'for', 'of', 'on', 'with', 'and', 'article', 'show']);
const isSmall = ({ ids }: Piece): boolean => ids.some((id) => SMALL.has(id));

/** The topic of `help law`, `/help law`, `help with the law?`: of nothing that says more than that. */
export function helpTopicOf({ pieces, lexicon }: Board): HelpTopic | undefined {
  const isHelp = isHelpIn(lexicon);
  const said = pieces.filter(({ kind }) => kind !== 'mark' && kind !== 'break');
  if (said.length > 8 || !said.some(isHelp)) return undefined;
  const rest = said.filter((piece) => !isHelp(piece));
  const words = (some: readonly Piece[]): string => some.map(({ text }) => text).join(' ');
  return TOPICS.get(words(rest)) ?? TOPICS.get(words(rest.filter((piece) => !isSmall(piece))));
}
