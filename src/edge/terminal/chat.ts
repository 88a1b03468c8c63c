import type { Handled, IncomingMessage, StatePort } from '../../chat/conversation/ports.ts';
import { faultReply } from '../../chat/conversation/fault-reply.ts';
import type { Memory } from '../../chat/conversation/memory.ts';
import type { Language } from '../../chat/reader/understood.ts';
import type { Reply } from '../../chat/replies/reply.ts';
import type { Said } from '../../chat/replies/say.ts';
import type { Audit } from '../audit-workings.ts';
import { batchLines } from './batch-lines.ts';

/** Everything that a chat on a keyboard needs, handed in. */
export interface TerminalOptions {
  readonly handle: (message: IncomingMessage, memory: Memory) => Handled;
  readonly say: (reply: Reply) => Said;
  readonly state: StatePort;
  readonly input: NodeJS.ReadableStream;
  readonly output: NodeJS.WritableStream;
  /** The time in milliseconds since 1970. */
  readonly now: () => number;
  readonly language: Language;
  /** Checks the workings, after their answers. */
  readonly audit?: Audit;
  /** Tells whoever runs the program of a fault of its own. */
  readonly report: (fault: unknown) => void;
  /** Whether a person sits there: then there is a greeting and a prompt. */
  readonly interactive: boolean;
  /** Ends the chat. */
  readonly signal?: AbortSignal;
}

const PROMPT = '> ';

/** A paste comes at once; a program that writes into a pipe may pause between its lines. */
const QUIET_ms = { keyboard: 40, pipe: 250 } as const;

const WELCOME = ['terminal-start', 'terminal-start-example', 'terminal-start-more'] as const;

/** The same chat as everywhere, on a keyboard or through a pipe, until the input ends. */
export async function runTerminal(options: TerminalOptions): Promise<void> {
  const { input, output, interactive, language, say } = options;
  const show = (text: string): void => void output.write(`${text}\n`);
  const prompt = (): void => void (interactive && output.write(PROMPT));
  if (interactive) {
    const lines = WELCOME.map((key) => ({ room: 'first' as const, key, values: {} }));
    show(say({ language, lines, buttons: [] }).text);
  }
  prompt();
  const quiet_ms = interactive ? QUIET_ms.keyboard : QUIET_ms.pipe;
  let count = 0;
  for await (const text of batchLines(input, {
    quiet_ms,
    ...(options.signal && { signal: options.signal }),
  })) {
    count += 1;
    for (const said of await answer(text, count, options)) show(asShown(said));
    show('');
    prompt();
  }
  if (interactive) show('');
}

async function answer(text: string, count: number, options: TerminalOptions): Promise<Said[]> {
  const { handle, state, say, now, language, report, audit } = options;
  const message: IncomingMessage = {
    cellar: 'terminal',
    chat: 'terminal',
    person: 'terminal',
    id: String(count),
    at: now(),
    language,
    content: { kind: 'text', text },
  };
  try {
    const { writes, replies, answers } = handle(message, await state.load(message));
    const said = replies.map(say);
    await state.commit(writes);
    audit?.(answers);
    return said;
  } catch (error) {
    report(error);
    return [say(faultReply(language))];
  }
}

/** The text, and under it the buttons that a number presses; choices with letters stand in the text already. */
function asShown({ text, buttons }: Said): string {
  const numbered = buttons.filter(({ mark }) => /^\d+$/.test(mark));
  if (numbered.length === 0) return text;
  return `${text}\n[${numbered.map(({ mark, label }) => `${mark} ${label}`).join('  ')}]`;
}
