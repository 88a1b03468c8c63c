import { createInterface } from 'node:readline';
import { handle } from '../../chat/conversation/conversation.ts';
import { FRESH_MEMORY } from '../../chat/conversation/memory.ts';
import { makeSay } from '../../chat/replies/say.ts';
import { loadLocales } from '../locales.ts';
import { OperatorError } from '../operator-error.ts';
import { makeAnswerLine } from './answer-line.ts';
import { readOptions, type AskOptions } from './options.ts';

/** What `ask` is started with. */
export interface AskParts {
  readonly args: readonly string[];
  readonly input: NodeJS.ReadableStream;
  readonly output: NodeJS.WritableStream;
  /** Shows whoever runs it a sentence. */
  readonly tell: (sentence: string) => void;
  /** The time in milliseconds since 1970. */
  readonly now: () => number;
}

/** Exit status for options that there are not. */
const WRONG_OPTIONS = 2;

/** Answers one message, or every line of the input in its order. Gives back the exit status. */
export async function runAsk({ args, input, output, tell, now }: AskParts): Promise<number> {
  let options: AskOptions;
  try {
    options = readOptions(args);
  } catch (error) {
    if (!(error instanceof OperatorError)) throw error;
    tell(error.message);
    return WRONG_OPTIONS;
  }
  for (const name of options.notServedYet) tell(`${name} is not served yet; it changes nothing.`);
  const { settings, text } = options;
  const say = makeSay(loadLocales());
  const { language } = settings;
  if (!options.jsonl) {
    if (text.trim() === '') return 0;
    const content = { kind: 'text', text } as const;
    const who = { cellar: 'ask', chat: 'ask', person: 'someone' };
    const { replies } = handle({ ...who, id: '1', at: now(), language, content }, FRESH_MEMORY, settings);
    output.write(`${replies.map((reply) => say(reply).text).join('\n\n')}\n`);
    return 0;
  }
  const answerLine = makeAnswerLine({
    handle: (message, memory) => handle(message, memory, settings),
    say,
    language,
    now,
  });
  for await (const line of createInterface({ input, crlfDelay: Infinity })) {
    if (line.trim() === '') continue;
    if (!output.write(`${JSON.stringify(answerLine(line))}\n`))
      await new Promise((resolve) => output.once('drain', resolve));
  }
  return 0;
}
