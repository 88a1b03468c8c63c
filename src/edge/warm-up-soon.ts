import type { Settings } from '../chat/conversation/settings.ts';
import { readMessage } from '../chat/reader/read-message.ts';

/** Any reading: the tables of words are made for the first one. */
const A_READING = 'T1 1000 L pH 3.5 free 20';

/** Makes what the first message needs as soon as the program waits for something else: then nobody waits for it. */
export function warmUpSoon(settings: Settings): void {
  setImmediate(() => void readMessage(A_READING, settings));
}
