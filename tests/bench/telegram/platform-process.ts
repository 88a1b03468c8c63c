/**
 * A Bot API in a process of its own, as light as it can be: long polling, offsets, and an answer to every message. It is
 * told by its parent what to offer, and tells how long the answers took.
 */
import { createServer, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';

/** What the parent asks for. */
export interface Offer {
  readonly updates: number;
  readonly chats: number;
  readonly texts: readonly string[];
  /** All at once where it is absent. */
  readonly perSecond?: number;
  /** A 429 is given to whoever sends more than this within a second. */
  readonly mostPerSecond?: number;
}

/** What the parent is told. */
export interface Outcome {
  /** From the offer to the last answer. */
  readonly took_ms: number;
  /** Median of the times from the offer of an update to its answer. */
  readonly p50_ms: number;
  readonly tooFast: number;
}

type Update = { readonly update_id: number };

const MOST_IN_BATCH = 100;
let nextId = 1000;
let waiting: Update[] = [];
let poll: { readonly response: ServerResponse; readonly timer: NodeJS.Timeout } | undefined;
let offeredAt = new Map<number, number[]>();
let times: number[] = [];
let sends: number[] = [];
let mostPerSecond = Infinity;
let tooFast = 0;
let begun = 0;
let expected = 0;

const reply = (response: ServerResponse, result: unknown): void => {
  response.writeHead(200, { 'content-type': 'application/json' }).end(JSON.stringify({ ok: true, result }));
};

const endPoll = (): void => {
  if (poll === undefined || waiting.length === 0) return;
  clearTimeout(poll.timer);
  const { response } = poll;
  poll = undefined;
  reply(response, waiting.slice(0, MOST_IN_BATCH));
};

const startPoll = (response: ServerResponse, { offset = 0, timeout = 0 }): void => {
  const confirmed = waiting.findIndex(({ update_id }) => update_id >= offset);
  waiting = confirmed === -1 ? [] : waiting.slice(confirmed);
  const timer = setTimeout(() => {
    poll = undefined;
    reply(response, []);
  }, 1000 * timeout);
  response.on('close', () => clearTimeout(timer));
  poll = { response, timer };
  endPoll();
};

const take = (response: ServerResponse, { chat_id, text }: { chat_id: number; text: string }): void => {
  const now = performance.now();
  sends = sends.filter((at) => at > now - 1000);
  if (sends.length >= mostPerSecond) {
    tooFast += 1;
    const answer = { ok: false, error_code: 429, description: 'slow down', parameters: { retry_after: 1 } };
    return void response.writeHead(429).end(JSON.stringify(answer));
  }
  if (mostPerSecond < Infinity) sends.push(now);
  const offered = offeredAt.get(chat_id)?.shift();
  if (offered !== undefined) times.push(now - offered);
  reply(response, { message_id: 1, date: 0, chat: { id: chat_id, type: 'private' }, text });
  if (times.length === expected) {
    expected = 0;
    const p50_ms = times.toSorted((a, b) => a - b)[Math.floor(times.length / 2)] ?? 0;
    process.send?.({ took_ms: now - begun, p50_ms, tooFast } satisfies Outcome);
  }
};

const server = createServer((request, response) => {
  const parts: Buffer[] = [];
  request.on('data', (part: Buffer) => parts.push(part));
  request.on('end', () => {
    const text = Buffer.concat(parts).toString();
    const params = (text === '' ? {} : JSON.parse(text)) as Record<string, never>;
    const method = (request.url ?? '').split('/').at(-1);
    if (method === 'getUpdates') startPoll(response, params);
    else if (method === 'sendMessage') take(response, params as never);
    else if (method === 'getMe')
      reply(response, { id: 1, is_bot: true, first_name: 'b', username: 'a_cellar_bot' });
    else reply(response, true);
  });
});
server.keepAliveTimeout = 60_000;

const offerOne = (nth: number, { chats, texts }: Offer): void => {
  const id = 10_000 + (nth % chats);
  nextId += 1;
  const from = { id, is_bot: false, first_name: 'Rosa', language_code: 'en' };
  const chat = { id, type: 'private', first_name: 'Rosa' };
  const [date, text] = [Math.floor(Date.now() / 1000), texts[nth % texts.length]];
  waiting.push({ update_id: nextId, message: { message_id: nextId, date, chat, from, text } } as Update);
  const times_ = offeredAt.get(id);
  if (times_ === undefined) offeredAt.set(id, [performance.now()]);
  else times_.push(performance.now());
};

process.on('message', (offer: Offer) => {
  [times, sends, tooFast, offeredAt] = [[], [], 0, new Map()];
  begun = performance.now();
  expected = offer.updates;
  mostPerSecond = offer.mostPerSecond ?? Infinity;
  if (offer.perSecond === undefined) {
    for (let nth = 0; nth < offer.updates; nth += 1) offerOne(nth, offer);
    return endPoll();
  }
  let nth = 0;
  const timer = setInterval(() => {
    offerOne(nth, offer);
    nth += 1;
    if (nth === offer.updates) clearInterval(timer);
    endPoll();
  }, 1000 / offer.perSecond);
});
server.listen(0, '127.0.0.1', () => process.send?.((server.address() as AddressInfo).port));
