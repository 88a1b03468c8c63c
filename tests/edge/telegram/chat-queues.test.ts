import { describe, expect, test } from 'vitest';

import { createChatQueues } from '../../../src/edge/telegram/chat-queues.ts';

/** Tasks that end when they are told to, and a list of what happened. */
const stage = (): {
  happened: string[];
  end: (name: string) => void;
  task: (name: string) => () => Promise<void>;
} => {
  const happened: string[] = [];
  const ends = new Map<string, () => void>();
  return {
    happened,
    end: (name) => ends.get(name)?.(),
    task: (name) => async () => {
      happened.push(`${name} begins`);
      await new Promise<void>((resolve) => void ends.set(name, resolve));
      happened.push(`${name} ends`);
    },
  };
};

const turn = (): Promise<void> => new Promise((resolve) => void setImmediate(resolve));

describe('the queues', () => {
  test('let the tasks of one chat run one after the other, in order', async () => {
    const queues = createChatQueues();
    const { happened, end, task } = stage();
    queues.add(1, task('a'));
    queues.add(1, task('b'));
    await turn();
    expect(happened).toEqual(['a begins']);
    end('a');
    await turn();
    expect(happened).toEqual(['a begins', 'a ends', 'b begins']);
  });

  test('let different chats run side by side', async () => {
    const queues = createChatQueues();
    const { happened, task } = stage();
    queues.add(1, task('a'));
    queues.add(2, task('b'));
    await turn();
    expect(happened).toEqual(['a begins', 'b begins']);
  });

  test('are idle when the last task has ended, also one that was added meanwhile', async () => {
    const queues = createChatQueues();
    const { happened, end, task } = stage();
    queues.add(1, task('a'));
    const idle = queues.idle().then(() => happened.push('idle'));
    await turn();
    queues.add(2, task('b'));
    end('a');
    await turn();
    end('b');
    await idle;
    expect(happened).toEqual(['a begins', 'b begins', 'a ends', 'b ends', 'idle']);
  });

  test('are idle at once when there is nothing to do', async () => {
    await expect(createChatQueues().idle()).resolves.toBeUndefined();
  });
});
