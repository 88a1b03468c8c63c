import type { Handled } from '../../chat/conversation/ports.ts';
import type { Reading } from '../../chat/reader/understood.ts';
import type { Reply } from '../../chat/replies/reply.ts';
import type { Said } from '../../chat/replies/say.ts';

/** What is told of a reading; how it was read in detail is no one's business outside. */
function asUnderstood({ intent, topic, fields, assumed, asks, problems, setAside }: Reading): object {
  return { intent, ...(topic !== undefined && { topic }), fields, assumed, asks, problems, setAside };
}

/** One answer as the line that a program reads: what was understood, the figures, the text, the buttons. */
export function toOutputLine(
  id: string | number | null,
  handled: Handled,
  say: (reply: Reply) => Said,
): object {
  const said = handled.replies.map(say);
  return {
    id,
    understood: handled.understood?.readings.map(asUnderstood) ?? [],
    shared: handled.understood?.shared ?? {},
    answers: handled.answers ?? [],
    reply: said.map(({ text }) => text).join('\n\n'),
    buttons: said.flatMap(({ buttons }) => buttons).map(({ key, label }) => ({ key, label })),
  };
}
