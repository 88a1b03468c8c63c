import { readMessage } from '../../reader/read-message.ts';
import { READER_DEFAULTS } from '../../reader/reader-defaults.ts';
import type { IncomingMessage } from '../ports.ts';

/** A name and a verb; what is longer need not be read for it. */
const LONGEST = 80;

/** The name of the cellar that a message leaves; undefined where it does something else. */
export function cellarLeftIn({
  content,
  language,
}: Pick<IncomingMessage, 'content' | 'language'>): string | undefined {
  if (content.kind !== 'text' || content.text.length > LONGEST) return undefined;
  const command = readMessage(content.text, { ...READER_DEFAULTS, language }).readings[0]?.command;
  return command?.name === 'leave' ? command.cellar : undefined;
}
