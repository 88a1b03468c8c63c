/** What a post of this platform holds: a call without its chat, which may get another name while it waits. */
export interface Body {
  readonly method: string;
  readonly params: Readonly<Record<string, unknown>>;
}

/** What is sent, out of the text in which it is kept. */
export const readBody = (body: string): Body => JSON.parse(body) as Body;
