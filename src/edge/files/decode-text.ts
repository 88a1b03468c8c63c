import { FileFault } from './file-fault.ts';

const MARKS = [
  { encoding: 'utf-8', bytes: [0xef, 0xbb, 0xbf] },
  { encoding: 'utf-16le', bytes: [0xff, 0xfe] },
  { encoding: 'utf-16be', bytes: [0xfe, 0xff] },
] as const;

/**
 * The text of a file: by its mark, else UTF-8, else the letters of western Windows, in which older spreadsheets save.
 * Throws a `FileFault` for what holds signs that no text has.
 */
export function decodeText(bytes: Uint8Array): string {
  const mark = MARKS.find((one) => one.bytes.every((byte, i) => bytes[i] === byte));
  const text = decode(bytes, mark?.encoding ?? 'utf-8') ?? decode(bytes, 'windows-1252');
  if (text === undefined || /[\p{Cc}--[\t\n\r\u0085]]/v.test(text)) throw new FileFault('not-a-table');
  return text;
}

function decode(bytes: Uint8Array, encoding: string): string | undefined {
  try {
    return new TextDecoder(encoding, { fatal: true }).decode(bytes);
  } catch {
    return undefined;
  }
}
