import type { Language } from '../reader/understood.ts';

/**
 * The languages whose locale is whole: into one of these a conversation changes by itself. What another has not yet is
 * said in English.
 */
export const SPOKEN: readonly Language[] = ['en', 'es', 'pt', 'fr', 'it', 'de'];
