import type { CellarStore } from '../core/cellar/cellar-store.ts';
import type { Errand, IncomingMessage } from '../chat/conversation/ports.ts';
import type { Settings } from '../chat/conversation/settings.ts';
import type { Line } from '../chat/replies/reply.ts';
import type { Said, Say } from '../chat/replies/say.ts';
import type { Brought, BroughtFile } from './brought.ts';
import { runPicture } from './run-picture.ts';
import { runRoundSheet } from './run-round-sheet.ts';
import type { Serve } from './serve-message.ts';

/** What errands need. */
export interface Errands {
  readonly store: CellarStore;
  readonly say: Say;
  readonly serve: Serve;
  readonly settings: Settings;
  /** The bytes of a file by the name that somebody wrote; undefined where there is none, or where none may be read. */
  readonly readFile: (name: string) => Promise<Uint8Array | undefined>;
  /** Where a backup goes; absent where none is made from this chat. */
  readonly backupPath?: (now: number) => Promise<string>;
  /** Puts a file where the person finds it and gives the path; absent where the chat itself carries files. */
  readonly handOver?: (file: BroughtFile) => Promise<string>;
  readonly report: (fault: unknown) => void;
}

/** Makes the running of errands: exports, imports and backups, off the reply path. Never rejects. */
export function makeRunErrand(
  errands: Errands,
): (errand: Errand, message: IncomingMessage) => Promise<Brought> {
  return async (errand, message) => {
    try {
      return await runErrand(errand, message, errands);
    } catch (fault) {
      errands.report(fault);
      return { said: [saying('errand-failed', {}, message, errands.say)], isFailed: true };
    }
  };
}

async function runErrand(errand: Errand, message: IncomingMessage, errands: Errands): Promise<Brought> {
  switch (errand.kind) {
    case 'export':
      return runExport(errand, message, errands);
    case 'import':
      return runImport(errand, message, errands);
    case 'backup':
      return runBackup(message, errands);
    case 'picture':
      return handedOver(await runPicture(errand, message, errands), message, errands);
    case 'round-sheet':
      return handedOver(await runRoundSheet(errand, message, errands.say), message, errands);
  }
}

/** What is brought, with the file put where the person finds it, where the chat itself carries none. */
async function handedOver(
  brought: Brought,
  message: IncomingMessage,
  { handOver, say }: Errands,
): Promise<Brought> {
  const { said, file, more = [] } = brought;
  if (file === undefined || handOver === undefined) return brought;
  const written: Said[] = [];
  for (const one of [file, ...more])
    written.push(saying('export-written', { path: await handOver(one) }, message, say));
  return { said: [...said, ...written] };
}

async function runExport(
  errand: Extract<Errand, { kind: 'export' }>,
  message: IncomingMessage,
  errands: Errands,
): Promise<Brought> {
  const { store, say } = errands;
  const { from, to, vessel, of, format, zone, decimalMark, language } = errand;
  // From the beginning on: what was known of a wine then follows from all that came before.
  const { entries, people } = await store.look(message.cellar, async (view) => ({
    entries: await view.entries({ ...(to !== undefined && { to }) }),
    people: await view.people(),
  }));
  const isWanted = entries.some(
    ({ at, vessels, kind }) =>
      (from === undefined || at >= from) &&
      (vessel === undefined || vessels.includes(vessel)) &&
      (of === undefined || kind === 'stock'),
  );
  if (!isWanted) return { said: [saying('export-none', {}, message, say)] };
  const span = {
    ...(from !== undefined && { from }),
    ...(to !== undefined && { to }),
    ...(vessel !== undefined && { vessel }),
    ...(of !== undefined && { of }),
  };
  const { makeExport } = await import('./files/make-export.ts');
  const request = { entries, people, span, format, zone, decimalMark, language };
  const file = await makeExport(request, say);
  return handedOver({ said: [], file }, message, errands);
}

async function runImport(
  { file }: Extract<Errand, { kind: 'import' }>,
  message: IncomingMessage,
  errands: Errands,
): Promise<Brought> {
  const { readFile, serve, say, settings } = errands;
  const bytes = await readFile(file);
  if (bytes === undefined) return { said: [saying('import-no-file', { file }, message, say)] };
  const { readImport } = await import('./files/read-import.ts');
  const noting = { key: `import ${JSON.stringify([message.chat, message.id])}`, at: message.at, by: 1 };
  const read = await readImport(bytes, { reader: settings, noting });
  const served = await serve({ ...message, id: `${message.id} file`, content: { kind: 'file', read } });
  if (served.errand === undefined) return { said: served.said };
  // A round in a file comes back with its sheet.
  const brought = await runErrand(served.errand, served.message ?? message, errands);
  return { ...brought, said: [...served.said, ...brought.said] };
}

async function runBackup(message: IncomingMessage, { store, backupPath, say }: Errands): Promise<Brought> {
  const path = await backupPath?.(message.at);
  if (path === undefined) return { said: [saying('backup-elsewhere', {}, message, say)] };
  await store.backup(path);
  return { said: [saying('backup-written', { path }, message, say)] };
}

function saying(key: string, values: Line['values'], { language }: IncomingMessage, say: Say): Said {
  return say({ language, lines: [{ room: 'first', key, values }], buttons: [] });
}
