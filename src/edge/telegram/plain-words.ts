/**
 * What a person wrote, without the platform's own way of writing a command: `/help` and `/help@a_bot` are the word
 * `help`. `/start`, which a phone sends by itself when a chat is opened, asks for help too; what a link put behind it is
 * an invitation, and stays.
 */
export function plainWords(text: string): string {
  const [, word, rest = ''] = /^\/([a-z]\w*)(?:@\w+)?(?![^\s])([\s\S]*)$/i.exec(text) ?? [];
  if (word === undefined) return text;
  if (word.toLowerCase() === 'start') return rest.trim() === '' ? 'help' : `/start${rest}`;
  return word + rest;
}
