import { textOf, type Bot, type Place } from './bot.ts';
import { note, type Model, type Shown } from './model.ts';
import { DAY_ms, mustBeNoted, orderOf, type Move } from './move.ts';
import { openOrders, strikes, type Noted } from './rules.ts';
import { firstLine, must, presses, shows } from './saying.ts';

/** Buttons work for two weeks: a day less than that they surely do. */
const BUTTONS_ms = 13 * DAY_ms;

/** The buttons of a kind that still work in a chat; those of an entry work everywhere. */
function seen(does: string, chat: string | undefined, { shown, now }: Model): Shown[] {
  return shown.filter(
    (one) =>
      one.key.startsWith(`${does}:`) &&
      (chat === undefined || one.chat === chat) &&
      now - one.shown_at < BUTTONS_ms,
  );
}

/** One of them, the newest the likeliest. */
export function picked(
  does: string,
  chat: string | undefined,
  pick: number,
  model: Model,
): Shown | undefined {
  const all = seen(does, chat, model);
  return all.at(-1 - (pick % Math.max(1, all.length)));
}

/** What a button has made that nobody has taken back. */
function standingOf(name: string, { made, log }: Model): number | undefined {
  const struck = strikes(log);
  return made.get(name)?.find((entry) => !struck.has(entry));
}

function keepMade(name: string, { entry }: Noted, { made }: Model): void {
  made.set(name, [...(made.get(name) ?? []), entry]);
}

/** "I added it", by one or by several at the same moment: one entry. */
export function pressesAdded(pick: number, places: readonly [Place, ...Place[]]): Move {
  const [{ chat }] = places;
  const together = places.filter((one) => one.chat === chat);
  return {
    name: `${together.map(({ person }) => person).join(' and ')}: I added it`,
    can: (model) => picked('a', chat, pick, model) !== undefined,
    play: async (model, bot) => {
      const button = picked('a', chat, pick, model)!;
      const name = `${chat} ${button.key}`;
      const before = standingOf(name, model);
      const replies = await Promise.all(together.map((place) => presses(button.key, place, model, bot)));
      const all = replies.map((said) => textOf(said));
      if (before !== undefined)
        return all.forEach((reply) => must(reply.startsWith(`Already noted as ${before} `), reply));
      const first = all.findIndex((reply) => reply.startsWith('Noted'));
      must(first >= 0, `not noted: ${all.join('\n')}`);
      const { vessel, mass_g = 0 } = button;
      const order = orderOf(vessel, model.now, all[first] ?? '', model);
      const noted = note(model, { is: 'addition', vessel, mass_g, ...order }, together[first]!);
      mustBeNoted(all[first] ?? '', noted.entry);
      all.forEach(
        (reply, at) => at === first || must(reply.startsWith(`Already noted as ${noted.entry} `), reply),
      );
      keepMade(name, noted, model);
      model.claims.delete(vessel);
      shows(replies[first] ?? [], chat, { vessel }, model);
    },
  };
}

/** A button that is pressed in a chat where nobody sees it. */
export function pressesElsewhere(pick: number, { person, chat }: Place): Move {
  return {
    name: 'presses a button of another chat',
    can: (model) => picked('a', chat, pick, model) !== undefined,
    play: async (model, bot) => {
      await presses(picked('a', chat, pick, model)!.key, { person, chat: 'three' }, model, bot);
    },
  };
}

/** "Order it", behind "More" under a dose: one order, also after it was struck. */
export function pressesOrder(pick: number, place: Place): Move {
  return {
    name: 'orders by a button',
    can: (model) => picked('a', place.chat, pick, model) !== undefined,
    play: async (model, bot) => {
      const { key, vessel, mass_g = 0 } = picked('a', place.chat, pick, model)!;
      const name = `${place.chat} o${key}`;
      const before = standingOf(name, model);
      const said = await presses(`o${key.slice(1)}`, place, model, bot);
      if (before !== undefined)
        return must(firstLine(said).startsWith(`Already noted as ${before} `), textOf(said));
      const noted = note(model, { is: 'order', vessel, mass_g }, place);
      mustBeNoted(firstLine(said), noted.entry);
      keepMade(name, noted, model);
      shows(said, place.chat, { vessel }, model);
    },
  };
}

/** "Note it" under a mass that was worked out. */
export function pressesNote(pick: number, place: Place): Move {
  return {
    name: 'presses note it',
    can: (model) => picked('n', place.chat, pick, model) !== undefined,
    play: async (model, bot) => {
      const { key, vessel, told_at = 0 } = picked('n', place.chat, pick, model)!;
      const name = `${place.chat} ${key}`;
      const before = standingOf(name, model);
      const said = await presses(key, place, model, bot);
      if (before !== undefined)
        return must(firstLine(said).startsWith(`Already noted as ${before} `), textOf(said));
      const order = orderOf(vessel, told_at, textOf(said), model);
      const mass_g = await notedMass(model, bot);
      const noted = note(model, { is: 'addition', vessel, mass_g, ...order }, place, told_at);
      mustBeNoted(firstLine(said), noted.entry);
      keepMade(name, noted, model);
      model.claims.delete(vessel);
    },
  };
}

/** The log has the mass in full, of which the reply shows a few figures. */
async function notedMass({ log }: Model, bot: Bot): Promise<number> {
  const entry = await bot.look((view) => view.entry(log.length + 1));
  return entry?.kind === 'addition' ? (entry.mass_g ?? 0) : 0;
}

/** "17 is done" under an order: it went in as it was ordered. */
export function pressesDone(pick: number, place: Place): Move {
  return {
    name: 'presses done',
    can: (model) => picked('d', undefined, pick, model) !== undefined,
    play: async (model, bot) => {
      const { key, vessel } = picked('d', undefined, pick, model)!;
      const order = Number(key.slice(2));
      const noted = model.log[order - 1]!;
      const isOpen = openOrders(model.log, vessel).includes(order);
      const said = await presses(key, place, model, bot);
      must(firstLine(said).startsWith('Noted') === isOpen, `noted or not: ${textOf(said)}`);
      if (!isOpen || noted.is !== 'order') return;
      const { mass_g } = noted;
      mustBeNoted(firstLine(said), note(model, { is: 'addition', vessel, mass_g, order }, place).entry);
      model.claims.delete(vessel);
      shows(said, place.chat, { vessel }, model);
    },
  };
}
