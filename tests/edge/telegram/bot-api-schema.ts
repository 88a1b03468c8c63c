import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { createRequire, findPackageJSON } from 'node:module';
import { dirname, join } from 'node:path';

import { Ajv, type SchemaObject, type ValidateFunction } from 'ajv';
import type * as Generator from 'ts-json-schema-generator';

// Making the schemas takes two seconds, and more where the machine has other things to do. The long runs that stand
// apart from the gate come here too, without vitest.
if (process.env['VITEST'] !== undefined) (await import('vitest')).vi.setConfig({ testTimeout: 30_000 });

/**
 * The published parameters of the methods that we call, from the types of `@gramio/types` (Bot API 10.3, of 24
 * August 2026), which are generated from the platform's documentation.
 */
const PARAMS_OF: Readonly<Record<string, string>> = {
  getUpdates: 'GetUpdatesParams',
  sendMessage: 'SendMessageParams',
  answerCallbackQuery: 'AnswerCallbackQueryParams',
  setWebhook: 'SetWebhookParams',
  deleteWebhook: 'DeleteWebhookParams',
  editMessageText: 'EditMessageTextParams',
  sendPhoto: 'SendPhotoParams',
  sendDocument: 'SendDocumentParams',
  sendChatAction: 'SendChatActionParams',
  getFile: 'GetFileParams',
  setMyCommands: 'SetMyCommandsParams',
  answerInlineQuery: 'AnswerInlineQueryParams',
};

let checks: ReadonlyMap<string, ValidateFunction> | undefined;

const makeSchemas = (folder: string): Record<string, SchemaObject> => {
  // Loaded only when it is needed, as it brings a compiler with it.
  const { createGenerator } = createRequire(import.meta.url)('ts-json-schema-generator') as typeof Generator;
  const generator = createGenerator({
    path: join(folder, 'out', 'params.d.ts'),
    type: Object.values(PARAMS_OF)[0] ?? '',
    skipTypeCheck: true,
    jsDoc: 'none',
    additionalProperties: false,
  });
  const made = Object.entries(PARAMS_OF).map(
    ([method, type]) => [method, generator.createSchema(type)] as const,
  );
  return Object.fromEntries(made) as Record<string, SchemaObject>;
};

/** Making the schemas takes two seconds, so they are laid by for as long as the types and the methods are the same. */
const schemas = (): Record<string, SchemaObject> => {
  const manifest = findPackageJSON('@gramio/types', import.meta.url);
  if (manifest === undefined) throw new Error('Cannot make the schemas as @gramio/types is not installed');
  const key = createHash('sha256')
    .update(readFileSync(manifest))
    .update(readFileSync(import.meta.filename));
  const file = join(
    dirname(manifest),
    '..',
    '..',
    '.cache',
    `bot-api-params-${key.digest('hex').slice(0, 16)}.json`,
  );
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8')) as Record<string, SchemaObject>;
  const made = makeSchemas(dirname(manifest));
  mkdirSync(dirname(file), { recursive: true });
  // Whole or not at all, as several tests may come here at once.
  writeFileSync(`${file}.${process.pid}`, JSON.stringify(made));
  renameSync(`${file}.${process.pid}`, file);
  return made;
};

const makeChecks = (): ReadonlyMap<string, ValidateFunction> => {
  const ajv = new Ajv({ allErrors: true, allowUnionTypes: true });
  return new Map(Object.entries(schemas()).map(([method, schema]) => [method, ajv.compile(schema)]));
};

interface Texts {
  readonly text?: string;
  readonly caption?: string;
  readonly reply_markup?: { readonly inline_keyboard?: readonly (readonly { callback_data?: string }[])[] };
  readonly commands?: readonly { readonly command: string; readonly description: string }[];
  readonly results?: readonly {
    readonly id: string;
    readonly input_message_content?: { readonly message_text?: string };
  }[];
}

/** The lengths that the documentation gives in words: text 1–4096 characters, caption 0–1024, callback data 1–64 bytes. */
const lengthFaults = (method: string, params: Texts): string[] => {
  const { text = '', caption = '', reply_markup: markup, commands = [], results = [] } = params;
  const data = (markup?.inline_keyboard ?? [])
    .flat()
    .map((button) => Buffer.byteLength(button.callback_data ?? ''));
  const texts = [
    ...(method === 'sendMessage' || method === 'editMessageText' ? [text] : []),
    ...results.map((result) => result.input_message_content?.message_text ?? ''),
  ];
  return [
    ...texts
      .filter((one) => one.trim() === '' || one.length > 4096)
      .map((one) => `text of ${one.length} characters`),
    ...(caption.length > 1024 ? [`caption of ${caption.length} characters`] : []),
    ...data.filter((bytes) => bytes < 1 || bytes > 64).map((bytes) => `callback data of ${bytes} bytes`),
    ...commands
      .filter(({ command, description: { length } }) => !/^[a-z0-9_]{1,32}$/.test(command) || length > 256)
      .map(({ command }) => `command ${command}`),
    ...results.filter(({ id }) => !/^[^]{1,64}$/.test(id)).map(({ id }) => `result id ${id}`),
  ];
};

/** What is wrong with a call by the published schema and lengths; empty when nothing is. */
export function faultsOfCall(method: string, params: object): string[] {
  if (method === 'getMe') return Object.keys(params).map((name) => `${name} is not asked for`);
  checks ??= makeChecks();
  const check = checks.get(method);
  if (check === undefined) return [`${method} is not a method that we know`];
  const byShape = check(params)
    ? []
    : (check.errors ?? []).map((e) => `${e.instancePath} ${e.message ?? ''}`);
  return [...byShape, ...lengthFaults(method, params)];
}
