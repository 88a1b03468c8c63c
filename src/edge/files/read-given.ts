import type { ImportRead } from '../../chat/attachments/import-read.ts';
import type { ListReading } from '../../chat/attachments/read-vessels.ts';
import { readFile } from './read-file.ts';

/** What the thread that reads files is given. */
export interface GivenFile {
  readonly bytes: Uint8Array;
  readonly reading: ListReading;
}

/** The work of that thread. */
export function readGiven({ bytes, reading }: GivenFile): Promise<ImportRead> {
  return readFile(bytes, reading);
}
