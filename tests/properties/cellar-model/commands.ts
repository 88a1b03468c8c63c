import fc from 'fast-check';
import type { Bot, Place } from './bot.ts';
import * as additions from './additions.ts';
import * as again from './again.ts';
import * as buttons from './buttons.ts';
import * as claims from './claims.ts';
import * as corrections from './corrections.ts';
import { differences } from './differences.ts';
import type { Model } from './model.ts';
import { Differs } from './saying.ts';
import { MINUTE_ms, VESSELS, type Move, type VesselName } from './move.ts';
import * as readings from './readings.ts';
import * as vessels from './vessels.ts';

/** How long nobody says anything, in milliseconds. */
const wait = fc.constantFrom(
  0,
  0,
  1000,
  40_000,
  5 * MINUTE_ms + 7000,
  16 * MINUTE_ms,
  63 * MINUTE_ms,
  241 * MINUTE_ms,
  660 * MINUTE_ms,
  1500 * MINUTE_ms,
);

const vessel = fc.constantFrom<VesselName>(...VESSELS);
const place = fc.constantFrom<Place>(
  { person: 'Ana', chat: 'one' },
  { person: 'Ben', chat: 'one' },
  { person: 'Ana', chat: 'two' },
  { person: 'Cleo', chat: 'two' },
);
const pick = fc.nat(40);
const mass_g = fc.integer({ min: 40, max: 400 });
const ago = fc.option(fc.integer({ min: 1, max: 2000 }), { nil: undefined });
const volume_L = fc.constantFrom(4000, 4100, 6000);
const free_mg_L = fc.integer({ min: 5, max: 21 });
const ph = fc.constantFrom(3.32, 3.38, 3.44);

const told: fc.Arbitrary<vessels.Told> = fc.oneof(
  volume_L.map((litres) => ({ is: 'racked' as const, volume_L: litres })),
  volume_L.map((litres) => ({ is: 'told' as const, volume_L: litres })),
  fc.constantFrom<vessels.Told>(
    { is: 'racked' },
    { is: 'topped' },
    { is: 'acid' },
    { is: 'emptied' },
    { is: 'forgotten' },
    { is: 'stage', stage: 'malolactic' },
    { is: 'stage', stage: 'over' },
  ),
);

const move: fc.Arbitrary<Move> = fc.oneof(
  { weight: 4, arbitrary: fc.tuple(vessel, mass_g, place, ago).map((all) => additions.adds(...all)) },
  {
    weight: 6,
    arbitrary: fc
      .tuple(vessel, fc.record({ volume_L, ph, free_mg_L }), place, ago)
      .map((all) => readings.reads(...all)),
  },
  {
    weight: 4,
    arbitrary: fc
      .tuple(vessel, fc.record({ ph, free_mg_L }, { requiredKeys: ['free_mg_L'] }), place, ago)
      .map((all) => readings.reads(...all)),
  },
  {
    weight: 2,
    arbitrary: fc
      .tuple(vessel, fc.record({ ph, free_mg_L }, { requiredKeys: ['free_mg_L'] }), place)
      .map((all) => readings.keeps(...all)),
  },
  { weight: 2, arbitrary: fc.tuple(vessel, mass_g, place).map((all) => additions.orders(...all)) },
  { weight: 3, arbitrary: fc.tuple(vessel, told, place).map((all) => vessels.tells(...all)) },
  {
    weight: 2,
    arbitrary: fc
      .tuple(vessel, vessel, place, fc.constantFrom(undefined, 700, 2000, 3600, 'blend' as const))
      .map((all) => vessels.pours(...all)),
  },
  { weight: 2, arbitrary: place.map((who) => corrections.undoes(who)) },
  { weight: 3, arbitrary: fc.tuple(pick, place).map((all) => corrections.strikesOut(...all)) },
  { weight: 2, arbitrary: place.map((who) => corrections.looks(who)) },
  {
    weight: 6,
    arbitrary: fc
      .tuple(pick, fc.array(place, { minLength: 1, maxLength: 4 }))
      .map(([which, [first, ...others]]) => buttons.pressesAdded(which, [first!, ...others])),
  },
  { weight: 1, arbitrary: fc.tuple(pick, place).map((all) => buttons.pressesElsewhere(...all)) },
  {
    weight: 6,
    arbitrary: fc
      .tuple(fc.constantFrom('gb' as const, 'ga' as const, 'gd' as const), pick, place)
      .map((all) => readings.answersSampled(...all)),
  },
  { weight: 3, arbitrary: fc.tuple(pick, place).map((all) => readings.wantsAnotherTarget(...all)) },
  { weight: 2, arbitrary: fc.tuple(pick, place).map((all) => corrections.pressesUndo(...all)) },
  { weight: 3, arbitrary: fc.tuple(pick, place).map((all) => buttons.pressesDone(...all)) },
  { weight: 3, arbitrary: fc.tuple(pick, place).map((all) => claims.claims(...all)) },
  { weight: 2, arbitrary: fc.tuple(pick, place).map((all) => buttons.pressesOrder(...all)) },
  {
    weight: 2,
    arbitrary: fc
      .tuple(vessel, fc.integer({ min: 5, max: 40 }), place)
      .map((all) => additions.addsWorkedOut(...all)),
  },
  { weight: 3, arbitrary: fc.tuple(pick, place).map((all) => buttons.pressesNote(...all)) },
  { weight: 3, arbitrary: fc.tuple(vessel, place).map((all) => claims.asksWho(...all)) },
  { weight: 3, arbitrary: pick.map((which) => again.comesAgain(which)) },
  { weight: 2, arbitrary: fc.constant(again.RESTART) },
);

class Command implements fc.AsyncCommand<Model, Bot> {
  readonly #move: Move;
  readonly #wait_ms: number;

  constructor(made: Move, wait_ms: number) {
    this.#move = made;
    this.#wait_ms = wait_ms;
  }

  check(model: Readonly<Model>): boolean {
    return this.#move.can?.({ ...model, now: model.now + this.#wait_ms }) ?? true;
  }

  async run(model: Model, bot: Bot): Promise<void> {
    model.now += this.#wait_ms;
    const { delivered, log } = model;
    const before = { delivered: delivered.length, log: log.length };
    await this.#move.play(model, bot);
    const noted = log.slice(before.log).at(-1);
    // Of several taps at one moment the first of whoever noted it did.
    const noting = delivered
      .slice(before.delivered)
      .filter(({ message }) => message.person === noted?.by)
      .toSorted((one, other) => Number(one.message.id) - Number(other.message.id));
    if (noting[0]) noting[0].hasNoted = true;
    const found = await differences(model, bot);
    if (found.length > 0) throw new Differs(found.join('\n'));
  }

  toString(): string {
    return this.#move.name;
  }
}

/** A stretch of a cellar's life. */
export const anyLife: fc.Arbitrary<Iterable<fc.AsyncCommand<Model, Bot>>> = fc.commands(
  [fc.tuple(move, wait).map(([made, wait_ms]) => new Command(made, wait_ms))],
  { size: 'max', maxCommands: 40 },
);
