import type { Language } from '../chat/reader/understood.ts';
import { LANGUAGES } from '../chat/reader/words/languages.ts';

/** Whether a word is the code of one of our languages. */
export function isLanguage(code: string): code is Language {
  return LANGUAGES.some((one) => one === code);
}
