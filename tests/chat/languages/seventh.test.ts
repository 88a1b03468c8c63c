import { readFileSync } from 'node:fs';
import { expect, test, vi } from 'vitest';
import type { Language } from '../../../src/chat/reader/understood.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';
import { readMessage } from '../../../src/chat/reader/read-message.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { startTalk } from '../conversation/talk.ts';
import type { Words } from '../../../src/chat/reader/words/words.ts';

/** Catalan stands among the word lists and the whole locales, and nothing else is changed. */
vi.mock('../../../src/chat/reader/words/all.ts', async (original) => {
  const { ALL_WORDS } = await original<{ ALL_WORDS: readonly Words[] }>();
  const { ca } = await import('./ca.ts');
  return { ALL_WORDS: [...ALL_WORDS, ca] };
});
vi.mock('../../../src/chat/replies/spoken.ts', () => ({ SPOKEN: ['en', 'ca'] }));

const CATALAN = 'ca' as Language;

const fieldsOf = (text: string, language: Language = CATALAN): unknown => {
  const [reading] = readMessage(text, { ...READER_DEFAULTS, language }).readings;
  return { intent: reading?.intent, ...reading?.fields };
};

test.each([
  [
    'dipòsit 4 20 hl pH 3,5 lliure 18',
    { intent: 'dose', vessel: 'tank 4', volume_L: 2000, ph: 3.5, free_mg_L: 18 },
  ],
  [
    'DIPOSIT 4 1.200 litres lliure 18 a 32',
    { intent: 'dose', vessel: 'tank 4', volume_L: 1200, free_mg_L: 18, target: { free_mg_L: 32 } },
  ],
  [
    'pujar a 30 el dipòsit 2, lliure 12',
    { intent: 'dose', vessel: 'tank 2', free_mg_L: 12, target: { free_mg_L: 30 } },
  ],
  [
    'afegits 40 g de metabisulfit al dipòsit 3',
    { intent: 'added', vessel: 'tank 3', additive: 'potassium-metabisulfite', mass_g: 40 },
  ],
  ['no he afegit els 40 g al dipòsit 3', { intent: 'chat' }],
  ['el company està inconscient', { intent: 'emergency' }],
])('a seventh language is read by its list of words alone: %s', (text, wanted) => {
  expect(fieldsOf(text)).toEqual(wanted);
});

test('it is told by its words in a chat of another language', () => {
  expect(fieldsOf('afegits 40 g de metabisulfit al dipòsit 3', 'en')).toMatchObject({ intent: 'added' });
});

const catalan: object = { ca: readFileSync(new URL('ca.ftl', import.meta.url), 'utf8') };
const say = makeSay({ ...loadLocales(), ...catalan });

test('it is answered by its locale, said once, with a button to stay', async () => {
  const talk = startTalk();
  const [reply] = (await talk.write('bon dia')).replies;
  const said = reply && say(reply);
  expect(said?.text).toContain('Bon dia. Envia');
  expect(said?.text).toContain('contesto en català');
  expect(said?.buttons.map(({ label }) => label)).toContain('Stay in English');
  const [again] = (await talk.write('bon dia')).replies;
  expect(again && say(again).text).not.toContain('contesto en català');
  const [stays] = (await talk.press('stay:en')).replies;
  expect(stays && say(stays).text).toBe('I answer in English.');
  const [english] = (await talk.write('bon dia')).replies;
  expect(english?.language).toBe('en');
});

test('a message that leaves the language open changes nothing', async () => {
  const talk = startTalk();
  await talk.write('bon dia');
  const [reply] = (await talk.write('T4 20 hl pH 3.5 18')).replies;
  expect(reply?.language).toBe(CATALAN);
});

test('the language of a chat is set by its name, in whatever language that is said', async () => {
  const talk = startTalk();
  const [reply] = (await talk.write('language català')).replies;
  expect(reply && say(reply).text).toBe('Contesto en català.');
});
