import { ALL_WORDS } from './all.ts';
import type { Words } from './words.ts';

/** The languages that are read in full. */
export const READ_IN_FULL: readonly Words[] = ALL_WORDS;
