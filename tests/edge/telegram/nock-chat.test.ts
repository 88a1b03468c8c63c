import nock from 'nock';
import { afterEach, beforeEach, expect, test } from 'vitest';

import { faultsOfCall } from './bot-api-schema.ts';
import { TOKEN } from './fake-bot-api.ts';
import { realConversation } from './real-conversation.ts';
import { serveBot } from './served-bot.ts';

interface Sent {
  readonly text: string;
  readonly reply_markup?: {
    readonly inline_keyboard: readonly (readonly { text: string; callback_data: string }[])[];
  };
}

const ROOT = 'https://api.telegram.org';
const FROM = { id: 7001, is_bot: false, first_name: 'Rosa', language_code: 'en' };
const CHAT = { id: 7001, type: 'private' };

/** What Rosa does next, given what she has got; one update. */
type Step = (got: readonly Sent[]) => object;

const says =
  (text: string): Step =>
  (got) => ({ message: { message_id: 10 + got.length, date: 1_767_000_000, chat: CHAT, from: FROM, text } });

const taps =
  (label: string): Step =>
  (got) => {
    const button = got
      .at(-1)
      ?.reply_markup?.inline_keyboard.flat()
      .find((one) => one.text === label);
    const message = { message_id: 9, date: 1_767_000_000, chat: CHAT };
    return {
      callback_query: { id: 'tap', from: FROM, message, chat_instance: '1', data: button?.callback_data },
    };
  };

/**
 * The platform as `nock` plays it: the address is the real one, and nothing leaves this process. Each poll brings
 * the next step of the script as soon as the one before is answered; the poll after the last one stays open.
 */
const play = (script: readonly Step[]): { sent: Sent[]; faults: string[]; ended: Promise<void> } => {
  const sent: Sent[] = [];
  const faults: string[] = [];
  let polls = 0;
  let wake = (): void => undefined;
  const { promise: ended, resolve: end } = Promise.withResolvers<void>();
  const answer = async (method: string, params: { offset?: number; timeout?: number }): Promise<unknown> => {
    faults.push(...faultsOfCall(method, params));
    if (method === 'getMe') return { id: 1, is_bot: true, first_name: 'b', username: 'a_cellar_bot' };
    if (method === 'sendMessage') {
      sent.push(params as Sent);
      wake();
      return { message_id: 1, date: 0, chat: CHAT };
    }
    if (method !== 'getUpdates') return true;
    if (params.timeout === 0) return [];
    const number = polls;
    polls += 1;
    if (number > 0 && params.offset !== 100 + number)
      faults.push(`offset ${params.offset} in poll ${number}`);
    while (sent.length < number) await new Promise<void>((resolve) => (wake = resolve));
    const step = script[number];
    if (step !== undefined) return [{ update_id: 100 + number, ...step(sent) }];
    end();
    return new Promise(() => undefined);
  };
  nock(ROOT)
    .persist()
    .post(new RegExp(`^/bot${TOKEN}/\\w+$`))
    .reply(async (request: Request) => {
      const method = request.url.slice(request.url.lastIndexOf('/') + 1);
      return [200, { ok: true, result: await answer(method, (await request.json()) as object) }];
    });
  return { sent, faults, ended };
};

beforeEach(() => nock.disableNetConnect());
afterEach(() => {
  nock.abortPendingRequests();
  nock.cleanAll();
  nock.enableNetConnect();
});

test('a private chat goes its way through the real address', async () => {
  const { sent, faults, ended } = play([
    says('/start'),
    says('pH 3.58 free 21'),
    says('1450 gal'),
    taps('Working'),
    says('thanks'),
  ]);
  const bot = serveBot(ROOT, realConversation);
  await ended;
  nock.abortPendingRequests();
  await bot.stop();
  expect(sent.map(({ text }) => text)).toEqual([
    expect.stringContaining('T4 1450 gal pH 3.58 free 21'),
    expect.stringContaining('volume?'),
    expect.stringContaining('256 g potassium metabisulfite'),
    expect.stringContaining('147.7 g ÷ 0.57629 = 256.3 g'),
    expect.not.stringMatching(/\d/),
  ]);
  expect(faults).toEqual([]);
});
