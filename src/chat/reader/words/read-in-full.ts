import { en } from './en.ts';
import type { Words } from './words.ts';

/** The languages that are read in full; of the others only what makes an emergency. */
export const READ_IN_FULL: readonly Words[] = [en];
