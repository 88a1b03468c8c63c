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

/** Small words, which may stand between `help` and its topic, or around both. */
const SMALL: ReadonlySet<string> = new Set(
  READ_IN_FULL.flatMap(({ own = {} }) =>
    (['filler', 'for', 'of', 'on', 'with', 'and', 'article', 'show'] as const).flatMap((id) => own[id] ?? []),
  ),
);

/** The topic of `help law`, `/help law`, `help with the law?`: of nothing that says more than that. */
export function helpTopicOf({ pieces, lexicon }: Board): HelpTopic | undefined {
  const isHelp = isHelpIn(lexicon);
  const said = pieces.filter(({ kind }) => kind !== 'mark' && kind !== 'break');
  if (said.length > 8 || !said.some(isHelp)) return undefined;
  const words = said.filter((piece) => !isHelp(piece)).flatMap(({ text }) => text.split(' '));
  return TOPICS.get(words.join(' ')) ?? TOPICS.get(words.filter((word) => !SMALL.has(word)).join(' '));
}
