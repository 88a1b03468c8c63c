import type { Language } from '../../chat/reader/understood.ts';
import { isLanguage } from '../is-language.ts';

/** The language of a phone's IETF tag (`pt-BR` → `pt`); English when it is none of ours, or unknown. */
export function languageOf(tag: string | undefined): Language {
  const base = tag?.split('-', 1)[0]?.toLowerCase() ?? '';
  return isLanguage(base) ? base : 'en';
}
