import type { Handled, IncomingMessage } from '../../chat/conversation/ports.ts';
import { FRESH_MEMORY, type Memory } from '../../chat/conversation/memory.ts';
import type { Language } from '../../chat/reader/understood.ts';
import type { Reply } from '../../chat/replies/reply.ts';
import type { Said } from '../../chat/replies/say.ts';
import { readInputLine, type InputLine } from './input-line.ts';
import { toOutputLine } from './output-line.ts';

/** What answering a line needs. */
export interface LineOptions {
  readonly handle: (message: IncomingMessage, memory: Memory) => Handled;
  readonly say: (reply: Reply) => Said;
  readonly language: Language;
  /** The time in milliseconds since 1970, for lines that tell none. */
  readonly now: () => number;
}

/**
 * Makes the answering of `--jsonl` lines: each is a chat of its own, unless `chat` joins several. Nothing is kept
 * beyond the run.
 */
export function makeAnswerLine({ handle, say, language, now }: LineOptions): (line: string) => object {
  const kept = new Map<string, Memory>();
  let count = 0;
  const answer = (input: InputLine): object => {
    count += 1;
    const id = input.id ?? null;
    if (input.tick) return { id, sends: [] };
    const chat = input.chat === undefined ? `line ${count}` : `chat ${input.chat}`;
    const key = JSON.stringify([chat, input.person ?? null]);
    const message: IncomingMessage = {
      cellar: 'ask',
      chat,
      person: String(input.person ?? 'someone'),
      id: String(id ?? count),
      at: input.at === undefined ? now() : Date.parse(input.at),
      language: input.language ?? language,
      content:
        input.press === undefined
          ? { kind: 'text', text: input.text ?? '' }
          : { kind: 'press', key: input.press },
    };
    const handled = handle(message, kept.get(key) ?? FRESH_MEMORY);
    const last = handled.writes.at(-1);
    if (last && input.chat !== undefined) kept.set(key, last.memory);
    return toOutputLine(id, handled, say);
  };
  return (line) => {
    const input = readInputLine(line);
    if ('error' in input) return { id: null, error: input.error };
    try {
      return answer(input);
    } catch (error) {
      // A fault of ours in one line must not cost the others their answers.
      return { id: input.id ?? null, error: error instanceof Error ? error.message : String(error) };
    }
  };
}
