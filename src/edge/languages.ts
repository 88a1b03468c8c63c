import type { Language } from '../chat/reader/understood.ts';

/** The languages there are sentences for, English first as it stands in for what another has not yet. */
export const LANGUAGES = ['en', 'es', 'fr', 'it', 'de', 'pt'] as const satisfies readonly Language[];

/** Whether a word is the code of one of our languages. */
export function isLanguage(code: string): code is Language {
  return LANGUAGES.some((one) => one === code);
}
