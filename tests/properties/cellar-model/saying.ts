import type { Content } from '../../../src/chat/conversation/ports.ts';
import type { Said } from '../../../src/chat/replies/say.ts';
import { textOf, type Bot, type Place } from './bot.ts';
import type { Model, Shown } from './model.ts';

/** What a reply is about, for its buttons. */
export type About = Omit<Shown, 'key' | 'chat' | 'shown_at'>;

/** Somebody writes. */
export function writes(text: string, place: Place, model: Model, bot: Bot): Promise<readonly Said[]> {
  return sends({ kind: 'text', text }, place, model, bot);
}

/** Somebody presses a button that they see. */
export function presses(key: string, place: Place, model: Model, bot: Bot): Promise<readonly Said[]> {
  return sends({ kind: 'press', key }, place, model, bot);
}

async function sends(content: Content, place: Place, model: Model, bot: Bot): Promise<readonly Said[]> {
  bot.now = model.now;
  const { message, said } = await bot.send(place, content);
  const what = content.kind === 'text' ? content.text : content.kind === 'press' ? `[${content.key}]` : '';
  const clock = new Date(model.now).toISOString().slice(8, 19);
  model.story.push(`${clock} ${place.person} in ${place.chat}: ${what}\n    ${firstLine(said)}`);
  model.delivered.push({ message, hasNoted: false });
  return said;
}

/** The first line of a reply. */
export function firstLine(said: readonly Said[]): string {
  return textOf(said).split('\n')[0] ?? '';
}

/** Keeps what stands on people's screens from now on. */
export function shows(said: readonly Said[], chat: string, about: About, model: Model): void {
  const weighed = /weigh ([\d ]+(?:\.\d+)?) (k?g)/.exec(firstLine(said));
  const figure = Number(weighed?.[1]?.replaceAll(' ', ''));
  for (const { buttons } of said)
    for (const { key } of buttons)
      model.shown.push({
        key,
        chat,
        shown_at: model.now,
        ...about,
        ...(weighed && { mass_g: weighed[2] === 'kg' ? figure * 1000 : figure }),
      });
}

/** What does not go as the rules have it. */
export class Differs extends Error {
  override readonly name = 'Differs';
}

/** @throws Differs where something is not so */
export function must(holds: boolean, what: string): void {
  if (!holds) throw new Differs(what);
}
