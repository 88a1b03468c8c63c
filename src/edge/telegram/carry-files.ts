import type { Errand, IncomingMessage } from '../../chat/conversation/ports.ts';
import type { Said } from '../../chat/replies/say.ts';
import type { Arrival } from './arrival.ts';

/** Carries files from a chat into the conversation, and out of it into the chat. */
export interface CarryFiles {
  /** The message of a sheet with what stands in it. Rejects where the platform does not hand it over. */
  readonly read: (arrival: Arrival) => Promise<IncomingMessage>;
  /** Does an errand and hands over the file of it; gives back what is to be said besides. Never rejects. */
  readonly run: (arrival: Arrival, errand: Errand, message: IncomingMessage) => Promise<readonly Said[]>;
}
