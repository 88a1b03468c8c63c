import { expect, test } from 'vitest';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';
import { makeExport } from '../../../src/edge/files/make-export.ts';
import { readImport } from '../../../src/edge/files/read-import.ts';
import { ThreadFault, runInThread } from '../../../src/edge/files/run-in-thread.ts';
import { PEOPLE, anyLog } from '../../chat/attachments/any-log.ts';
import { exportOf, say } from './export-of.ts';

const LOG = anyLog(50, 2);
const usual = { entries: LOG, people: PEOPLE, zone: 'Europe/Madrid', language: 'en' } as const;

test('a file is made in a thread of its own: its bytes, and a name that says what it holds', async () => {
  const file = await makeExport({ ...usual, span: {}, format: 'csv', decimalMark: ',' }, say);
  expect(file.name).toBe('cellar.csv');
  expect(Buffer.from(file.bytes).equals(await exportOf(LOG, { decimalMark: ',' }))).toBe(true);
});

test('what is made in a thread is read in a thread', async () => {
  const file = await makeExport({ ...usual, span: {}, format: 'xlsx', decimalMark: '.' }, say);
  const noting = { key: 'import:1', at: 0, by: 1 };
  const read = await readImport(file.bytes, { reader: READER_DEFAULTS, noting });
  expect(read).toMatchObject({ kind: 'log', problems: [], people: PEOPLE });
  expect(read.entries).toHaveLength(50);
});

test('a thread whose work throws is a fault with its cause', async () => {
  const file = new URL('../../../src/edge/files/write-given.ts', import.meta.url);
  const work = { file, function: 'writeGiven', time_ms: 20_000, memory_MB: 128 };
  const fault: unknown = await runInThread(work, {}).catch((error: unknown) => error);
  expect(fault).toBeInstanceOf(ThreadFault);
  expect(fault).toMatchObject({ reason: 'failed', cause: expect.any(TypeError) });
});
