import { setTimeout as wait } from 'node:timers/promises';

import type { FakeBotApi } from './fake-bot-api.ts';

/** What goes wrong with bringing one update: the connection is cut before, or after, the answer could be read. */
export type BringFault = 'none' | 'cut' | 'receipt lost';

/** Brings updates to a webhook, as the platform does. */
export interface Bringing {
  /** The status of each answer, in order. */
  readonly statuses: number[];
  stop(): Promise<void>;
}

const AGAIN_MS = 5;

/**
 * Brings what is offered to the webhook that the bot has asked for, which is reached at `root` here: one after the
 * other, each again until it is answered with 200. The next ones go wrong as `faults` says.
 */
export function bringUpdates(
  api: FakeBotApi,
  { root, faults = [] }: { readonly root: () => string; readonly faults?: BringFault[] },
): Bringing {
  const statuses: number[] = [];
  let stopped = false;

  const bringOnce = async (update: object): Promise<boolean> => {
    const { webhook } = api;
    const fault = faults.shift() ?? 'none';
    if (webhook === undefined || fault === 'cut') return false;
    try {
      const response = await fetch(root() + new URL(webhook.url).pathname, {
        method: 'POST',
        headers: {
          'content-type': 'application/json',
          'x-telegram-bot-api-secret-token': webhook.secret_token,
        },
        body: JSON.stringify(update),
      });
      await response.arrayBuffer();
      if (fault === 'receipt lost') return false;
      statuses.push(response.status);
      return response.status === 200;
    } catch {
      return false;
    }
  };

  const run = async (): Promise<void> => {
    while (!stopped) {
      const updates = api.takeUpdates();
      for (const update of updates) while (!stopped && !(await bringOnce(update))) await wait(AGAIN_MS);
      if (updates.length === 0) await wait(1);
    }
  };
  const running = run();
  return {
    statuses,
    stop: () => {
      stopped = true;
      return running;
    },
  };
}
