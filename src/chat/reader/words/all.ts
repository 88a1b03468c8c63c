import { de } from './de.ts';
import { en } from './en.ts';
import { es } from './es.ts';
import { fr } from './fr.ts';
import { it } from './it.ts';
import { pt } from './pt.ts';
import type { Words } from './words.ts';

/** The words of every language, English first. */
export const ALL_WORDS: readonly Words[] = [en, es, fr, it, de, pt];
