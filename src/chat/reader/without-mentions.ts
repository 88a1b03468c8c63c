/**
 * The name of somebody on a chat platform, as it stands by itself; none is shorter than five letters, digits and `_`
 * (https://core.telegram.org/method/account.checkUsername). What stands behind a command (`/today@name`) is no word of
 * its own.
 */
const MENTION = /(?<![^\s(,;:])@[A-Za-z]\w{4,31}(?!\w)/g;

/**
 * A message without the names that call somebody: a figure in a name is none. Blanks stand in their place, so that
 * everything else stays where it was.
 *
 * @example
 * ```ts
 * withoutMentions('@cellar2_bot T4?').trim() // => "T4?"
 * ```
 */
export function withoutMentions(text: string): string {
  return text.replaceAll(MENTION, (name) => ' '.repeat(name.length));
}
