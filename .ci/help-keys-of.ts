import { localeMessages } from './locale-messages.ts';

/** The text of `help-keys.ts` for a locale: sentences `help-<topic>-…`, by topic, in the order of the locale. */
export function helpKeys(ftl: string): string {
  const topics = new Map<string, string[]>();
  for (const key of localeMessages(ftl).keys()) {
    const [, topic] = /^help-([a-z]+)-./.exec(key) ?? [];
    if (topic !== undefined) topics.set(topic, [...(topics.get(topic) ?? []), key]);
  }
  return [
    '// Made from locales/en.ftl by `node .ci/sentence-keys.ts`: change the locale, not this file.',
    "import type { SentenceKey } from './sentence-keys.ts';",
    '',
    '// prettier-ignore',
    '/** The sentences of help by topic, each topic a screen, in the order in which they are said. */',
    'export const HELP_KEYS: Readonly<Record<string, readonly SentenceKey[]>> = {',
    ...[...topics].map(([topic, keys]) => `  ${topic}: [${keys.map((key) => `'${key}'`).join(', ')}],`),
    '};',
    '',
  ].join('\n');
}
