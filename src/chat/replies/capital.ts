/**
 * A line with a capital at its start, also behind a warning sign; `pH` and what begins with no letter stay as they are.
 *
 * @example
 * ```ts
 * withCapital('nothing to add.') // => "Nothing to add."
 * withCapital('⚠ ventilate') // => "⚠ Ventilate"
 * withCapital('pH 3.5') // => "pH 3.5"
 * ```
 */
export function withCapital(text: string): string {
  return text.replace(/^(⚠ )?(?!pH)\p{Ll}/u, (start) => start.toUpperCase());
}
