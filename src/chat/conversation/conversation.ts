import type { CellarView } from '../../core/cellar/cellar-store.ts';
import { arrive } from './here.ts';
import type { IncomingMessage, Handled } from './ports.ts';
import { handlePress } from './press.ts';
import { handleText } from './text.ts';
import { line } from './lines/line.ts';
import type { Settings } from './settings.ts';

/**
 * One message of one conversation: what to keep and what to say, as data. It looks at the cellar through the view; nothing
 * is written or sent in here, there is no clock and no chance: the same message in the same cellar gets the same answer.
 */
export async function handle(
  message: IncomingMessage,
  view: CellarView,
  defaults: Settings,
): Promise<Handled> {
  const { content } = message;
  if (content.kind === 'unreadable') {
    const lines = [line('first', 'unreadable', { what: content.what })];
    return { writes: [], replies: [{ language: message.language, lines, buttons: [] }] };
  }
  const here = await arrive(message, view, defaults);
  return content.kind === 'text'
    ? handleText(content.text, here, view)
    : handlePress(content.key, here, view);
}
