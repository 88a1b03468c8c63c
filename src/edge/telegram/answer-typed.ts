import type { Said } from '../../chat/replies/say.ts';
import type { Language } from '../../chat/reader/understood.ts';
import type { Log } from '../logging.ts';
import { failureOf } from './failure.ts';
import { languageOf } from './language-of.ts';
import { clientSignal, type Platform } from './platform.ts';
import { LONGEST_TEXT } from './split-text.ts';
import type { TelegramInlineQuery } from './update.ts';
import { personNameOf } from './who-of.ts';

/** What answers what is typed behind our name in any chat. */
export interface TypedWork {
  /** Undefined where there is no dose. */
  readonly answer: (text: string, language: Language) => Said | undefined;
  /** Whether the person may use the bot, and does not ask too fast. */
  readonly mayAsk: (person: string, queryId: string) => Promise<boolean>;
}

/** What answering needs. */
export interface TypedOptions {
  readonly typedWork?: TypedWork;
  readonly platform: Platform;
  readonly log: Log;
  readonly signal: AbortSignal;
}

/** The platform may hand out the same answer for so long: nothing in it changes. */
const CACHE_S = 10;
/** What is shown of an answer in the list, in UTF-16 code units. */
const LONGEST_TITLE = 100;

/** Makes what answers what is typed: one dose to insert, or nothing. Never rejects. */
export function makeAnswerTyped(options: TypedOptions): (query: TelegramInlineQuery) => Promise<void> {
  const { typedWork: work, platform, log, signal } = options;
  return async ({ id, from, query }) => {
    try {
      if (work === undefined) return;
      const may = await work.mayAsk(personNameOf(from.id), id);
      const said = may ? work.answer(query, languageOf(from.language_code)) : undefined;
      const results = said === undefined || said.text.length > LONGEST_TEXT ? [] : [articleOf(said)];
      const others = { cache_time: CACHE_S, is_personal: true };
      await platform.calls.answerInlineQuery(id, results, others, clientSignal(signal));
    } catch (error) {
      log.debug({ failure: failureOf(error) }, 'an inline query could not be answered');
    }
  };
}

const articleOf = ({ text }: Said) => {
  const [title = '', ...others] = text.split('\n');
  const description = others.join(' ').slice(0, LONGEST_TITLE);
  return {
    type: 'article' as const,
    id: 'dose',
    title: title.slice(0, LONGEST_TITLE),
    ...(description !== '' && { description }),
    input_message_content: { message_text: text, link_preview_options: { is_disabled: true } },
  };
};
