import type { Bot } from './bot.ts';
import type { Model } from './model.ts';
import { openOrders } from './rules.ts';
import { must } from './saying.ts';

/** Something that a person does, as the rules have it and as the program has it. */
export interface Move {
  /** How it reads when a run is told. */
  readonly name: string;
  /** Whether it can be done now; absent where it always can. */
  readonly can?: (model: Model) => boolean;
  readonly play: (model: Model, bot: Bot) => Promise<void>;
}

/** A minute, a day. */
export const MINUTE_ms = 60_000;
export const DAY_ms = 1440 * MINUTE_ms;

/** How people write the vessels, by the name that the program gives them. */
export const WORDS = { 'tank 1': 'T1', 'tank 2': 'T2', 'tank 3': 'T3' } as const;

/** A vessel by the name that the program gives it. */
export type VesselName = keyof typeof WORDS;
export const VESSELS = Object.keys(WORDS) as VesselName[];

/** A moment some minutes ago as people write it, in a UTC cellar; nothing where it is further back than yesterday. */
export function momentOf(now: number, minutes: number | undefined): { text: string; at: number } | undefined {
  if (minutes === undefined) return undefined;
  const at = Math.floor((now - minutes * MINUTE_ms) / MINUTE_ms) * MINUTE_ms;
  const days = Math.floor(now / DAY_ms) - Math.floor(at / DAY_ms);
  const [, hour, minute] = /T(\d\d):(\d\d)/.exec(new Date(at).toISOString()) ?? [];
  if (days > 1) return undefined;
  return { text: `${days === 1 ? 'yesterday ' : ''}${Number(hour)}:${minute}`, at };
}

/** Checks that a reply says under which number something was noted. */
export function mustBeNoted(reply: string, entry: number): void {
  must(new RegExp(`\\b${entry}\\b`).test(reply), `the reply names no entry ${entry}: ${reply}`);
}

/** The order that an addition carries out: of several the rules do not tell, and the reply decides. */
export function orderOf(vessel: string, at: number, reply: string, { log }: Model): { order?: number } {
  const open = openOrders(log, vessel).filter((order) => (log[order - 1]?.at ?? 0) <= at);
  const told = Number(/Order (\d+) is done/.exec(reply)?.[1] ?? Number.NaN);
  const order = open.length > 1 ? open.find((one) => one === told) : open[0];
  return order === undefined ? {} : { order };
}
