/**
 * A line with a capital at its start, also behind a warning sign or a mark that opens a question; `pH`, the mark of a choice,
 * the symbol of an equation and what begins with no letter stay as they are.
 *
 * @example
 * ```ts
 * withCapital('nothing to add.') // => "Nothing to add."
 * withCapital('⚠ ventilate') // => "⚠ Ventilate"
 * withCapital('¿qué pH?') // => "¿Qué pH?"
 * withCapital('pH 3.5') // => "pH 3.5"
 * withCapital('a) powder') // => "a) powder"
 * withCapital('m = 256 g') // => "m = 256 g"
 * ```
 */
export function withCapital(text: string): string {
  return text.replace(/^(⚠ )?[¿¡]?(?!pH|.\)|. =)\p{Ll}/u, (start) => start.toUpperCase());
}
