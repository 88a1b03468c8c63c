import type { CellarStore, Due, TakenDue, Write } from '../../core/cellar/cellar-store.ts';
import type { Spot } from './arrival.ts';
import { chatIdOf, chatNameOf } from './who-of.ts';

const keyOf = ({ id }: Pick<Due, 'id'>): string => `telegram topic ${id}`;

/** Only groups have topics; the platform gives them negative numbers. */
const isGroup = (chatId: number | undefined): boolean => chatId !== undefined && chatId < 0;

/** What keeps in which topic of a group something will be said later: where it was asked for. */
export function noteTopics({ chatId, threadId }: Spot, writes: readonly Write[]): Write[] {
  if (!isGroup(chatId)) return [];
  return writes.flatMap((write): Write[] => {
    if (write.kind !== 'due' || write.due.chat !== chatNameOf(chatId)) return [];
    const key = keyOf(write.due);
    return [threadId === undefined ? { kind: 'drop', key } : { kind: 'keep', key, text: String(threadId) }];
  });
}

/** The topic in which something is to be said; undefined: in the general one. */
export async function topicOf(due: TakenDue, store: Pick<CellarStore, 'look'>): Promise<number | undefined> {
  if (!isGroup(chatIdOf(due.chat))) return undefined;
  const text = await store.look(due.cellar, (view) => view.kept(keyOf(due)));
  return text === undefined ? undefined : Number(text);
}

/** What forgets the topic of something that was said and will not be said again. */
export function forgetTopic(due: TakenDue, writes: readonly Write[]): Write[] {
  const isAgain = writes.some((write) => write.kind === 'due' && write.due.id === due.id);
  return isAgain || !isGroup(chatIdOf(due.chat)) ? [] : [{ kind: 'drop', key: keyOf(due) }];
}
