import { expect, test } from 'vitest';

import type { IncomingMessage } from '../../../src/chat/conversation/ports.ts';
import { createLog } from '../../../src/edge/logging.ts';
import { createMemoryStore } from '../../../src/edge/store/memory.ts';
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
  const done = await answerArrival(
    { updateId: 1, chatId: 1, tapId: 'tap', message },
    {
      handle,
      say,
      platform,
      state: createMemoryStore(),
      clock: { now: () => 0, wait: async (ms) => void waits_s.push(ms / 1000) },
      log: createLog({ level: 'silent', to: { write: () => undefined } }),
      signal: new AbortController().signal,
    },
  );
  expect({ done, waits_s, sent }).toEqual({ done: true, waits_s: [1], sent: ['1: pressed w:1'] });
});
