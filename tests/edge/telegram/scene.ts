import { assert } from 'vitest';

import { FakeBotApi, TOKEN } from './fake-bot-api.ts';
import { Person } from './person.ts';
import { serveBot, type BotChanges, type ServedBot } from './served-bot.ts';

/** A fake platform, somebody with a phone, and bots. */
export interface Scene extends AsyncDisposable {
  readonly api: FakeBotApi;
  readonly rosa: Person;
  /** Starts a bot on the platform; it is stopped when the scene is over. */
  readonly serve: (changes?: BotChanges) => ServedBot;
}

/**
 * Opens a scene. When it is over, no call may have broken the platform's rules, and the secret half of the token
 * may stand in no line of the log and in no sentence.
 */
export async function openScene(): Promise<Scene> {
  const api = await FakeBotApi.start();
  api.second_ms = 1;
  const bots: ServedBot[] = [];
  return {
    api,
    rosa: new Person(api, 7001),
    serve: (changes) => {
      const bot = serveBot(api.root, changes);
      bots.push(bot);
      return bot;
    },
    [Symbol.asyncDispose]: async () => {
      for (const bot of bots) await bot.stop().catch(() => undefined);
      await api[Symbol.asyncDispose]();
      const shown = bots.flatMap((bot) => [...bot.told, ...bot.logged]).join('\n');
      assert.notInclude(shown, TOKEN.slice(TOKEN.indexOf(':') + 1), 'the token in a log line or a sentence');
      assert.deepEqual(api.broken, [], 'calls that the platform forbids');
    },
  };
}
