import fc from 'fast-check';
import { validPart } from './valid-parts.ts';
import { writtenMessages } from './written-messages.ts';

const SEPARATORS = [
  ' ',
  ' ',
  ' ',
  ', ',
  '\n',
  '\r\n',
  '\t',
  ' - ',
  ' / ',
  ';',
  '',
  '\u00a0',
  '\u200b',
  '  ',
  '. ',
];
const ODD = [
  '🍷',
  '👍🏽',
  '\u200f',
  '\u202e',
  '\u200b',
  '\ufeff',
  '\u0000',
  '\ud800',
  '\u0301',
  '½',
  '₂',
  '−',
  '–',
  '’',
  '\\',
  '%',
  '$&',
  '{ $x }',
];

/** Valid parts in any order, joined by anything. */
const fromParts = fc
  .array(fc.tuple(validPart, fc.constantFrom(...SEPARATORS)), { minLength: 1, maxLength: 9 })
  .map((parts) => parts.flat().join(''));

/** A round: one line a vessel. */
const round = fc
  .array(fc.array(validPart, { minLength: 2, maxLength: 5 }), { minLength: 2, maxLength: 30 })
  .map((lines) => lines.map((line, at) => `T${at + 1} ${line.join(' ')}`).join('\n'));

/** Any UTF-16 code units at all, halves of characters too. */
const anyCodeUnits = fc
  .array(fc.oneof(fc.integer({ min: 0, max: 0xff }), fc.integer({ min: 0, max: 0xffff })), { maxLength: 60 })
  .map((units) => String.fromCharCode(...units));

const noise = fc.oneof(
  fc.string({ maxLength: 60 }),
  fc.string({ unit: 'grapheme', maxLength: 40 }),
  anyCodeUnits,
);

const written = fc.constantFrom(...writtenMessages());

/** One change to a text: something left out, doubled, swapped, put in, cut off, or in another guise. */
const change: fc.Arbitrary<(text: string) => string> = fc
  .record({
    at: fc.double({ min: 0, max: 1, noNaN: true }),
    odd: fc.oneof(fc.constantFrom(...ODD), validPart),
  })
  .chain(({ at, odd }) => {
    const cut = (text: string): [string, string] => {
      const middle = Math.floor(at * text.length);
      return [text.slice(0, middle), text.slice(middle)];
    };
    return fc.constantFrom<(text: string) => string>(
      (text) => cut(text)[0] + cut(text)[1].slice(1),
      (text) => cut(text)[0] + cut(text)[1].slice(0, 1) + cut(text)[1],
      (text) => cut(text)[0] + odd + cut(text)[1],
      (text) => `${cut(text)[0]} ${odd} ${cut(text)[1]}`,
      (text) => cut(text)[0],
      (text) => cut(text)[1] + cut(text)[0],
      (text) => text.toUpperCase(),
      (text) => text.replaceAll(' ', '\u00a0'),
      (text) => text.replaceAll(' ', ''),
      (text) => text.replaceAll(/\d/g, (digit) => String.fromCharCode(digit.charCodeAt(0) + 0xfee0)),
      (text) => text.replaceAll('.', ','),
      (text) => text.replaceAll('\n', '\r\n'),
      (text) => `\u202b${text}\u202c`,
      (text) => text.normalize('NFD'),
    );
  });

const changed = fc
  .tuple(fc.oneof(written, fromParts), fc.array(change, { minLength: 1, maxLength: 3 }))
  .map(([text, changes]) => changes.reduce((sum, one) => one(sum), text));

/** Up to and beyond the longest message: one thing over and over. */
const long = fc
  .tuple(
    fc.oneof(validPart, fc.constantFrom('1', ' ', '/', 'a', '1.', '1 ', 'gal ', '\n', 'T1 ', '18/')),
    fc.nat(4500),
  )
  .map(([text, length]) => text.repeat(Math.ceil(length / Math.max(1, text.length))).slice(0, length));

/** A text as somebody, or something, might send it. */
export const anyText: fc.Arbitrary<string> = fc.oneof(
  { weight: 30, arbitrary: fromParts },
  { weight: 30, arbitrary: changed },
  { weight: 10, arbitrary: written },
  { weight: 6, arbitrary: round },
  { weight: 15, arbitrary: noise },
  { weight: 1, arbitrary: long },
);
