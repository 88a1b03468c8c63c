import { handle as handleWith } from '../../../src/chat/conversation/conversation.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import type { Conversation } from '../../../src/edge/telegram/answer-arrival.ts';

/** The conversation and the sentences that the program itself serves. */
export const realConversation: Conversation = {
  handle: (message, memory) => handleWith(message, memory, DEFAULT_SETTINGS),
  say: makeSay(loadLocales()),
};
