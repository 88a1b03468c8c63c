import type { IncomingMessage, Handled } from './ports.ts';
import type { Memory } from './memory.ts';
import { handlePress } from './press.ts';
import { handleText } from './text.ts';
import { line } from './lines/line.ts';
import type { Settings } from './settings.ts';

/**
 * One message of one conversation: what to keep and what to say, as data. Nothing is written or sent in here, there is
 * no clock and no chance: the same message with the same memory gets the same answer.
 */
export function handle(message: IncomingMessage, memory: Memory, settings: Settings): Handled {
  const inLanguage: Settings = { ...settings, language: message.language };
  const { content } = message;
  switch (content.kind) {
    case 'text':
      return handleText(message, content.text, memory, inLanguage);
    case 'press':
      return handlePress(message, content.key, memory, inLanguage);
    case 'unreadable':
      return {
        writes: [],
        replies: [
          {
            language: message.language,
            lines: [line('first', 'unreadable', { what: content.what })],
            buttons: [],
          },
        ],
      };
  }
}
