import type { Handled, IncomingMessage } from '../../../src/chat/conversation/ports.ts';
import type { Memory } from '../../../src/chat/conversation/memory.ts';
import type { Reply } from '../../../src/chat/replies/reply.ts';
import type { Said } from '../../../src/chat/replies/say.ts';

/** Answers each message with its count in this conversation and what it was; `two` brings two replies. */
export function handle(message: IncomingMessage, memory: Memory): Handled {
  const { content, language } = message;
  const words =
    content.kind === 'text'
      ? content.text
      : content.kind === 'press'
        ? `pressed ${content.key}`
        : `a ${content.what}`;
  const nextNumber = memory.nextNumber + 1;
  const { cellar, chat, person } = message;
  const reply = (text: string): Reply => ({
    language,
    lines: [{ room: 'first', key: 'echo', values: { text } }],
    buttons: [{ key: `again:${memory.nextNumber}`, mark: '1', label: 'again', values: {} }],
  });
  if (words === 'throw') throw new Error('a planted fault');
  const echo = `${memory.nextNumber}: ${words}`;
  return {
    writes: [{ kind: 'memory', who: { cellar, chat, person }, memory: { ...memory, nextNumber } }],
    replies: words === 'two' ? [reply(echo), reply('and more')] : [reply(echo)],
  };
}

/** Says such a reply. */
export function say({ lines, buttons }: Reply): Said {
  return {
    text: lines.map((line) => line.values['text'] ?? line.key).join('\n'),
    buttons: buttons.map(({ key, mark, label }) => ({ key, mark, label })),
  };
}
