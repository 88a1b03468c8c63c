import { unzipSync, zipSync } from 'fflate';
import { FileFault } from './file-fault.ts';
import { FILE_LIMITS } from './file-limits.ts';

const WANTED = /^(?:\[Content_Types\]\.xml|_rels\/[^/]+|xl\/(?!media\/).+\.(?:xml|rels))$/;

/** The sheets of a spreadsheet, the texts of all its cells, and the whole as a zip in which nothing is packed. */
export interface UnpackedXlsx {
  readonly sheets: readonly Uint8Array[];
  readonly texts: Uint8Array;
  readonly plain: Uint8Array;
}

/**
 * The parts of a spreadsheet, unpacked into what they say they need and no more, and laid together again as they are:
 * so the library that reads them meets no zip but ours. Throws a `FileFault` for what unpacks to too much.
 */
export function unpackXlsx(bytes: Uint8Array): UnpackedXlsx {
  let unpacked_bytes = 0;
  const parts = unzip(bytes, (name, size) => {
    if (!WANTED.test(name)) return false;
    unpacked_bytes += size;
    if (unpacked_bytes > FILE_LIMITS.unpacked_bytes) throw new FileFault('too-heavy');
    return true;
  });
  if (parts['xl/workbook.xml'] === undefined) throw new FileFault('not-a-table');
  const sheets = Object.entries(parts).filter(([name]) => name.startsWith('xl/worksheets/'));
  const texts = parts['xl/sharedStrings.xml'] ?? new Uint8Array();
  return { sheets: sheets.map(([, part]) => part), texts, plain: zipSync(parts, { level: 0 }) };
}

function unzip(
  bytes: Uint8Array,
  wanted: (name: string, size: number) => boolean,
): Readonly<Record<string, Uint8Array>> {
  try {
    return unzipSync(bytes, { filter: ({ name, originalSize }) => wanted(name, originalSize) });
  } catch (cause) {
    throw cause instanceof FileFault ? cause : new FileFault('broken', { cause });
  }
}
