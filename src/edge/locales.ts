import { readFileSync } from 'node:fs';
import type { Language } from '../chat/reader/understood.ts';
import { LANGUAGES } from '../chat/reader/words/languages.ts';
import type { LocaleSources } from '../chat/replies/say.ts';

/** The sentences of every language, read from the folder `locales` beside `src`. Throws when a file is missing. */
export function loadLocales(): LocaleSources {
  const read = (language: Language): string =>
    readFileSync(new URL(`../../locales/${language}.ftl`, import.meta.url), 'utf8');
  return Object.fromEntries(
    LANGUAGES.map((language) => [language, read(language)]),
  ) as unknown as LocaleSources;
}
