import type { ImportRead } from '../../chat/attachments/import-read.ts';
import { nothingRead } from '../../chat/attachments/import-read.ts';
import type { ListReading } from '../../chat/attachments/read-vessels.ts';
import { FILE_LIMITS } from './file-limits.ts';
import { ThreadFault, runInThread } from './run-in-thread.ts';
import { makeTakeTurns } from '../store/take-turns.ts';

/** One file is read at a time, so that many at once need no more memory than one. */
const takeTurns = makeTakeTurns();

/** What reading one file may cost, where it is not the usual. */
export interface ReadingLimits {
  readonly time_ms?: number;
  readonly memory_MB?: number;
}

/**
 * Reads a file that somebody sent: our own export as CSV or XLSX, or a list of vessels. It is read in a thread of its
 * own with limits of time and memory; whatever is wrong with it is a problem in the answer, never an exception.
 */
export async function readImport(
  bytes: Uint8Array,
  reading: ListReading,
  { time_ms, memory_MB }: ReadingLimits = {},
): Promise<ImportRead> {
  if (bytes.length > FILE_LIMITS.own_bytes) return nothingRead('too-large');
  const work = {
    file: new URL('read-given.ts', import.meta.url),
    function: 'readGiven',
    time_ms: time_ms ?? FILE_LIMITS.time_ms,
    memory_MB: memory_MB ?? FILE_LIMITS.memory_MB,
  };
  try {
    return await takeTurns('import', () => runInThread<ImportRead>(work, { bytes, reading }));
  } catch (fault) {
    if (!(fault instanceof ThreadFault)) throw fault;
    return nothingRead(fault.reason === 'failed' ? 'broken' : 'too-heavy');
  }
}
