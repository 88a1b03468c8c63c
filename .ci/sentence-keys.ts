/**
 * Makes `src/chat/replies/sentence-keys.ts` and `help-keys.ts` from `locales/en.ftl`: run it after a change of a key or
 * of its values.
 * With it a key that no locale has, or a value that a sentence lacks, does not pass the type check.
 */
import { readFileSync, writeFileSync } from 'node:fs';
import { helpKeys } from './help-keys-of.ts';
import { sentenceKeys } from './sentence-keys-of.ts';

const ftl = readFileSync('locales/en.ftl', 'utf8');
writeFileSync('src/chat/replies/sentence-keys.ts', sentenceKeys(ftl));
writeFileSync('src/chat/replies/help-keys.ts', helpKeys(ftl));
