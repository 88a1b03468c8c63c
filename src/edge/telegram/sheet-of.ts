import type { ArrivedFile } from './arrival.ts';
import { readDocument, type TelegramMessage } from './update.ts';

/** What a sheet is by its name or by what the sender's machine says of it; what is in it is looked at later. */
const NAME = /\.(csv|tsv|txt|xlsx)$/i;
const KINDS: readonly string[] = [
  'text/csv',
  'text/comma-separated-values',
  'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
];

/** The sheet that a message carries; undefined where it carries none. Its name goes no further: it names nothing here. */
export function sheetOf(message: TelegramMessage): ArrivedFile | undefined {
  // An animation comes with a document as well.
  if (message['animation'] !== undefined) return undefined;
  const document = readDocument(message.document);
  if (document === undefined) return undefined;
  const { file_id: fileId, file_name = '', mime_type = '', file_size: size_bytes } = document;
  if (!NAME.test(file_name) && !KINDS.includes(mime_type)) return undefined;
  return { fileId, ...(size_bytes !== undefined && { size_bytes }) };
}
