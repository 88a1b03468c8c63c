import type { CellarView, Person } from '../../core/cellar/cellar-store.ts';
import type { Shelf } from '../../core/cellar/shelf.ts';
import type { Vessel } from '../../core/cellar/vessel.ts';
import type { Language } from '../reader/understood.ts';
import { usualDecimalMark } from '../reader/usual-decimal-mark.ts';
import {
  chatLanguageKey,
  claimKey,
  dailyKey,
  languageKey,
  memoryKey,
  notedKey,
  planKey,
  ROSTER_KEY,
  SETTINGS_KEY,
  ZONE_ASKED_KEY,
} from './keys.ts';
import { roleOf } from './cellar/role-of.ts';
import { readRoster, type Role, type Roster } from './cellar/roster.ts';
import { FRESH_MEMORY, type Memory } from './memory.ts';
import type { Claim, Plan } from './plan.ts';
import type { IncomingMessage } from './ports.ts';
import { languagesOf } from './languages-of.ts';
import { mergeSettings, type Settings } from './settings.ts';

/** What is known of the vessels that a message is about. */
export interface CellarFacts {
  readonly vessels: ReadonlyMap<string, Vessel>;
  /** Who is about to dose which vessel. */
  readonly claims: ReadonlyMap<string, Claim>;
  /** The dose that was last reckoned for a vessel. */
  readonly plans: ReadonlyMap<string, Plan>;
  readonly people: ReadonlyMap<number, Person>;
  /** The shelves of the chemical store, where they were read. */
  readonly shelves: readonly Shelf[];
}

/** Nothing is known yet. */
export const NO_FACTS: CellarFacts = {
  vessels: new Map(),
  claims: new Map(),
  plans: new Map(),
  people: new Map(),
  shelves: [],
};

/** Where and when a message came in, and all that is known there. */
export interface Here extends CellarFacts {
  readonly message: IncomingMessage;
  readonly memory: Memory;
  readonly settings: Settings;
  /** What the chat is told in; the person is answered in the language of the settings. */
  readonly chatLanguage: Language;
  /** The language before, where this message is the first that is clearly in another one. */
  readonly changedFrom?: Language;
  /** The number of the person who writes, and whether they are new in this cellar. */
  readonly me: number;
  readonly isNewPerson: boolean;
  readonly roster: Roster;
  /** What the person may do here; undefined where they may do nothing. */
  readonly role: Role | undefined;
  /** The number that the next entry of the log gets. */
  readonly nextEntry: number;
  /** Whether the time zone was asked for before. */
  readonly isZoneAsked: boolean;
  /** The id of the next daily list of this chat, once it is set. */
  readonly daily?: string;
  /** The number of the entry that the same event has noted before under another key than its own, as it is kept. */
  readonly noted?: string;
  /** Whether it was told of the vessel before that acidified methods read high in reds. */
  readonly isRedTold?: boolean;
  /** The keys of what the same event has noted before: it is delivered again. */
  readonly done: ReadonlySet<string>;
  /** What the event's entries are named by, where that is not the event itself. */
  readonly event?: string;
}

/** What is known of the person and the cellar before the message is read. */
export async function arrive(message: IncomingMessage, view: CellarView, defaults: Settings): Promise<Here> {
  const known = await view.person(message.person);
  // In one look: every message asks for these.
  const all = await view.keptOf([
    memoryKey(message),
    SETTINGS_KEY,
    ROSTER_KEY,
    ZONE_ASKED_KEY,
    dailyKey(message.chat),
    notedKey(message),
    languageKey(message),
    chatLanguageKey(message.chat),
  ]);
  const { language, ...languages } = languagesOf(message, all);
  const kept = all.get(memoryKey(message));
  const memory = kept === undefined ? FRESH_MEMORY : (JSON.parse(kept) as Memory);
  // Who begins in another language writes its decimals as they are written there.
  const shown = languages.changedFrom === undefined ? memory.decimalMark : undefined;
  const decimalMark = shown ?? usualDecimalMark(language);
  const daily = all.get(dailyKey(message.chat));
  const noted = all.get(notedKey(message));
  const set = all.get(SETTINGS_KEY);
  const people = known === undefined ? await view.people() : [];
  const me = known?.number ?? Math.max(0, ...people.map(({ number }) => number)) + 1;
  const roster = readRoster(all.get(ROSTER_KEY));
  return {
    ...NO_FACTS,
    message,
    memory: { ...memory, decimalMark },
    settings: {
      ...mergeSettings(defaults, set),
      language,
      ...(languages.changedFrom !== undefined && { languageBefore: languages.changedFrom }),
    },
    ...languages,
    me,
    roster,
    role: roleOf(roster, me, message),
    isNewPerson: known === undefined || (message.name !== undefined && known.name !== message.name),
    nextEntry: await view.nextEntry(),
    isZoneAsked: all.has(ZONE_ASKED_KEY),
    ...(daily !== undefined && { daily }),
    ...(noted !== undefined && { noted }),
    done: new Set(),
  };
}

/** The same with what is known of some vessels. */
export async function withVessels(here: Here, view: CellarView, names: readonly string[]): Promise<Here> {
  const vessels = new Map<string, Vessel>();
  const claims = new Map<string, Claim>();
  const plans = new Map<string, Plan>();
  const each = [...new Set(names)];
  const kept = each.length === 0 ? new Map<string, string>() : await view.keptOf(each.flatMap(keysOf));
  for (const name of each) {
    const vessel = await view.vessel(name);
    if (vessel) vessels.set(name, vessel);
    const claim = kept.get(claimKey(name));
    if (claim !== undefined) claims.set(name, JSON.parse(claim) as Claim);
    const plan = kept.get(planKey(name));
    if (plan !== undefined) plans.set(name, JSON.parse(plan) as Plan);
  }
  if (vessels.size + claims.size === 0) return { ...here, vessels, claims, plans };
  const { me, message } = here;
  const by = [
    ...claims.values(),
    ...[...vessels.values()].flatMap((one) => [...one.additions, ...one.orders]),
  ];
  // Where nobody else had a hand in it, nobody else is looked up.
  const isMine = message.name !== undefined && by.every((one) => one.by === me);
  const all = isMine ? [{ number: me, name: message.name }] : await view.people();
  const people = new Map(all.map((person) => [person.number, person]));
  return { ...here, vessels, claims, plans, people };
}

function keysOf(vessel: string): string[] {
  return [claimKey(vessel), planKey(vessel)];
}
