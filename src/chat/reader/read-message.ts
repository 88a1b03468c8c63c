import type { Board } from './board.ts';
import { recogniseEmergency } from './emergency.ts';
import { finishReading } from './finish-reading.ts';
import type { FoldedText } from './fold-text.ts';
import { emptyReading } from './empty-reading.ts';
import { foldText } from './fold-text.ts';
import { helpTopicOf } from './help-topic.ts';
import { joinNumbers } from './join-numbers.ts';
import { lexiconOf } from './lexicon.ts';
import type { Lexicon } from './lexicon.ts';
import { partElided } from './spellings.ts';
import { linesOf } from './lines.ts';
import { groupingOf } from './message-language.ts';
import { ownPieces } from './own-pieces.ts';
import { readDraft } from './read-draft.ts';
import { readRound } from './read-round.ts';
import { questionTopic } from './question-topic.ts';
import type { Term } from './split-terms.ts';
import { splitTerms } from './split-terms.ts';
import { takeRemark } from './take-remark.ts';
import { isStrange, topicOf } from './topic.ts';
import type { AwaitedField, Reading, ReaderSettings, Understood } from './understood.ts';
import { readWaiting } from './waiting-answer.ts';
import { withoutMentions } from './without-mentions.ts';
import { withAccents } from './with-accents.ts';
import type { Tag } from './words/words.ts';

/** The longest message that is read, in UTF-16 units; the platform's own limit. */
export const LONGEST_MESSAGE = 4096;

/** More lines than a round has; own threshold. Above it the lines are one message, and refused as such. */
export const MOST_LINES = 300;

/** Tags of all words and phrases of some terms, shorter phrases inside longer ones included. */
function cuesOf(terms: readonly Term[], lexicon: Lexicon): ReadonlySet<Tag> {
  const words = terms.flatMap(({ kind, text }) =>
    kind === 'word' ? (lexicon.elides ? partElided(text) : text).split(/[ -]/) : ['\n'],
  );
  const cues = new Set<Tag>();
  for (let i = 0; i < words.length; i++) {
    let phrase = words[i] ?? '';
    const most = lexicon.longest.get(phrase) ?? 0;
    for (let n = 1; n <= most; n++, phrase = `${phrase} ${words[i + n - 1] ?? '\n'}`) {
      for (const tag of lexicon.phrases.get(phrase)?.tags ?? []) cues.add(tag);
    }
  }
  for (const { tags } of terms) for (const tag of tags) cues.add(tag);
  return cues;
}

/** A fresh table for some terms of a message. */
export function setBoard(
  message: string,
  folded: FoldedText,
  said: readonly Term[],
  settings: ReaderSettings,
): Board {
  const { terms, remark } = takeRemark(message, folded, withAccents(message, folded, said));
  const lexicon = lexiconOf(folded, settings.language);
  return {
    message,
    folded,
    terms,
    taken: [],
    cues: cuesOf(terms, lexicon),
    lexicon,
    grouping: groupingOf(terms, lexicon, settings.languageBefore ?? settings.language),
    settings,
    findings: [],
    problems: [],
    notes: [],
    setAside: [],
    marks: {},
    pastTense: false,
    pieces: ownPieces(terms, lexicon),
    ...(remark !== undefined && { remark }),
  };
}

function readOne(board: Board, settings: ReaderSettings): Reading {
  const help = helpTopicOf(board);
  if (help !== undefined) return emptyReading('chat', { topic: `help-${help}` });
  const draft = readDraft(board);
  const question = questionTopic(
    board.terms.flatMap(({ kind, text }) => (kind === 'break' ? [] : [text])),
    draft,
  );
  if (question !== undefined) return emptyReading('chat', { topic: question });
  if (draft.intent !== 'chat') return finishReading(draft, settings);
  const topic = topicOf(board);
  if (topic !== undefined) return emptyReading('chat', { topic });
  const problems =
    isStrange(board) && board.findings.length === 0 ? [{ code: 'not-understood' as const, about: '' }] : [];
  return emptyReading('chat', { problems, notes: draft.notes });
}

/**
 * Reads a message: the one door of the reader. Never throws, whatever the text holds.
 *
 * @param message The message as it came.
 * @param settings What has to be known of the chat.
 * @param waiting The question that the bot still waits for, so that a bare number is its answer.
 * @returns The readings, each with what was said, assumed, asked and wrong.
 * @example
 * ```ts
 * import { READER_DEFAULTS } from './reader-defaults.ts';
 * readMessage('T4 1450 gal pH 3.58 free 21', READER_DEFAULTS).readings[0].fields.vessel // => 'tank 4'
 * readMessage('hi', READER_DEFAULTS).readings[0].intent // => 'chat'
 * ```
 */
export function readMessage(message: string, settings: ReaderSettings, waiting?: AwaitedField): Understood {
  return readText(message, settings, { most: LONGEST_MESSAGE, ...(waiting && { waiting }) });
}

/** The longest text that the lines of a sheet make: as many as a round may have, each as long as people write them. */
const LONGEST_SHEET = 32_768;

/** Reads the lines of a sheet that somebody sent as they would be read in a message, which has no room for so many. */
export function readSheetText(lines: string, settings: ReaderSettings): Understood {
  return readText(lines, settings, { most: LONGEST_SHEET });
}

function readText(
  message: string,
  settings: ReaderSettings,
  { most, waiting }: { readonly most: number; readonly waiting?: AwaitedField },
): Understood {
  const text = withoutMentions(message);
  const decimalMark = /\d,\d{1,2}(?!\d)/.test(text) && !/\d\.\d/.test(text) ? ',' : '.';
  const understood = (
    readings: readonly Reading[],
    shared = {},
    language = settings.language,
  ): Understood => ({ readings, shared, language, decimalMark });
  if (text.length > most) {
    const danger = recogniseEmergency(foldText(text.slice(0, LONGEST_MESSAGE)).text, settings.language);
    return danger
      ? understood([emptyReading('emergency', { topic: danger.danger })], {}, danger.language)
      : understood([emptyReading('chat', { problems: [{ code: 'too-long', about: '' }] })]);
  }
  const folded = foldText(text);
  const danger = recogniseEmergency(folded.text, settings.language);
  if (danger) return understood([emptyReading('emergency', { topic: danger.danger })], {}, danger.language);
  const answer = waiting && readWaiting(folded.text.trim(), waiting, settings);
  if (answer) return understood([answer]);
  const terms = joinNumbers(splitTerms(folded, lexiconOf(folded, settings.language)));
  const lines = linesOf(terms);
  const round =
    lines.length > 1 && lines.length <= MOST_LINES
      ? readRound(lines, (line) => setBoard(text, folded, line, settings), settings)
      : undefined;
  if (round) return understood(round.readings, round.shared);
  return understood([readOne(setBoard(text, folded, terms, settings), settings)]);
}
