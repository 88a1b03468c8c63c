import { localeMessages } from './locale-messages.ts';

/** The text of `sentence-keys.ts` for a locale. */
export function sentenceKeys(ftl: string): string {
  const rows = [...localeMessages(ftl)]
    .toSorted(([a], [b]) => (a < b ? -1 : 1))
    .map(([key, values]) => row(quoted(key), values.map((value) => `'${value}'`).join(' | ') || 'never'));
  return [
    '// Made from locales/en.ftl by `node .ci/sentence-keys.ts`: change the locale, not this file.',
    '',
    '/** Every sentence by its key, and the names of the values it takes. */',
    'export interface SentenceValues {',
    ...rows,
    '}',
    '',
    '/** The key of a sentence in `locales/`. */',
    'export type SentenceKey = keyof SentenceValues;',
    '',
  ].join('\n');
}

/** As the formatter breaks it. */
function row(key: string, values: string): string {
  const whole = `  ${key}: ${values};`;
  if (whole.length <= LONGEST) return whole;
  const below = `    ${values};`;
  const apart = values.split(' | ').map((one) => `\n    | ${one}`);
  return below.length <= LONGEST ? `  ${key}:\n${below}` : `  ${key}:${apart.join('')};`;
}

/** Letters in a line of code. */
const LONGEST = 110;

function quoted(key: string): string {
  return /^[a-z]\w*$/.test(key) ? key : `'${key}'`;
}
