import { handle } from '../../../src/chat/conversation/conversation.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import type { Serving } from '../../../src/edge/serve-message.ts';

/** The conversation and the sentences that the program itself serves. */
export const realConversation: Pick<Serving, 'handle' | 'say'> = { handle, say: makeSay(loadLocales()) };
