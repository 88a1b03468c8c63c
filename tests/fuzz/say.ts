import { makeSay } from '../../src/chat/replies/say.ts';
import { loadLocales } from '../../src/edge/locales.ts';

/** The text of a reply, in the sentences of `locales`. */
export const say = makeSay(loadLocales());
