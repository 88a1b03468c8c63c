import type { CellarView } from '../../core/cellar/cellar-store.ts';
import { codeIn } from './cellar/code.ts';
import { isForUs } from './cellar/is-for-us.ts';
import { join } from './cellar/join.ts';
import { tellingChange } from './language.ts';
import { namingCellar } from './cellar/naming-cellar.ts';
import { permit } from './cellar/permit.ts';
import { tellsOfDanger } from './cellar/tells-of-danger.ts';
import { turnAway } from './cellar/turn-away.ts';
import { scheduleDaily } from './daily.ts';
import { handleEdited } from './handle-edited.ts';
import { handleFile } from './handle-file.ts';
import { withoutMentions } from '../reader/without-mentions.ts';
import { arrive, type Here } from './here.ts';
import { eventKey } from './keys.ts';
import { greeting } from './note.ts';
import { notedBefore, rememberingNoted } from './noted-before.ts';
import type { Content, IncomingMessage, Handled } from './ports.ts';
import { handlePress } from './press.ts';
import { alreadyNoted } from './press/already-noted.ts';
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
  const here = await arrive(withoutCall(message), view, defaults);
  if (!isForUs(here)) return { writes: [], replies: [] };
  const handled = await handleAddressed(here, view);
  return namingCellar(tellingChange(handled, here), message);
}

/** Whom a message calls by name is no part of what it says. */
function withoutCall(message: IncomingMessage): IncomingMessage {
  const { content } = message;
  if ((content.kind !== 'text' && content.kind !== 'edited') || !content.text.includes('@')) return message;
  return { ...message, content: { ...content, text: withoutMentions(content.text).trim() } };
}

async function handleAddressed(here: Here, view: CellarView): Promise<Handled> {
  const { message } = here;
  const { content } = message;
  const code = content.kind === 'text' ? codeIn(content.text) : undefined;
  if (code !== undefined) return greeted(await join(code, here, view), here);
  if (here.role === undefined && !tellsOfDanger(message)) return shutOut(here, view);
  if (content.kind === 'unreadable') {
    const lines = [line('first', 'unreadable', { what: content.what })];
    return { writes: [], replies: [{ language: here.settings.language, lines, buttons: [] }] };
  }
  const before = await view.entriesOfKeys(eventKey(message));
  // Delivered again: what it noted stands, and only what is asked is answered anew.
  const fact = await notedBefore(before, here, view);
  if (fact) return alreadyNoted(fact, here);
  const done = { ...here, done: new Set(before.map(({ key }) => key)) };
  const handled = await permit(await handleContent(content, done, view), done, view);
  if (here.role === undefined) return { writes: [], replies: handled.replies };
  const notes = handled.writes.some(({ kind }) => kind === 'entry');
  const daily = notes && here.daily === undefined ? await scheduleDaily(done, view) : [];
  return greeted(
    { ...handled, writes: [...handled.writes, ...daily, ...rememberingNoted(handled, here)] },
    done,
  );
}

/** Whoever writes for the first time is known from then on; whom nothing was kept of is not. */
function greeted(handled: Handled, here: Here): Handled {
  const isKnown = here.role !== undefined || handled.writes.length > 0;
  return isKnown ? { ...handled, writes: [...greeting(here), ...handled.writes] } : handled;
}

/** Somebody who was removed, or whose chat is in this cellar no more. */
async function shutOut({ message }: Here, view: CellarView): Promise<Handled> {
  const told = await turnAway(message, 'not-of-cellar', view);
  return message.isJoined ? { ...told, place: { does: 'leave', cellar: message.cellar } } : told;
}

function handleContent(
  content: Exclude<Content, { readonly kind: 'unreadable' }>,
  here: Here,
  view: CellarView,
): Promise<Handled> {
  switch (content.kind) {
    case 'text':
      return handleText(content.text, here, view);
    case 'edited':
      return handleEdited(content, here, view);
    case 'press':
      return handlePress(content.key, here, view);
    case 'file':
      return handleFile(content.read, here, view);
  }
}
