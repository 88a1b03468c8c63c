import type { IncomingMessage } from '../../chat/conversation/ports.ts';
import { nothingRead } from '../../chat/attachments/import-read.ts';
import type { Language } from '../../chat/reader/understood.ts';
import type { Settings } from '../../chat/conversation/settings.ts';
import type { Said, Say } from '../../chat/replies/say.ts';
import type { Clock } from '../clock.ts';
import { FILE_LIMITS } from '../files/file-limits.ts';
import type { Log } from '../logging.ts';
import type { makeRunErrand } from '../run-errand.ts';
import type { Arrival } from './arrival.ts';
import type { CarryFiles } from './carry-files.ts';
import { fetchFile } from './fetch-file.ts';
import type { Platform } from './platform.ts';
import { LONGEST_CAPTION, sendFile, type FileSending } from './send-file.ts';
import { whileTyping, type Doing } from './while-typing.ts';
import { withProgress } from './with-progress.ts';

/** What has to do with files, as the program joins it. */
export interface FileWork {
  readonly runErrand: ReturnType<typeof makeRunErrand>;
  /** What numbers and units in a sheet are read by. */
  readonly settings: Settings;
  /** Whether a sheet of this message is worth fetching: a stranger's is not. */
  readonly isAdmitted: (message: IncomingMessage) => Promise<boolean>;
  /** The language in which somebody is spoken to. */
  readonly languageOf: (message: IncomingMessage) => Promise<Language>;
}

/** What carrying files needs. */
export interface CarryOptions {
  /** Absent: nothing is carried. */
  readonly fileWork?: FileWork;
  readonly say: Say;
  readonly platform: Platform;
  readonly config: { readonly botToken: string; readonly botApiRoot: string };
  readonly clock: Clock;
  readonly log: Log;
  readonly pass: FileSending['pass'];
  readonly signal: AbortSignal;
  /** After so long somebody who waits is told. */
  readonly progress_s: number;
}

/** What an errand leaves to be said. */
interface Outcome {
  readonly said: readonly Said[];
  readonly isFailed: boolean;
}

/** What is shown while an errand is done. */
const DOING: Readonly<Record<string, Doing>> = {
  picture: 'upload_photo',
  'round-sheet': 'upload_document',
  export: 'upload_document',
};

/** Makes the carrying of files. */
export function makeCarryFiles(options: CarryOptions): CarryFiles {
  const { fileWork: work, say, platform, config, signal } = options;
  const sending = { ...options, api: platform.calls };
  const failed = ({ language }: IncomingMessage): Said =>
    say({ language, lines: [{ room: 'first', key: 'errand-failed', values: {} }], buttons: [] });

  const contentOf = async (
    { message, file }: Arrival,
    { settings }: FileWork,
  ): Promise<IncomingMessage['content']> => {
    const { fileId, size_bytes = 0 } = file ?? { fileId: '' };
    const longest_bytes = FILE_LIMITS.own_bytes;
    const place = { api: platform.calls, token: config.botToken, root: config.botApiRoot, longest_bytes };
    const bytes = size_bytes > longest_bytes ? undefined : await fetchFile(fileId, { ...place, signal });
    if (bytes === undefined) return { kind: 'file', read: nothingRead('too-large') };
    const { readImport } = await import('../files/read-import.ts');
    const noting = { key: `import ${JSON.stringify([message.chat, message.id])}`, at: message.at, by: 1 };
    return { kind: 'file', read: await readImport(bytes, { reader: settings, noting }) };
  };

  return {
    read: async (arrival) => {
      const { message } = arrival;
      if (work === undefined || !(await work.isAdmitted(message))) return message;
      const reading = contentOf(arrival, work);
      const typing = whileTyping({ ...arrival, doing: 'typing' }, reading, sending);
      const language = await work.languageOf(message);
      const long = { spot: arrival, language, work: typing, failureOf: () => undefined };
      return { ...message, content: (await withProgress(long, sending)).result };
    },
    run: async (arrival, errand, message) => {
      const inLanguage = { ...message, language: errand.language };
      if (work === undefined) return [failed(inLanguage)];
      const notSent: Outcome = { said: [failed(inLanguage)], isFailed: true };
      const doing = DOING[errand.kind] ?? 'typing';
      const running = (async (): Promise<Outcome> => {
        const {
          said,
          file,
          more = [],
          isFailed = false,
        } = await whileTyping({ ...arrival, doing }, work.runErrand(errand, inLanguage), sending);
        if (file === undefined) return { said, isFailed };
        const [first] = said;
        const isBeside =
          said.length === 1 && first?.buttons.length === 0 && first.text.length <= LONGEST_CAPTION;
        const caption = isBeside && first !== undefined ? { caption: first.text } : {};
        const isSent = await sendFile({ file, spot: arrival, ...caption }, sending);
        if (!isSent) return notSent;
        for (const one of more) if (!(await sendFile({ file: one, spot: arrival }, sending))) return notSent;
        return { said: isBeside ? [] : said, isFailed: false };
      })();
      const { result, isTold } = await withProgress(
        {
          spot: arrival,
          language: errand.language,
          work: running,
          failureOf: (outcome) => (outcome.isFailed ? 'errand-failed' : undefined),
        },
        sending,
      );
      // The line that told of it says so already.
      return result.isFailed && isTold ? [] : result.said;
    },
  };
}
