import { expect, test } from 'vitest';

import type { IncomingMessage } from '../../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { createLog } from '../../../src/edge/logging.ts';
import { makeServe } from '../../../src/edge/serve-message.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { answerArrival } from '../../../src/edge/telegram/answer-arrival.ts';
import type { Platform } from '../../../src/edge/telegram/platform.ts';
import { handle, say } from './stub-conversation.ts';

test('an answer waits one second for its tap to be acknowledged, and no longer', async () => {
  const waits_s: number[] = [];
  const sent: string[] = [];
  const platform = {
    once: { answerCallbackQuery: () => new Promise(() => undefined) },
    patient: { sendMessage: async (_: number, text: string) => void sent.push(text) },
  } as unknown as Platform;
  const message: IncomingMessage = {
    cellar: 'c',
    chat: 'c',
    person: 'p',
    id: 'tap 1',
    at: 0,
    language: 'en',
    content: { kind: 'press', key: 'w:1' },
  };
  const store = createMemoryCellars({ now: () => 0 });
  const fail = (fault: unknown): never => {
    throw fault;
  };
  const done = await answerArrival(
    { updateId: 1, chatId: 1, tapId: 'tap', message },
    {
      serve: makeServe({ handle, say, store, settings: DEFAULT_SETTINGS, report: fail }),
      platform,
      clock: { now: () => 0, wait: async (ms) => void waits_s.push(ms / 1000) },
      log: createLog({ level: 'silent', to: { write: () => undefined } }),
      signal: new AbortController().signal,
    },
  );
  expect({ done, waits_s, sent }).toEqual({ done: true, waits_s: [1], sent: ['1: pressed w:1'] });
});
