import type { ServerResponse } from 'node:http';

import type { Params, Upload } from './read-call.ts';
import { TOKEN } from './token.ts';

/** A message as a person gets it. */
export interface Delivered {
  readonly chat_id: number;
  /** The text, or the caption of a file; another one since it was edited. */
  text: string;
  buttons: readonly { readonly text: string; readonly callback_data: string }[];
  readonly message_id: number;
  readonly thread?: number;
  /** The message that it answers. */
  readonly replyTo?: number;
  readonly file?: { readonly name: string; readonly bytes: Uint8Array; readonly isPicture: boolean };
  isEdited?: true;
}

type Markup = { readonly inline_keyboard: readonly Delivered['buttons'][] };

/** What stands in the chats of a fake platform, and the files that people sent. */
export class FakeChats {
  /** All messages that people got, in order. */
  readonly delivered: Delivered[] = [];
  /** Files that people sent, by their id: where they are said to be, and what is in them. */
  readonly files = new Map<string, { readonly path: string; readonly bytes: Uint8Array }>();
  /** Paths of files that were asked for. */
  readonly fetched: string[] = [];

  deliver(params: Params, file: Upload | undefined, method: string): object {
    const { chat_id, text, caption, reply_markup, message_thread_id, reply_parameters } =
      params as unknown as {
        chat_id: number;
        text?: string;
        caption?: string;
        reply_markup?: Markup;
        message_thread_id?: number;
        reply_parameters?: { message_id: number };
      };
    const message_id = 5001 + this.delivered.length;
    this.delivered.push({
      chat_id,
      text: text ?? caption ?? '',
      buttons: reply_markup?.inline_keyboard.flat() ?? [],
      message_id,
      ...(message_thread_id !== undefined && { thread: message_thread_id }),
      ...(reply_parameters !== undefined && { replyTo: reply_parameters.message_id }),
      ...(file !== undefined && {
        file: { ...file, isPicture: method === 'sendPhoto' },
      }),
    });
    return { message_id, date: 0, chat: { id: chat_id, type: 'private' }, text };
  }

  edit(
    params: Params,
    { end, refuse }: { end: (answer: object) => void; refuse: (code: number, description: string) => void },
  ): void {
    const { chat_id, message_id, text, reply_markup } = params as unknown as {
      chat_id: number;
      message_id: number;
      text: string;
      reply_markup?: Markup;
    };
    const one = this.delivered.find((each) => each.message_id === message_id && each.chat_id === chat_id);
    if (one === undefined) return refuse(400, 'Bad Request: message to edit not found');
    if (one.text === text) return refuse(400, 'Bad Request: message is not modified');
    Object.assign(one, { text, buttons: reply_markup?.inline_keyboard.flat() ?? [], isEdited: true });
    end({ ok: true, result: { message_id, date: 0, chat: { id: chat_id, type: 'private' }, text } });
  }

  handFile(url: string, response: ServerResponse): void {
    const [, token, path = ''] = /^\/file\/bot([^/]+)\/(.+)$/.exec(url) ?? [];
    this.fetched.push(path);
    const file = [...this.files.values()].find((one) => one.path === path);
    if (token !== TOKEN || file === undefined) return void response.writeHead(404).end('no such file');
    response.writeHead(200).end(file.bytes);
  }
}
