import { exportName } from '../../chat/attachments/export-name.ts';
import type { ExportSpan } from '../../chat/attachments/make-sheet.ts';
import type { Language } from '../../chat/reader/understood.ts';
import type { DecimalMark } from '../../chat/replies/number-text.ts';
import type { Say } from '../../chat/replies/say.ts';
import type { Person } from '../../core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../core/cellar/entry.ts';
import { runInThread } from './run-in-thread.ts';
import { sayExportWords } from './say-export-words.ts';
import type { GivenExport } from './write-given.ts';

/** What is taken away, in which form and language. */
export interface ExportRequest {
  /** The entries from the beginning of the log on, to the end of the span at least. */
  readonly entries: readonly LoggedEntry[];
  readonly people: readonly Person[];
  readonly span: ExportSpan;
  readonly format: 'csv' | 'xlsx';
  /** By whose clock the times are told. */
  readonly zone: string;
  readonly decimalMark: DecimalMark;
  readonly language: Language;
}

/** A file to hand over. */
export interface ExportFile {
  readonly name: string;
  readonly bytes: Uint8Array;
}

/** Our own data may take long, and never so long that somebody waits for ever. */
const LIMITS = { time_ms: 120_000, memory_MB: 1024 } as const;

/**
 * Makes the file of an export in a thread of its own, so that no reply waits for it. Throws a `ThreadFault` when the
 * machine cannot.
 */
export async function makeExport(request: ExportRequest, say: Say): Promise<ExportFile> {
  const { entries, people, span, format, zone, decimalMark, language } = request;
  const words = sayExportWords(
    say,
    language,
    entries.map(({ by }) => by),
  );
  const given: GivenExport = {
    source: { entries, wanted: span, people, zone, words },
    format,
    decimalMark,
  };
  const work = { file: new URL('write-given.ts', import.meta.url), function: 'writeGiven', ...LIMITS };
  const bytes = await runInThread<Uint8Array>(work, given);
  return { name: exportName({ ...span, zone, format }), bytes };
}
