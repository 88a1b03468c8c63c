import type { Said } from '../chat/replies/say.ts';

/** A file to hand over; a picture is shown as one where the chat can. */
export interface BroughtFile {
  readonly name: string;
  readonly bytes: Uint8Array;
  readonly isPicture?: true;
}

/** What an errand brings back: something to say, and perhaps a file to hand over. */
export interface Brought {
  readonly said: readonly Said[];
  /** It went wrong, and what is said tells so. */
  readonly isFailed?: true;
  readonly file?: BroughtFile;
  /** The files after the first, where it is several pictures. */
  readonly more?: readonly BroughtFile[];
}
