// What a language lacks beside English, sentences and words: node .ci/what-lacks.ts es
import { readFileSync } from 'node:fs';
import { ALL_WORDS } from '../src/chat/reader/words/all.ts';
import { lacking } from './lacking.ts';
import { localeMessages } from './locale-messages.ts';

const [code = ''] = process.argv.slice(2);
const words = ALL_WORDS.find(({ language }) => language === code);
if (words === undefined) throw new Error(`No list of words for "${code}".`);
const english = localeMessages(readFileSync('locales/en.ftl', 'utf8'));
const own = localeMessages(readFileSync(`locales/${code}.ftl`, 'utf8'));
const sentences = [...english.keys()].filter((key) => !own.has(key)).map((key) => `sentence ${key}`);
for (const lack of [...lacking(words, ALL_WORDS), ...sentences]) console.log(lack);
