import type { Errand, IncomingMessage, Who } from '../../chat/conversation/ports.ts';
import type { Language } from '../../chat/reader/understood.ts';
import type { Said, Say } from '../../chat/replies/say.ts';
import type { Audit } from '../audit-workings.ts';
import type { Serve } from '../serve-message.ts';
import { newNonce } from '../cellars/new-nonce.ts';
import { batchLines } from './batch-lines.ts';

/** Everything that a chat on a keyboard needs, handed in. */
export interface TerminalOptions {
  readonly serve: Serve;
  readonly say: Say;
  readonly input: NodeJS.ReadableStream;
  readonly output: NodeJS.WritableStream;
  /** The time in milliseconds since 1970. */
  readonly now: () => number;
  readonly language: Language;
  /** The name of whoever sits there. */
  readonly name?: string;
  /** Does what has to do with files, after the answer; gives what to say. */
  readonly runErrand?: (errand: Errand, message: IncomingMessage) => Promise<readonly Said[]>;
  /** Checks the workings, after their answers. */
  readonly audit?: Audit;
  /** Whether a person sits there: then there is a greeting and a prompt. */
  readonly interactive: boolean;
  /** The greeting, in the keys of its sentences; the usual one where it is absent. */
  readonly welcome?: readonly string[];
  /** Ends the chat. */
  readonly signal?: AbortSignal;
}

/** The chat on a keyboard: one person in one cellar. */
export const AT_TERMINAL: Who = { cellar: 'cellar', chat: 'terminal', person: 'terminal' };

const PROMPT = '> ';

/** A paste comes at once; a program that writes into a pipe may pause between its lines. */
const QUIET_ms = { keyboard: 40, pipe: 250 } as const;

const WELCOME = ['terminal-start', 'terminal-start-example', 'terminal-start-more'] as const;

/** The same chat as everywhere, on a keyboard or through a pipe, until the input ends. */
export async function runTerminal(options: TerminalOptions): Promise<void> {
  const { input, output, interactive, language, say, welcome = WELCOME } = options;
  const show = (text: string): void => void output.write(`${text}\n`);
  const prompt = (): void => void (interactive && output.write(PROMPT));
  if (interactive) {
    const lines = welcome.map((key) => ({ room: 'first' as const, key, values: {} }));
    show(say({ language, lines, buttons: [] }).text);
  }
  prompt();
  const quiet_ms = interactive ? QUIET_ms.keyboard : QUIET_ms.pipe;
  const begun = options.now();
  let count = 0;
  for await (const text of batchLines(input, {
    quiet_ms,
    ...(options.signal && { signal: options.signal }),
  })) {
    count += 1;
    // No message of any earlier run has the same: what a message notes is noted once under its id.
    for (const said of await answer(text, `${begun} ${count}`, options)) show(asShown(said));
    show('');
    prompt();
  }
  if (interactive) show('');
}

async function answer(text: string, id: string, options: TerminalOptions): Promise<readonly Said[]> {
  const { serve, now, language, name, audit, runErrand } = options;
  const content = { kind: 'text', text } as const;
  const who = { ...AT_TERMINAL, ...(name !== undefined && { name }) };
  const message: IncomingMessage = {
    ...who,
    id,
    at: now(),
    language,
    content,
    trusted: true,
    nonce: newNonce(),
  };
  const { said, answers, errand } = await serve(message);
  audit?.(answers);
  if (errand === undefined || runErrand === undefined) return said;
  return [...said, ...(await runErrand(errand, message))];
}

/** What is said unasked stands on lines of its own. */
export function showUnasked(
  said: readonly Said[],
  output: NodeJS.WritableStream,
  interactive: boolean,
): void {
  for (const one of said) output.write(`${interactive ? '\n' : ''}${asShown(one)}\n\n`);
  if (interactive && said.length > 0) output.write(PROMPT);
}

/** The text, and under it the buttons that a number presses; choices with letters stand in the text already. */
function asShown({ text, buttons }: Said): string {
  const numbered = buttons.filter(({ mark }) => /^\d+$/.test(mark));
  if (numbered.length === 0) return text;
  return `${text}\n[${numbered.map(({ mark, label }) => `${mark} ${label}`).join('  ')}]`;
}
