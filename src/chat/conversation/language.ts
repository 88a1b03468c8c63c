import type { CellarView, Write } from '../../core/cellar/cellar-store.ts';
import type { Language } from '../reader/understood.ts';
import { SPOKEN } from '../replies/spoken.ts';
import type { Here } from './here.ts';
import { chatLanguageKey, dailyKey, languageKey } from './keys.ts';
import type { KeptLanguage } from './languages-of.ts';
import { line } from './lines/line.ts';
import type { Handled, IncomingMessage } from './ports.ts';
import { replying } from './replying.ts';

const keepOf = (message: IncomingMessage, kept: KeptLanguage): Write => ({
  kind: 'keep',
  key: languageKey(message),
  text: JSON.stringify(kept),
});

/** What the key of the button that stays with a language begins with. */
const STAY = 'stay:';

/** The language that a button stays with; undefined for another button. */
export function stayingWith(key: string): Language | undefined {
  return key.startsWith(STAY) ? (key.slice(STAY.length) as Language) : undefined;
}

/** A reply with the line, once, that it is in another language from now on, and the button to stay with the one before. */
export function tellingChange(handled: Handled, { message, settings, changedFrom }: Here): Handled {
  const [first, ...rest] = handled.replies;
  if (changedFrom === undefined || first === undefined) return handled;
  const { language } = settings;
  const writes = [...handled.writes, keepOf(message, { language })];
  const isDanger = first.lines.some(({ key }) => key.startsWith('emergency'));
  if (isDanger || !SPOKEN.includes(changedFrom)) return { ...handled, writes };
  const button = {
    key: `${STAY}${changedFrom}`,
    mark: '*',
    label: 'button-stay-language',
    values: {},
    language: changedFrom,
  };
  const reply = {
    ...first,
    lines: [...first.lines, line('assumed', 'language-changed')],
    buttons: [...first.buttons, button],
  };
  return { ...handled, writes, replies: [reply, ...rest] };
}

/** Somebody stays with a language, whatever they write in. */
export function stay(language: Language, here: Here): Handled {
  const next = { ...here, settings: { ...here.settings, language } };
  const handled = replying(next, { lines: [line('first', 'language-set')], keepsButtons: true });
  return { ...handled, writes: [...handled.writes, keepOf(here.message, { language, stays: true })] };
}

/** The chat is told in a language from now on; in a private chat that is the person's too. */
export async function setLanguage(language: Language, here: Here, view: CellarView): Promise<Handled> {
  const { message } = here;
  if (!SPOKEN.includes(language)) return replying(here, { lines: [line('first', 'language-not-yet')] });
  const next = { ...here, settings: { ...here.settings, language } };
  const handled = replying(next, { lines: [line('first', 'language-set')] });
  const daily = await view.kept(dailyKey(message.chat));
  const due = daily === undefined ? undefined : await view.due(daily);
  const writes: Write[] = [
    { kind: 'keep', key: chatLanguageKey(message.chat), text: language },
    { kind: 'drop', key: languageKey(message) },
  ];
  if (due) {
    const about = JSON.stringify({ ...(JSON.parse(due.about) as object), language });
    writes.push({ kind: 'due', due: { ...due, about } });
  }
  return { ...handled, writes: [...handled.writes, ...writes] };
}
