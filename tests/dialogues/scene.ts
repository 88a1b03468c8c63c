import { handle } from '../../src/chat/conversation/conversation.ts';
import type { Content, IncomingMessage } from '../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../src/chat/conversation/settings.ts';
import { makeSay, type Said } from '../../src/chat/replies/say.ts';
import { loadLocales } from '../../src/edge/locales.ts';
import { isLanguage } from '../../src/edge/languages.ts';
import { createMemoryStore } from '../../src/edge/store/memory.ts';

/** One step of a scene: what somebody does, and the lines that come back. */
export interface Move {
  readonly does: 'them' | 'press' | 'sends' | 'later' | 'language' | 'person';
  readonly what: string;
  readonly us: readonly string[];
}

/** A scene: its title and its moves. */
export interface Scene {
  readonly title: string;
  readonly moves: readonly Move[];
}

const LINE = /^(them|press|sends|later|language|person|us): ?(.*)$/;

/**
 * Reads a scene. `them:` is what a person writes (lines that follow each other are one message), `us:` what we answer,
 * `press:` a button by its label, `sends:` what cannot be read, `later:` minutes that pass, `language:` and `person:`
 * who is there from now on. In an answer `…` stands for any lines, and a line in square brackets for the buttons.
 */
export function readScene(text: string): Scene {
  const [first = '', ...rest] = text.split('\n');
  const moves: { does: Move['does']; what: string; us: string[] }[] = [];
  let open = false;
  for (const line of rest) {
    const match = LINE.exec(line);
    if (line.trim() === '') open = false;
    if (!match) {
      if (line.trim() !== '') throw new SyntaxError(`Cannot read the line of a scene "${line}"`);
      continue;
    }
    const [, who, what = ''] = match;
    const last = moves.at(-1);
    if (who === 'us') last?.us.push(what);
    else if (who === 'them' && open && last?.does === 'them' && last.us.length === 0)
      last.what += `\n${what}`;
    else moves.push({ does: who as Move['does'], what, us: [] });
    open = true;
  }
  return { title: first.replace(/^# /, ''), moves };
}

/** The clock of a scene starts in the morning of a day in harvest. */
const START = Date.parse('2026-10-05T08:00:00Z');

const say = makeSay(loadLocales());

/** Plays a scene with a store in memory; gives what we answered to each move. */
export async function play({ moves }: Scene): Promise<string[][]> {
  const state = createMemoryStore();
  let at = START;
  let language: IncomingMessage['language'] = 'en';
  let person = 'Ana';
  let shown: Said[] = [];
  const answers: string[][] = [];
  for (const [count, { does, what }] of moves.entries()) {
    if (does === 'later') at += Number.parseInt(what) * 60_000;
    if (does === 'language' && isLanguage(what)) language = what;
    if (does === 'person') person = what;
    const content = contentOf(does, what, shown);
    if (content === undefined) {
      answers.push([]);
      continue;
    }
    const who = { cellar: 'harbour cellar', chat: 'one', person };
    const message: IncomingMessage = { ...who, id: String(count), at, language, content };
    const { writes, replies } = handle(message, await state.load(message), DEFAULT_SETTINGS);
    await state.commit(writes);
    const said = replies.map(say);
    if (said.some(({ buttons }) => buttons.length > 0)) shown = said;
    answers.push(said.flatMap(linesOf));
  }
  return answers;
}

function contentOf(does: Move['does'], what: string, shown: readonly Said[]): Content | undefined {
  if (does === 'them') return { kind: 'text', text: what };
  if (does === 'sends') return { kind: 'unreadable', what: what as 'photo' };
  if (does !== 'press') return undefined;
  const button = shown
    .flatMap(({ buttons }) => buttons)
    .find(({ label, key }) => label === what || key === what);
  return { kind: 'press', key: button?.key ?? what };
}

function linesOf({ text, buttons }: Said): string[] {
  const row = buttons.map(({ mark, label }) => `${mark} ${label}`).join(' | ');
  // Thin spaces cannot be told from others in a scene's file.
  return [...text.replaceAll('\u202f', ' ').split('\n'), ...(row === '' ? [] : [`[${row}]`])];
}

/** Whether an answer is as the scene has it, `…` standing for any lines. */
export function fits(expected: readonly string[], actual: readonly string[]): boolean {
  const [first, ...rest] = expected;
  if (first === undefined) return actual.length === 0;
  if (first !== '…') return actual[0] === first && fits(rest, actual.slice(1));
  return actual.some((_, skipped) => fits(rest, actual.slice(skipped))) || fits(rest, []);
}
