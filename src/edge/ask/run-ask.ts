import { existsSync } from 'node:fs';
import { createInterface } from 'node:readline';
import type { CellarStore } from '../../core/cellar/cellar-store.ts';
import { handle } from '../../chat/conversation/conversation.ts';
import { makeSay } from '../../chat/replies/say.ts';
import { loadLocales } from '../locales.ts';
import { faultText } from '../fault-text.ts';
import { EXIT, OperatorError } from '../operator-error.ts';
import { makeServe } from '../serve-message.ts';
import { createMemoryCellars } from '../store/memory-cellars.ts';
import { makeAnswerLine } from './answer-line.ts';
import { keptLines, type KeptPart } from './kept-lines.ts';
import { readOptions, type AskOptions } from './options.ts';
import { placeInFile } from './place-in-file.ts';
import { placeInMemory } from './place-in-memory.ts';
import type { PlaceOf } from './place.ts';
import { sayDue } from './say-due.ts';

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

/** Answers one message, or every line of the input in its order, or prints what is kept. Gives back the exit status. */
export async function runAsk(parts: AskParts): Promise<number> {
  const { args, tell } = parts;
  let options: AskOptions;
  try {
    options = readOptions(args);
  } catch (error) {
    if (!(error instanceof OperatorError)) throw error;
    tell(error.message);
    return WRONG_OPTIONS;
  }
  try {
    const { print, data } = options;
    if (print === undefined || data === undefined) return await answer(options, parts);
    await printKept(data, print, parts);
    return EXIT.fine;
  } catch (error) {
    if (!(error instanceof OperatorError)) throw error;
    tell(error.message);
    return error.exitStatus;
  }
}

/** Beside a program that writes to the file, too. */
async function printKept(path: string, part: KeptPart, { now, output }: AskParts): Promise<void> {
  if (!existsSync(path)) throw new OperatorError(`There is no cellar file ${path}: check --data.`);
  const { openSqliteReader } = await import('../store/sqlite/open-sqlite-reader.ts');
  const reader = await openSqliteReader(path, { now });
  try {
    for await (const line of keptLines(reader, part)) await writeLine(line, output);
  } finally {
    await reader.close();
  }
}

async function answer(options: AskOptions, parts: AskParts): Promise<number> {
  const { now, tell } = parts;
  // The moment of the line that is being answered.
  const clock = { at: now() };
  const run = `ask ${clock.at}`;
  const held = { now: () => clock.at };
  if (options.data === undefined) {
    const store = createMemoryCellars(held);
    return answerIn({ store, placeOf: placeInMemory(store, held), run, clock }, options, parts);
  }
  const { openSqliteStore } = await import('../store/sqlite/open-sqlite-store.ts');
  const report = (damage: OperatorError): void => tell(damage.message);
  const store = await openSqliteStore(options.data, { ...held, report });
  try {
    return await answerIn({ store, placeOf: placeInFile(store, run), run, clock }, options, parts);
  } finally {
    await store.close();
  }
}

/** Where a run keeps what is said in it, and its clock. */
interface Ground {
  readonly store: CellarStore;
  readonly placeOf: PlaceOf;
  readonly run: string;
  readonly clock: { at: number };
}

async function answerIn(
  { store, placeOf, run, clock }: Ground,
  { jsonl, text, settings }: AskOptions,
  { input, output, now, tell }: AskParts,
): Promise<number> {
  const say = makeSay(loadLocales());
  const { language } = settings;
  if (!jsonl) {
    const content = { kind: 'text', text } as const;
    const { store: kept, ...place } = placeOf(undefined);
    const faults: unknown[] = [];
    const serve = makeServe({ handle, say, store: kept, settings, report: (fault) => faults.push(fault) });
    const message = {
      ...place,
      person: 'someone',
      id: run,
      at: clock.at,
      language,
      content,
      trusted: true,
    } as const;
    const { said } = await serve(message);
    output.write(`${said.map((one) => one.text).join('\n\n')}\n`);
    for (const fault of faults) tell(faultText(fault));
    return faults.length === 0 ? EXIT.fine : EXIT.software;
  }
  const answerLine = makeAnswerLine({
    handle,
    say,
    settings,
    placeOf,
    sayDue: (at) => sayDue(at, { store, say, settings }),
    language,
    run,
    now,
    setClock: (at) => (clock.at = at),
  });
  for await (const line of createInterface({ input, crlfDelay: Infinity }))
    if (line.trim() !== '') await writeLine(await answerLine(line), output);
  return EXIT.fine;
}

/** Writes a line, and waits where whoever reads is slower. */
async function writeLine(line: object, output: NodeJS.WritableStream): Promise<void> {
  if (!output.write(`${JSON.stringify(line)}\n`))
    await new Promise((resolve) => output.once('drain', resolve));
}
