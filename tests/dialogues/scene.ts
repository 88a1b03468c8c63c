import type { CellarStore } from '../../src/core/cellar/cellar-store.ts';
import { handle } from '../../src/chat/conversation/conversation.ts';
import type { Content, IncomingMessage } from '../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS, type Settings } from '../../src/chat/conversation/settings.ts';
import type { Reply } from '../../src/chat/replies/reply.ts';
import { makeSay, type Said, type Say } from '../../src/chat/replies/say.ts';
import { loadLocales } from '../../src/edge/locales.ts';
import { isLanguage } from '../../src/edge/is-language.ts';
import type { AllowRule } from '../../src/edge/cellars/allow-rule.ts';
import { makeDoor, type Door } from '../../src/edge/cellars/door.ts';
import { createRateLimit } from '../../src/edge/cellars/rate-limit.ts';
import { createRegistry } from '../../src/edge/cellars/registry.ts';
import { makeServeDue } from '../../src/edge/serve-due.ts';
import { makeServe, type Serve } from '../../src/edge/serve-message.ts';
import { createMemoryCellars } from '../../src/edge/store/memory-cellars.ts';
import { CODE, linesOf, unaskedLines, type SaidUnasked } from './shown-lines.ts';

const MOVES = [
  'them',
  'press',
  'overhears',
  'edits',
  'sends',
  'later',
  'language',
  'person',
  'name',
  'chat',
  'cellar',
  'alone',
  'group',
  'moves',
  'allows',
  'tick',
  'restart',
] as const;

/** One step of a scene: what somebody does, and the lines that come back. */
export interface Move {
  readonly does: (typeof MOVES)[number];
  readonly what: string;
  readonly us: readonly string[];
}

/** A scene: its title and its moves. */
export interface Scene {
  readonly title: string;
  readonly moves: readonly Move[];
}

const LINE = new RegExp(`^(${MOVES.join('|')}|us):(?: (.*))?$`);

/**
 * Reads a scene. `them:` is what a person writes (lines that follow each other are one message), `us:` what we answer,
 * `press:` a button by its label, `sends:` what cannot be read. `later:` lets minutes pass (`3 h` hours, `2 d` days),
 * `person:` or `name:` and `language:` say who is there from now on, `chat:` in which chat, and `cellar:` in which cellar, where
 * nothing is known yet. From `alone:` or `group:` on, which name a chat, the bot finds its cellar by itself; in a group it is
 * called, and in `overhears:` it is not. `{code}` in what a person writes is the last code of an invitation that was shown.
 * `moves:` gives the group another name, `allows:` says who may use the bot (`open`, or people). `edits:` changes the text
 * of the person's last message. `tick:` is the moment at which what is due is said, `restart:` begins the program anew
 * with the same store. In an answer `…` stands for any lines, `(code)` for the code of an invitation, `(in place)` for an
 * answer that takes the place of an earlier one, and a line in square brackets for the buttons; a line in round brackets
 * else names another chat than the present one, in which what follows is said.
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

const inWords = makeSay(loadLocales());

const MINUTES_A = { '': 1, min: 1, h: 60, d: 24 * 60 } as const;

/** Milliseconds of a time as a scene has it: `20` and `20 min` are minutes, `3 h` hours, `2 d` days. */
function readTime(text: string): number {
  const match = /^(\d+) ?(|min|h|d)$/.exec(text.trim());
  if (!match) throw new SyntaxError(`Cannot read the time of a scene "${text}"`);
  return Number(match[1]) * MINUTES_A[match[2] as keyof typeof MINUTES_A] * 60_000;
}

/** What a scene can be played with. */
export interface Playing {
  readonly settings?: Settings;
  /** Says what is due at a moment, for the `tick:` of a scene. */
  readonly tick?: (store: CellarStore, now: number) => Promise<readonly SaidUnasked[]>;
  /** Is told every reply as data. */
  readonly hears?: (reply: Reply) => void;
}

/** Says all that is due, as the program does in the background. */
function makeTick(settings: Settings, say: Say): NonNullable<Playing['tick']> {
  return async (store, now) => {
    const serveDue = makeServeDue({ say, store, settings });
    const sent: SaidUnasked[] = [];
    for (;;) {
      const taken = await store.takeDue(now, { lease_ms: 60_000, most: 50 });
      if (taken.length === 0) return sent;
      for (const due of taken) {
        const { chat, said } = await serveDue(due, now);
        sent.push(...said.map((one) => ({ chat, said: one })));
      }
    }
  };
}

/** Plays a scene with a store in memory; gives what we answered to each move. */
export async function play(
  { moves }: Scene,
  { settings = DEFAULT_SETTINGS, tick, hears }: Playing = {},
): Promise<string[][]> {
  const say: Say = (reply) => {
    hears?.(reply);
    return inWords(reply);
  };
  const sayDue = tick ?? makeTick(settings, say);
  let at = START;
  const store = createMemoryCellars({ now: () => at });
  const registry = createRegistry(store);
  const paceOf = createRateLimit();
  let rule: AllowRule = { is: 'open' };
  let door: Door | undefined;
  let serve = serving(store, { settings, say });
  let language: IncomingMessage['language'] = 'en';
  let person = 'Ana';
  let chat = 'one';
  let cellar = 'harbour cellar';
  let addressed: 'direct' | 'called' = 'direct';
  let code = '';
  /** What each person wrote last in a chat. */
  const written = new Map<string, { readonly original: string; readonly original_at: number }>();
  /** What stands on the screen of each chat. */
  const shown = new Map<string, readonly Said[]>();
  const show = (where: string, said: readonly Said[]): void => {
    // The newest first: a button of an older reply is still there to be pressed.
    shown.set(where, [...said, ...(shown.get(where) ?? [])]);
  };
  const answers: string[][] = [];
  for (const [count, { does, what }] of moves.entries()) {
    if (does === 'later') at += readTime(what);
    if (does === 'language' && isLanguage(what)) language = what;
    if (does === 'person' || does === 'name') person = what;
    if (does === 'chat') chat = what;
    if (does === 'cellar') cellar = what;
    if (does === 'alone' || does === 'group') {
      chat = what;
      cellar = what;
      addressed = does === 'group' ? 'called' : 'direct';
    }
    if (does === 'moves') {
      await registry.migrateChat(chat, what);
      chat = what;
    }
    if (does === 'allows') rule = what === 'open' ? { is: 'open' } : { is: 'invited', ids: what.split(', ') };
    if (['alone', 'group', 'allows'].includes(does))
      door = makeDoor({ store, registry, rule, paceOf, handle });
    serve = serving(store, { settings, say, ...(door && { door }) });
    if (does === 'tick') {
      const sent = await sayDue(store, at);
      for (const one of sent) show(one.chat, [one.said]);
      answers.push(unaskedLines(sent, chat));
      continue;
    }
    const mine = JSON.stringify([chat, person]);
    const content = contentOf(does, what.replace('{code}', code), {
      shown: shown.get(chat) ?? [],
      ...written.get(mine),
    });
    if (content === undefined) {
      answers.push([]);
      continue;
    }
    const who = { cellar, chat, person, name: person };
    const { said } = await serve({
      ...who,
      id: String(count),
      at,
      language,
      content,
      addressed: does === 'overhears' ? 'overheard' : addressed,
      nonce: String(count).padStart(24, '0'),
    });
    if (content.kind === 'text') written.set(mine, { original: String(count), original_at: at });
    code = said.flatMap(({ text }) => CODE.exec(text)?.[0] ?? []).at(-1) ?? code;
    show(chat, said);
    answers.push(said.flatMap(linesOf));
  }
  return answers;
}

/** What the program begins with. */
interface Beginning {
  readonly settings: Settings;
  readonly say: Say;
  readonly door?: Door;
}

/** Begins the program: nothing but the store is left from before. A fault of ours ends the scene. */
function serving(store: CellarStore, { settings, say, door }: Beginning): Serve {
  const report = (fault: unknown): never => {
    throw fault;
  };
  return makeServe({ handle, say, store, settings, report, ...(door && { door }) });
}

/** What a person sees, and wrote last. */
interface Screen {
  readonly shown: readonly Said[];
  readonly original?: string;
  readonly original_at?: number;
}

function contentOf(
  does: Move['does'],
  what: string,
  { shown, original, original_at = 0 }: Screen,
): Content | undefined {
  if (does === 'edits' && original !== undefined)
    return { kind: 'edited', text: what, original, original_at };
  if (does === 'them' || does === 'overhears') return { kind: 'text', text: what };
  if (does === 'sends') return { kind: 'unreadable', what: what as 'photo' };
  if (does !== 'press') return undefined;
  const button = shown
    .flatMap(({ buttons }) => buttons)
    .find(({ label, key }) => label === what || key === what);
  return { kind: 'press', key: button?.key ?? what };
}
