import type { CellarView } from '../../core/cellar/cellar-store.ts';
import { scheduleDaily } from './daily.ts';
import { handleFile } from './handle-file.ts';
import { arrive, type Here } from './here.ts';
import { eventKey } from './keys.ts';
import { greeting } from './note.ts';
import type { Content, IncomingMessage, Handled } from './ports.ts';
import { handlePress } from './press.ts';
import { alreadyNoted } from './press/log-buttons.ts';
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
  const before = await view.entriesOfKeys(eventKey(message));
  // Delivered again: what it noted stands, and only what is asked is answered anew.
  const fact = before.find(({ kind }) => kind !== 'reading' && kind !== 'vessel');
  if (fact) return alreadyNoted(fact, here);
  const done = { ...here, done: new Set(before.map(({ key }) => key)) };
  const handled = await handleContent(content, done, view);
  const notes = handled.writes.some(({ kind }) => kind === 'entry');
  const daily = notes ? await scheduleDaily(done, view) : [];
  return { ...handled, writes: [...greeting(done), ...handled.writes, ...daily] };
}

function handleContent(
  content: Exclude<Content, { readonly kind: 'unreadable' }>,
  here: Here,
  view: CellarView,
): Promise<Handled> {
  switch (content.kind) {
    case 'text':
      return handleText(content.text, here, view);
    case 'press':
      return handlePress(content.key, here, view);
    case 'file':
      return handleFile(content.read, here, view);
  }
}
