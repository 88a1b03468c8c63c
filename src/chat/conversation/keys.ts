import type { Who } from './ports.ts';

/** What the cellar has set. */
export const SETTINGS_KEY = 'settings';

/** Who may do what in the cellar, and what it is called. */
export const ROSTER_KEY = 'roster';

/** An invitation, by the part of its code that nobody can guess. */
export function inviteKey(secret: string): string {
  return `invite ${secret}`;
}

/** Whether a person who may not write here was told so today. */
export function turnedAwayKey(person: string): string {
  return `turned away ${person}`;
}

/** Whether the time zone was asked for once. */
export const ZONE_ASKED_KEY = 'zone asked';

/** One person's conversation in one chat. */
export function memoryKey({ chat, person }: Pick<Who, 'chat' | 'person'>): string {
  return `memory ${JSON.stringify([chat, person])}`;
}

/** The language in which a person is answered in a chat. */
export function languageKey({ chat, person }: Pick<Who, 'chat' | 'person'>): string {
  return `language ${JSON.stringify([chat, person])}`;
}

/** The language that is set for a chat. */
export function chatLanguageKey(chat: string): string {
  return `chat language ${chat}`;
}

/** A reading that buttons refer to, by the chat they stand in: a person’s readings are counted in each anew. */
export function readingKey(chat: string, ref: string): string {
  return `reading ${JSON.stringify([chat, ref])}`;
}

/** A round as it was said, by the reading of its first line. */
export function roundKey(chat: string, ref: string): string {
  return `round ${JSON.stringify([chat, ref])}`;
}

/** Which round was said last in a chat. */
export function lastRoundKey(chat: string): string {
  return `last round ${chat}`;
}

/** What a button under a reading notes, for one of its vessels or for all, so that it is noted once however often it is pressed. */
export function buttonKey(
  does: 'dose' | 'note' | 'order' | 'sampled',
  chat: string,
  ref: string,
  vessel?: string,
): string {
  return `${does} ${JSON.stringify(vessel === undefined ? [chat, ref] : [chat, ref, vessel])}`;
}

/** Whether it was told of a red that acidified methods read high. */
export function redToldKey(vessel: string): string {
  return `red-told ${vessel}`;
}

/** Who is about to dose a vessel. */
export function claimKey(vessel: string): string {
  return `claim ${vessel}`;
}

/** A file that was shown and may be taken. */
export function importKey(chat: string, ref: string): string {
  return `import ${JSON.stringify([chat, ref])}`;
}

/** A round that came as a file, and may be dosed or noted. */
export function fileRoundKey(chat: string, ref: string): string {
  return `file round ${JSON.stringify([chat, ref])}`;
}

/** The last dose that was reckoned for a vessel. */
export function planKey(vessel: string): string {
  return `plan ${vessel}`;
}

/** What an event writes into the log begins with this, so that the same event never writes twice. */
export function eventKey({ chat, id }: { readonly chat: string; readonly id: string }): string {
  return `${JSON.stringify([chat, id])} `;
}

/** Which entry an event noted under another key than its own. */
export function notedKey(event: { readonly chat: string; readonly id: string }): string {
  return `noted ${eventKey(event)}`;
}

/** Something that is to be said in a chat: one of its kind and matter. */
export function dueId(kind: 'daily' | 'remind', chat: string, of: string): string {
  return `${kind} ${JSON.stringify([chat, of])}`;
}

/** Which due thing is the next daily list of a chat. */
export function dailyKey(chat: string): string {
  return `daily ${chat}`;
}
