/**
 * Signs that a sheet cannot hold as they are, and what looks like their escape: ISO/IEC 29500-1, 22.9.2.19 writes a
 * sign by its code, `_x000D_`. A carriage return would come back as a line feed, others would be dropped.
 */
const UNSAFE = /[\p{Cc}--[\t\n]]|\uFFFD|\p{Noncharacter_Code_Point}|_(?=x[\dA-Fa-f]{4}_)/gv;

/**
 * A text as it stands in the XML of a sheet, before what XML itself escapes. `constructor` and its like are escaped as
 * well: the library that writes looks texts up in an object, and finds what every object has.
 */
export function escapeXlsx(text: string): string {
  const whole = text.toWellFormed();
  return whole.replaceAll(whole in {} ? UNSAFE_OR_FIRST : UNSAFE, (sign) =>
    Array.from({ length: sign.length }, (_, i) => escaped(sign.charCodeAt(i))).join(''),
  );
}

const UNSAFE_OR_FIRST = new RegExp(`^.|${UNSAFE.source}`, 'gv');

const escaped = (code: number): string => `_x${code.toString(16).toUpperCase().padStart(4, '0')}_`;
