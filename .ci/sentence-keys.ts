/**
 * Makes `src/chat/replies/sentence-keys.ts` from `locales/en.ftl`: run it after a change of a key or of its values.
 * With it a key that no locale has, or a value that a sentence lacks, does not pass the type check.
 */
import { readFileSync, writeFileSync } from 'node:fs';
import { sentenceKeys } from './sentence-keys-of.ts';

writeFileSync('src/chat/replies/sentence-keys.ts', sentenceKeys(readFileSync('locales/en.ftl', 'utf8')));
