import type { LoggedEntry } from '../../../src/core/cellar/entry.ts';
import type { Known, Vessel, Voided } from '../../../src/core/cellar/vessel.ts';
import type { Bot } from './bot.ts';
import type { Model } from './model.ts';
import { openOrders, standings, strikes, type Fact, type Noted } from './rules.ts';

/** How the program names what the rules call otherwise. */
const EVENTS = { stage: 'told', told: 'told' } as const;

/** What the program has that the rules do not, and the other way round; empty where both agree. */
export async function differences(model: Model, bot: Bot): Promise<string[]> {
  const [log, vessels, people] = await bot.look(async (view) => [
    await view.entries({}),
    await view.vessels(),
    await view.people(),
  ]);
  const names = new Map(people.map(({ number, name }) => [number, name ?? '']));
  const entries = log.toSorted((a, b) => a.entry - b.entry).map((one) => toldEntry(one, names));
  return [
    ...differing(
      'entry',
      model.log.map((one) => expectedEntry(one, model)),
      entries,
    ),
    ...differing('vessel', expectedVessels(model), vessels.map(toldVessel)),
    ...bot.faults.map((fault) => `fault: ${fault instanceof Error ? fault.stack : String(fault)}`),
  ];
}

function differing(what: string, expected: readonly string[], actual: readonly string[]): string[] {
  const wanted = new Set(expected);
  const there = new Set(actual);
  return [
    ...expected.filter((one) => !there.has(one)).map((one) => `${what} by the rules: ${one}`),
    ...actual.filter((one) => !wanted.has(one)).map((one) => `${what} in the store: ${one}`),
    ...(actual.length === there.size ? [] : [`${what} twice`]),
  ];
}

const clock = (at: number): string => new Date(at).toISOString().slice(5, 19);

function expectedEntry(one: Noted, { log }: Model): string {
  const to = 'to' in one ? `→${one.to}` : '';
  const figures = [
    'mass_g' in one ? `${one.mass_g} g` : '',
    'ph' in one && one.ph !== undefined ? `pH ${one.ph}` : '',
    'free_mg_L' in one && one.free_mg_L !== undefined ? `free ${one.free_mg_L}` : '',
    'volume_L' in one && one.volume_L !== undefined ? `${one.volume_L} L` : '',
    'stage' in one ? (one.stage === 'over' ? 'over' : JSON.stringify(one.stage)) : '',
    'order' in one && one.order !== undefined ? `of order ${one.order}` : '',
    'corrects' in one ? `corrects ${one.corrects}` : '',
  ];
  const kind = one.is === 'stage' ? EVENTS.stage : one.is === 'blended' ? 'moved' : one.is;
  return told(one.entry, kind, `${one.vessel}${to}`, figures, one, strikes(log).get(one.entry));
}

function toldEntry(one: LoggedEntry, names: ReadonlyMap<number, string>): string {
  const held: Readonly<Record<string, unknown>> = { ...one };
  const event = one.kind === 'vessel' ? (one.event === 'blended' ? 'moved' : one.event) : one.kind;
  const to = one.kind === 'vessel' && one.to !== undefined ? `→${one.to}` : '';
  const { mass_g, ph, free_mg_L, stage, order, corrects } = held;
  const volume_L = one.kind === 'reading' || one.kind === 'vessel' ? one.volume_L : undefined;
  const figures = [
    mass_g === undefined ? '' : `${Number(mass_g)} g`,
    ph === undefined ? '' : `pH ${Number(ph)}`,
    free_mg_L === undefined ? '' : `free ${Number(free_mg_L)}`,
    volume_L === undefined ? '' : `${volume_L} L`,
    stage === undefined ? '' : stage === 'finished' ? 'over' : JSON.stringify(stage),
    order === undefined ? '' : `of order ${Number(order)}`,
    corrects === undefined ? '' : `corrects ${Number(corrects)}`,
  ];
  const noting = { ...one, by: names.get(one.by) ?? '' };
  return told(one.entry, event, `${one.vessels.join('+')}${to}`, figures, noting, one.struck?.entry);
}

function told(
  entry: number,
  kind: string,
  vessel: string,
  figures: readonly string[],
  { at, noted_at, by }: { readonly at: number; readonly noted_at: number; readonly by: string },
  struck: number | undefined,
): string {
  const said = figures.filter((one) => one !== '').join(', ');
  const mark = struck === undefined ? '' : ` struck by ${struck}`;
  return `${entry} ${kind} ${vessel} ${said} @ ${clock(at)} noted ${clock(noted_at)} by ${by}${mark}`;
}

function expectedVessels({ log }: Model): string[] {
  const known = standings(log);
  // A vessel of which there is nothing but an order is one all the same.
  return [...known].map(([name, one]) =>
    vesselText(name, {
      empty: one.isEmpty,
      ph: factText(one.ph),
      volume: factText(one.volume_L),
      unlanded: one.unlanded,
      orders: openOrders(log, name),
    }),
  );
}

function toldVessel(vessel: Vessel): string {
  const { ph, volume_L, voided, unlanded, orders, empty } = vessel;
  return vesselText(vessel.vessel, {
    empty: empty !== undefined,
    ph: factText(factOf(ph, voided.ph)),
    volume: factText(factOf(volume_L, voided.volume_L)),
    unlanded,
    orders: orders.map(({ entry }) => entry),
  });
}

const factOf = (known: Known<number> | undefined, voided: Voided | undefined): Fact =>
  known?.value ?? (voided === undefined ? undefined : 'void');

const factText = (fact: Fact): string => (typeof fact === 'number' ? fact.toFixed(3) : (fact ?? 'unknown'));

function vesselText(
  name: string,
  known: {
    readonly empty: boolean;
    readonly ph: string;
    readonly volume: string;
    readonly unlanded: readonly number[];
    readonly orders: readonly number[];
  },
): string {
  const { empty, ph, volume, unlanded, orders } = known;
  const list = (numbers: readonly number[]): string => numbers.toSorted((a, b) => a - b).join(' ');
  return `${name}${empty ? ' empty' : ''} pH ${ph}, volume ${volume}, unlanded [${list(unlanded)}], orders [${list(orders)}]`;
}
