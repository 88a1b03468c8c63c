import { readMessage } from '../../reader/read-message.ts';
import { READER_DEFAULTS } from '../../reader/reader-defaults.ts';

/** An invitation as its code has it: to which cellar, and what nobody can guess. */
export interface Code {
  readonly cellar: string;
  readonly secret: string;
}

/** What a platform takes behind a link. */
const LONGEST_CODE = 64;

const SECRET = /^[A-Za-z0-9]{16,32}$/;

/** What `encodeURIComponent` lets stand and a code must not hold. */
const LET_STAND = /[-_.!~*'()]/g;

/**
 * The code of an invitation, which a link can carry: letters, digits, `_` and one `-`; undefined where the cellar's name
 * is too long for it, or the secret is none.
 *
 * @example
 * ```ts
 * codeOf({ cellar: 'chat:-17', secret: '0123456789abcdef' }) // => "chat_3A_2D17-0123456789abcdef"
 * ```
 */
export function codeOf({ cellar, secret }: Code): string | undefined {
  if (!SECRET.test(secret)) return undefined;
  const hex = (mark: string): string => `%${mark.charCodeAt(0).toString(16).toUpperCase()}`;
  const code = `${encodeURIComponent(cellar).replace(LET_STAND, hex).replaceAll('%', '_')}-${secret}`;
  return code.length <= LONGEST_CODE ? code : undefined;
}

/** Takes a code apart; undefined for what is none. */
export function readCode(text: string): Code | undefined {
  const [, name = '', secret = ''] = /^([A-Za-z0-9_]+)-([A-Za-z0-9]+)$/.exec(text) ?? [];
  if (!SECRET.test(secret)) return undefined;
  try {
    return { cellar: decodeURIComponent(name.replaceAll('_', '%')), secret };
  } catch {
    return undefined;
  }
}

/** How a message ends that can bring a code; all others need not be read for it. */
const ENDS_IN_CODE = /-[A-Za-z0-9]{16,32}[\s.!]*$/;

/** The code with which a message joins a cellar; undefined where it does something else. */
export function codeIn(text: string): string | undefined {
  if (text.length > 2 * LONGEST_CODE || !ENDS_IN_CODE.test(text)) return undefined;
  const command = readMessage(text, READER_DEFAULTS).readings[0]?.command;
  return command?.name === 'join' ? command.code : undefined;
}
