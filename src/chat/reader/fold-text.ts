/** A message made plain for reading, with the way back to the text as it came. */
export interface FoldedText {
  /** Lower case, no accents, plain digits, blanks, quotes and dashes. Same meaning, fewer spellings. */
  readonly text: string;
  /** For each character of `text`, where it stood in the message; one more entry for the end. */
  readonly at: readonly number[];
  /** Whether the character was a capital letter: `ML` is malolactic where `mL` is a unit. */
  readonly capital: readonly boolean[];
}

const PLAIN: Readonly<Record<string, string>> = {
  '–': '-',
  '—': '-',
  '−': '-',
  '‐': '-',
  '‑': '-',
  '‒': '-',
  '’': "'",
  '‘': "'",
  '´': "'",
  '`': "'",
  '×': '×',
  '→': '→',
  '⇒': '→',
  '➔': '→',
  '➜': '→',
  '…': '…',
  º: '°',
  '˚': '°',
  '℃': '°c',
  '℉': '°f',
  '⁄': '/',
  '∕': '/',
  ß: 'ss',
  æ: 'ae',
  œ: 'oe',
  ø: 'o',
  µ: 'u',
  μ: 'u',
};

/** Vulgar fractions stay one character, so that `1½` is never 11/2. */
const FRACTIONS = new Set(['½', '⅓', '⅔', '¼', '¾', '⅛', '⅜', '⅝', '⅞']);

const isInvisible = (code: number): boolean =>
  (code >= 0x200b && code <= 0x200f) ||
  (code >= 0x202a && code <= 0x202e) ||
  (code >= 0x2060 && code <= 0x2069) ||
  code === 0xfeff ||
  code === 0xad ||
  (code >= 0xfe00 && code <= 0xfe0f);

const isBlank = (code: number): boolean =>
  code === 0xa0 ||
  code === 0x202f ||
  code === 0x3000 ||
  code === 0x1680 ||
  (code >= 0x2000 && code <= 0x200a);

function plainOf(character: string, code: number): string {
  const known = PLAIN[character];
  if (known !== undefined) return known;
  if (FRACTIONS.has(character)) return character;
  if (isInvisible(code)) return '';
  if (isBlank(code)) return ' ';
  return character
    .normalize('NFKD')
    .replace(/\p{M}+/gu, '')
    .toLowerCase();
}

/**
 * Makes a message plain: one spelling for each digit, letter, blank, quote and dash.
 *
 * @param message Text of any bytes, lone surrogates included; never throws.
 * @returns The plain text with the offsets (UTF-16 units) of the message.
 * @example
 * ```ts
 * foldText('pH\u00a0３,5').text // => 'ph 3,5'
 * foldText('SO₂ Été').text // => 'so2 ete'
 * ```
 */
export function foldText(message: string): FoldedText {
  const at: number[] = [];
  const capital: boolean[] = [];
  let text = '';
  const keep = (plain: string, from: number, isCapital: boolean): void => {
    text += plain;
    for (let k = 0; k < plain.length; k++) {
      at.push(from);
      capital.push(isCapital);
    }
  };
  for (let i = 0; i < message.length;) {
    const code = message.codePointAt(i) ?? 0;
    const size = code > 0xffff ? 2 : 1;
    const isCapital = code >= 65 && code <= 90;
    if (code < 128) {
      if (code === 13) {
        if (message.charCodeAt(i + 1) !== 10) keep('\n', i, false);
      } else {
        const plain =
          code === 9 ? ' ' : code === 96 ? "'" : String.fromCharCode(isCapital ? code + 32 : code);
        keep(plain, i, isCapital);
      }
    } else {
      keep(plainOf(message.slice(i, i + size), code), i, false);
    }
    i += size;
  }
  at.push(message.length);
  return { text, at, capital };
}
