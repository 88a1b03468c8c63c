import type { Handle } from '../../../src/chat/conversation/ports.ts';
import type { Reply } from '../../../src/chat/replies/reply.ts';
import type { Said } from '../../../src/chat/replies/say.ts';

/** Answers each message with its count in this conversation and what it was; `two` brings two replies. */
export const handle: Handle = async ({ content, language, chat }, view) => {
  const words =
    content.kind === 'text'
      ? content.text
      : content.kind === 'press'
        ? `pressed ${content.key}`
        : `a ${'what' in content ? content.what : content.kind}`;
  const count = Number((await view.kept(chat)) ?? 0) + 1;
  const reply = (text: string): Reply => ({
    language,
    lines: [{ room: 'first', key: 'echo', values: { text } }],
    buttons: [{ key: `again:${count}`, mark: '1', label: 'again', values: {} }],
  });
  if (words === 'throw') throw new Error('a planted fault');
  const echo = `${count}: ${words}`;
  return {
    writes: [{ kind: 'keep', key: chat, text: String(count) }],
    replies: words === 'two' ? [reply(echo), reply('and more')] : [reply(echo)],
  };
};

/** Says such a reply. */
export function say({ lines, buttons }: Reply): Said {
  return {
    text: lines.map((line) => line.values['text'] ?? line.key).join('\n'),
    buttons: buttons.map(({ key, mark, label }) => ({ key, mark, label })),
  };
}
