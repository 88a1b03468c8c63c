import { GLYPH_WIDTHS, OTHER_WIDTH } from './glyph-widths.ts';

const widths = new Map(
  GLYPH_WIDTHS.flatMap(({ from, widths: row }) =>
    row.map((width, i) => [String.fromCodePoint(from + i), width] as const),
  ),
);

/**
 * How wide a text is drawn, in the unit of its size.
 *
 * @param size of the letters, in units of the picture
 */
export function textWidth(text: string, size: number): number {
  let sum = 0;
  for (const letter of text) sum += widths.get(letter) ?? OTHER_WIDTH;
  return (sum * size) / 1000;
}

/** How large letters are, and how much room there is for them. */
export interface TextRoom {
  readonly size: number; // in units of the picture
  readonly room: number; // in units of the picture
}

/** A text that is no wider than there is room for: its end may become `…`. */
export function fitText(text: string, { size, room }: TextRoom): string {
  if (textWidth(text, size) <= room) return text;
  let kept = '';
  let taken = textWidth('…', size);
  for (const letter of text) {
    taken += textWidth(letter, size);
    if (taken > room) break;
    kept += letter;
  }
  return `${kept.trimEnd()}…`;
}
