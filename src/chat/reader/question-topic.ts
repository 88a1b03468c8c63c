import { ALL_WORDS } from './words/all.ts';
import type { QuestionId } from './words/words.ts';
import type { Draft, FieldName, Intent } from './understood.ts';

/** One of several ways to put a word of a question; with a star it is the beginning of a word. */
type Way = string;

/**
 * A question as it is put: of each group one way is in it, and none of those that exclude it. One that begins with a plus
 * is a question also where it speaks of somebody's wine: no dose may come of it.
 */
interface Pattern {
  readonly topic: QuestionId;
  readonly groups: readonly (readonly Way[])[];
  readonly without: readonly Way[];
  readonly isOfAnyWine: boolean;
}

const waysOf = (group: string): readonly Way[] =>
  group.split('|').map((way) => (way.endsWith('*') ? ` ${way.slice(0, -1)}` : ` ${way} `));

function patternOf(topic: QuestionId, written: string): Pattern {
  const isOfAnyWine = written.startsWith('+ ');
  const groups = written.slice(isOfAnyWine ? 2 : 0).split(' & ');
  return {
    topic,
    isOfAnyWine,
    groups: groups.filter((group) => !group.startsWith('!')).map(waysOf),
    without: groups.filter((group) => group.startsWith('!')).flatMap((group) => waysOf(group.slice(1))),
  };
}

const PATTERNS: readonly Pattern[] = ALL_WORDS.flatMap(({ questions = {} }) =>
  (Object.keys(questions) as QuestionId[]).flatMap((topic) =>
    (questions[topic] ?? []).map((written) => patternOf(topic, written)),
  ),
);

const TOPICS: ReadonlySet<string> = new Set(PATTERNS.map(({ topic }) => topic));

/** Whether the topic of a chat is one of the plain questions. */
export const isQuestion = (topic: string | undefined): topic is QuestionId =>
  topic !== undefined && TOPICS.has(topic);

const OF_ANY_WINE = PATTERNS.filter(({ isOfAnyWine }) => isOfAnyWine);

/** What has happened, or is a word of the bot's own, asks nothing. */
const TOLD: readonly Intent[] = ['added', 'reading', 'titration', 'emergency', 'command'];

/** A longer message tells a story, in words and marks; own threshold. */
const LONGEST_QUESTION = 60;

/** What a message about one's own wine carries: with one of these it is no question about the trade. */
const OF_ONES_WINE: readonly FieldName[] = [
  'vessel', 'vessels', 'volume_L', 'ph', 'total_mg_L', 'mass_g', 'additive_volume_mL', 'tablets', 'rate_mg_L', 'added_mg_L',
]; // prettier-ignore

function isOfOnesWine({ intent, fields, command }: Draft): boolean {
  // `added meta and free barely moved, why`: an addition without vessel or amount may be one; its fields tell, below.
  if (intent === 'reading' || intent === 'titration') return true;
  // `remove sulfite from wine` reads as a person to be taken out; every other word of the bot's own is one.
  if (command !== undefined && command.name !== 'remove-person') return true;
  return OF_ONES_WINE.some((name) => fields[name] !== undefined);
}

/**
 * The matter of one of the plain questions that people ask again and again; undefined where a message is none, or
 * speaks of somebody's wine.
 *
 * @param texts The words of the message in their plain spelling, in their order.
 * @param draft What else was read in it.
 * @example
 * ```ts
 * import { emptyReading } from './empty-reading.ts';
 * questionTopic(['does', 'metabisulfite', 'go', 'off'], emptyReading('chat')) // => 'old-powder'
 * questionTopic(['back', 'at', 'noon'], emptyReading('chat')) // => undefined
 * ```
 */
export function questionTopic(texts: readonly string[], draft: Draft): QuestionId | undefined {
  if (texts.length > LONGEST_QUESTION) return undefined;
  const isOfOwn = isOfOnesWine(draft);
  if (isOfOwn && TOLD.includes(draft.intent)) return undefined;
  const text = ` ${texts.join(' ')} `;
  const holds = (way: Way): boolean => text.includes(way);
  return (isOfOwn ? OF_ANY_WINE : PATTERNS).find(
    ({ groups, without }) => groups.every((group) => group.some(holds)) && !without.some(holds),
  )?.topic;
}
