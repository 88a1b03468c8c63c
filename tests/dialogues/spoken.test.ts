import { readFileSync, readdirSync } from 'node:fs';
import { beforeAll, describe, expect, test } from 'vitest';
import type { Language } from '../../src/chat/reader/understood.ts';
import { PHONE_COLUMNS, rowsOf } from '../../src/chat/replies/fold.ts';
import type { Reply } from '../../src/chat/replies/reply.ts';
import { makeSay } from '../../src/chat/replies/say.ts';
import { SPOKEN } from '../../src/chat/replies/spoken.ts';
import { loadLocales } from '../../src/edge/locales.ts';
import { play, readScene } from './scene.ts';
import { linesOf } from './shown-lines.ts';

const say = makeSay(loadLocales());

/** The replies of a scene, each told apart by what it says in English. */
interface Played {
  readonly name: string;
  readonly replies: readonly Reply[];
}

/** A reply with all that is in it in one language; what was finished text before (a day of the calendar) stays. */
const inLanguage = (reply: Reply, language: Language): Reply => ({
  ...reply,
  language,
  lines: reply.lines.map((line) => ({ ...line, language })),
  buttons: reply.buttons.map((button) => ({ ...button, language })),
});

const textIn = (reply: Reply, language: Language): string =>
  linesOf(say(inLanguage(reply, language))).join('\n');

const ofPhone = (reply: Reply, language: Language): number =>
  rowsOf(say(inLanguage(reply, language)).text, PHONE_COLUMNS);

const played: Played[] = [];
beforeAll(async () => {
  const heard = new Set<string>();
  for (const name of readdirSync(import.meta.dirname).filter((one) => one.endsWith('.txt'))) {
    const replies: Reply[] = [];
    const hears = (reply: Reply): void => {
      const text = textIn(reply, 'en');
      if (!heard.has(text)) replies.push(reply);
      heard.add(text);
    };
    await play(readScene(readFileSync(new URL(name, import.meta.url), 'utf8')), { hears });
    played.push({ name, replies });
  }
}, 120_000);

/** More than a screen: a list that is as long as the cellar has it, or a reply that is as long in English. */
const MOST_ROWS = 25;

describe.each(SPOKEN.filter((language) => language !== 'en'))('what the dialogues say in %s', (language) => {
  test('every reply is as it was read aloud', async () => {
    const scenes = played.map(
      ({ name, replies }) => `# ${name}\n\n${replies.map((reply) => textIn(reply, language)).join('\n\n')}\n`,
    );
    await expect(scenes.join('\n')).toMatchFileSnapshot(`spoken/${language}.txt`);
  });

  test('a reply that is one screen of a phone in English is one here', () => {
    const longer = played.flatMap(({ name, replies }) =>
      replies
        .filter((reply) => ofPhone(reply, 'en') <= MOST_ROWS && ofPhone(reply, language) > MOST_ROWS)
        .map((reply) => `${name}: ${ofPhone(reply, language)} rows\n${textIn(reply, language)}`),
    );
    expect(longer).toEqual([]);
  });
});
