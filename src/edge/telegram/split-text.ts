/** The longest message that the platform takes, in UTF-16 code units. */
export const LONGEST_TEXT = 4096;

/**
 * Cuts a text into pieces of at most `longest` UTF-16 code units: at the end of a line where there is one, else
 * at a space, else between two characters. Pieces that would be empty are left out.
 *
 * @throws RangeError when `longest` is below 2, so that no character could be kept whole.
 */
export function splitText(text: string, longest: number = LONGEST_TEXT): string[] {
  if (!(longest >= 2)) {
    throw new RangeError(`Cannot split a text as longest must be >= 2: current value is ${longest}`);
  }
  const pieces: string[] = [];
  let rest = text;
  while (rest.length > longest) {
    const end = cutAt(rest, longest);
    pieces.push(rest.slice(0, end));
    rest = rest.slice(end).replace(/^[\n ]/, '');
  }
  return [...pieces, rest].filter((piece) => piece.trim() !== '');
}

const cutAt = (text: string, longest: number): number => {
  for (const end of [text.lastIndexOf('\n', longest), text.lastIndexOf(' ', longest)])
    if (end > 0) return end;
  const secondHalf = /[\uDC00-\uDFFF]/.test(text.charAt(longest));
  return secondHalf && /[\uD800-\uDBFF]/.test(text.charAt(longest - 1)) ? longest - 1 : longest;
};
