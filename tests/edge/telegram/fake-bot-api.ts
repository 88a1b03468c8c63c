import { createServer, type IncomingMessage, type ServerResponse } from 'node:http';
import type { AddressInfo, Socket } from 'node:net';

import { faultsOfCall } from './bot-api-schema.ts';
import { FakeChats, type Delivered } from './fake-chats.ts';
import { readCall, type Params, type Upload } from './read-call.ts';
import { TOKEN } from './token.ts';

export { TOKEN, type Delivered };

/** What goes wrong with one call. */
export type Fault =
  /** Nothing: this call goes well. */
  | 'none'
  /** No answer ever. */
  | 'hang'
  /** The connection is cut before anything is done. */
  | 'reset'
  /** It is done, and the connection is cut before the receipt. */
  | 'receipt lost'
  /** A page of a gateway that is no JSON. */
  | 'gateway page'
  | { readonly error_code: number; readonly description: string; readonly retry_after?: number };

type Update = { readonly update_id: number } & Record<string, unknown>;

/**
 * A Bot API on this machine: true long polling, offsets that confirm, one poller at a time, and faults on request.
 * Every call is checked against the published schema.
 */
export class FakeBotApi extends FakeChats implements AsyncDisposable {
  /** All calls that arrived with the right token, in order. */
  readonly calls: { readonly method: string; readonly params: Params }[] = [];
  /** What the caller did that the platform's documentation forbids; to be empty at the end of a test. */
  readonly broken: string[] = [];
  /** Where updates are to be brought, as the bot has asked. */
  webhook: { readonly url: string; readonly secret_token: string } | undefined;
  /** Everything below this number has been confirmed. */
  confirmed = 0;
  root = '';
  /** While it is away every call is cut. */
  away = false;
  /** How long a second of `retry_after` is here, for bots whose clock runs faster. */
  second_ms = 1000;

  readonly #faults = new Map<string, Fault[]>();
  readonly #quietUntil = new Map<unknown, number>();
  readonly #watchers = new Set<() => void>();
  readonly #sockets = new Set<Socket>();
  readonly #server = createServer((request, response) => void this.#serve(request, response));
  #updates: Update[] = [];
  #repeats: Update[] = [];
  #waitingPoll: { readonly end: (answer: object, status?: number) => void } | undefined;
  #lastUpdateId = 1000;

  /** Starts it on a free port. */
  static async start(): Promise<FakeBotApi> {
    const api = new FakeBotApi();
    api.#server.on('connection', (socket) => {
      api.#sockets.add(socket);
      socket.on('close', () => api.#sockets.delete(socket));
    });
    await new Promise<void>((resolve) => api.#server.listen(0, '127.0.0.1', resolve));
    api.root = `http://127.0.0.1:${(api.#server.address() as AddressInfo).port}`;
    return api;
  }

  async [Symbol.asyncDispose](): Promise<void> {
    for (const socket of this.#sockets) socket.destroy();
    await new Promise((resolve) => this.#server.close(resolve));
  }

  /** The next calls of a method go wrong, one after the other. */
  fail(method: string, ...faults: readonly Fault[]): void {
    this.#faults.set(method, [...(this.#faults.get(method) ?? []), ...faults]);
  }

  /** Puts an update in line for whoever polls; `twice`: it comes again after it was confirmed. */
  offer(content: Record<string, unknown>, options: { readonly twice?: boolean } = {}): void {
    this.#lastUpdateId += 1;
    const update = { update_id: this.#lastUpdateId, ...content };
    this.#updates.push(update);
    if (options.twice === true) this.#repeats.push(update);
    this.#endPollWithUpdates();
  }

  /** Resolves as soon as it is so; looked at after each call. */
  until(isSo: () => boolean): Promise<void> {
    return new Promise((resolve) => {
      const look = (): void => {
        if (!isSo()) return;
        this.#watchers.delete(look);
        resolve();
      };
      this.#watchers.add(look);
      look();
    });
  }

  /** Takes the updates that nobody has had yet, to be brought to a webhook. */
  takeUpdates(): readonly object[] {
    return this.#updates.splice(0);
  }

  callsOf(method: string): readonly Params[] {
    return this.calls.filter((call) => call.method === method).map((call) => call.params);
  }

  async #serve(request: IncomingMessage, response: ServerResponse): Promise<void> {
    if (this.away) return void request.socket.destroy();
    const parts: Buffer[] = [];
    for await (const part of request) parts.push(part as Buffer);
    const body = Buffer.concat(parts);
    if (request.url?.startsWith('/file/')) return this.handFile(request.url, response);
    const [, token, method = ''] = /^\/bot([^/]+)\/(\w+)$/.exec(request.url ?? '') ?? [];
    const end = (answer: object, status = 200): void => {
      response.writeHead(status, { 'content-type': 'application/json' }).end(JSON.stringify(answer));
    };
    const refuse = (error_code: number, description: string, more: object = {}): void =>
      end({ ok: false, error_code, description, ...more }, error_code);
    if (token !== TOKEN) return refuse(401, 'Unauthorized');
    const { params, file } = await readCall(body, request.headers['content-type'] ?? '');
    this.calls.push({ method, params });
    this.broken.push(...faultsOfCall(method, params).map((fault) => `${method}: ${fault}`));
    this.#callTooEarly(method, params);
    const fault = this.#faults.get(method)?.shift();
    const cut = (): void => void request.socket.destroy();
    if (fault === 'reset') cut();
    else if (fault === 'receipt lost')
      this.#perform(method, params, { end: cut, refuse: cut, file }, response);
    else if (fault === 'gateway page') response.writeHead(502).end('<html>bad gateway</html>');
    else if (typeof fault === 'object') {
      const { error_code, description, retry_after } = fault;
      if (retry_after === undefined) refuse(error_code, description);
      else {
        this.#quietUntil.set(params['chat_id'] ?? method, Date.now() + this.second_ms * retry_after);
        refuse(error_code, description, { parameters: { retry_after } });
      }
    } else if (fault === undefined || fault === 'none')
      this.#perform(method, params, { end, refuse, file }, response);
    for (const look of this.#watchers) look();
  }

  #perform(
    method: string,
    params: Params,
    to: {
      end: (answer: object) => void;
      refuse: (code: number, description: string) => void;
      file?: Upload | undefined;
    },
    response: ServerResponse,
  ): void {
    const done = (result: unknown): void => to.end({ ok: true, result });
    if (method === 'getMe')
      done({ id: 4455667788, is_bot: true, first_name: 'brimnote', username: 'a_cellar_bot' });
    else if (method === 'sendMessage' || method === 'sendPhoto' || method === 'sendDocument')
      done(this.deliver(params, to.file, method));
    else if (method === 'editMessageText') this.edit(params, to);
    else if (method === 'getFile') {
      const file = this.files.get(String(params['file_id']));
      if (file === undefined) to.refuse(400, 'Bad Request: invalid file_id');
      else done({ file_id: params['file_id'], file_unique_id: 'u', file_path: file.path });
    } else if (method === 'getUpdates') this.#poll(params, to, response);
    else if (method === 'setWebhook') {
      this.webhook = params as { url: string; secret_token: string };
      done(true);
    } else done(true);
  }

  #poll(
    params: Params,
    { end, refuse }: { end: (answer: object) => void; refuse: (code: number, description: string) => void },
    response: ServerResponse,
  ): void {
    const { offset = 0, timeout = 0 } = params as { offset?: number; timeout?: number };
    this.#waitingPoll?.end(
      { ok: false, error_code: 409, description: 'Conflict: terminated by other getUpdates request' },
      409,
    );
    this.confirmed = Math.max(this.confirmed, offset);
    this.#updates = this.#updates.filter(({ update_id }) => update_id >= offset);
    const leave = (): void => {
      clearTimeout(timer);
      if (this.#waitingPoll === waiting) this.#waitingPoll = undefined;
    };
    const waiting = {
      end: (answer: object, status = 200): void => {
        leave();
        if (status === 200) end(answer);
        else refuse(status, 'Conflict: terminated by other getUpdates request');
      },
    };
    const timer = setTimeout(() => waiting.end({ ok: true, result: [] }), 1000 * timeout);
    response.on('close', leave);
    this.#waitingPoll = waiting;
    this.#endPollWithUpdates();
  }

  #endPollWithUpdates(): void {
    const repeated = this.#repeats.filter(({ update_id }) => update_id < this.confirmed);
    if (this.#waitingPoll === undefined || this.#updates.length + repeated.length === 0) return;
    this.#repeats = this.#repeats.filter((update) => !repeated.includes(update));
    this.#waitingPoll.end({ ok: true, result: [...repeated, ...this.#updates].slice(0, 100) });
  }

  /** A chat, or a method without one, that was told to wait must not be called before that is over. */
  #callTooEarly(method: string, params: Params): void {
    const until = this.#quietUntil.get(params['chat_id'] ?? method) ?? 0;
    if (Date.now() < until - 1) this.broken.push(`${method}: called before retry_after was over`);
  }
}
