import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { makeServeTurn, type Serving } from '../../../src/edge/serve-message.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { createLog } from '../../../src/edge/logging.ts';
import { systemClock, type Clock } from '../../../src/edge/clock.ts';
import { serveTelegram, type TelegramOptions } from '../../../src/edge/telegram/serve-telegram.ts';
import { TOKEN } from './fake-bot-api.ts';
import * as stub from './stub-conversation.ts';

const BEGUN_MS = performance.now();

/** A clock on which a second passes in a millisecond. */
export const hastyClock: Clock = {
  now: () => Math.round(1_767_000_100_000 + 1000 * (performance.now() - BEGUN_MS)),
  wait: (ms, signal) => systemClock.wait(ms / 1000, signal),
};

/** A bot at work in this process. */
export interface ServedBot {
  /** What the operator was told. */
  readonly told: string[];
  /** Every line of the log. */
  readonly logged: string[];
  /** Asks it to stop, as SIGTERM does, and resolves when it has; rejects with what it ended with. */
  stop(): Promise<void>;
  /** Resolves or rejects when it ends by itself. */
  readonly ended: Promise<void>;
}

/** What a bot may be served with in place of the usual. */
export type BotChanges = Partial<TelegramOptions & Pick<Serving, 'handle' | 'say' | 'store'>>;

/** Serves the fake platform at `root` with the stub conversation and a store in memory, unless others are handed in. */
export function serveBot(root: string, changes: BotChanges = {}): ServedBot {
  const told: string[] = [];
  const logged: string[] = [];
  const stopping = new AbortController();
  const log = createLog({ level: 'trace', secret: TOKEN, to: { write: (line) => void logged.push(line) } });
  const {
    handle = stub.handle,
    say = stub.say,
    store = createMemoryCellars({ now: hastyClock.now }),
    ...others
  } = changes;
  const ended = serveTelegram({
    serve: makeServeTurn({ handle, say, store, settings: DEFAULT_SETTINGS }),
    say,
    store,
    log,
    clock: hastyClock,
    config: { botToken: TOKEN, botApiRoot: root },
    tell: (sentence) => void told.push(sentence),
    signal: stopping.signal,
    ...others,
    // Long on the hasty clock, so that only the tests that want them see them end.
    times: {
      callTimeout_s: 20,
      sendTimeout_s: 20,
      watchdog_s: 1e6,
      progress_s: 1e6,
      finish_s: 1e4,
      confirm_s: 1e4,
      ...changes.times,
    },
  });
  // A test that expects it to end badly looks at it later.
  ended.catch(() => undefined);
  return {
    told,
    logged,
    ended,
    stop: () => {
      stopping.abort();
      return ended;
    },
  };
}
