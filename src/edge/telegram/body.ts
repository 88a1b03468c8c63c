/** What a post of this platform holds: a call without its chat, which may get another name while it waits. */
export interface Body {
  readonly method: string;
  readonly params: Readonly<Record<string, unknown>>;
  /** The event to which this is the whole first answer, so that a correction finds it. */
  readonly answers?: string;
  /** It takes the place of what answered that event, where that is known. */
  readonly isCorrection?: true;
}

/** What is sent, out of the text in which it is kept. */
export const readBody = (body: string): Body => JSON.parse(body) as Body;
