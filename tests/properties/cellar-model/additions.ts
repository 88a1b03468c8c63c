import { textOf, type Place } from './bot.ts';
import { note } from './model.ts';
import { momentOf, mustBeNoted, orderOf, WORDS, type Move, type VesselName } from './move.ts';
import { standings } from './rules.ts';
import { firstLine, must, shows, writes } from './saying.ts';

/** `added 137 g kmbs T4`, perhaps with a time that is past. */
export function adds(vessel: VesselName, mass_g: number, place: Place, minutes?: number): Move {
  return {
    name: `adds ${mass_g} g to ${vessel}, ${minutes} min ago`,
    play: async (model, bot) => {
      const moment = momentOf(model.now, minutes);
      const at = moment?.at ?? model.now;
      const text = `added ${mass_g} g kmbs ${WORDS[vessel]}${moment ? ` ${moment.text}` : ''}`;
      const reply = textOf(await writes(text, place, model, bot));
      const order = orderOf(vessel, at, reply, model);
      const { entry } = note(model, { is: 'addition', vessel, mass_g, ...order }, place, at);
      mustBeNoted(reply, entry);
      must(reply.includes(`${mass_g} g`), `the amount is not said: ${reply}`);
      if (order.order !== undefined)
        must(reply.includes(`Order ${order.order} is done`), `not of the order: ${reply}`);
      model.claims.delete(vessel);
    },
  };
}

/** `added 26 ppm T4`, whose mass is worked out and confirmed; it is noted as of when it was told. */
export function addsWorkedOut(vessel: VesselName, ppm: number, place: Place): Move {
  return {
    name: `adds ${ppm} ppm to ${vessel}`,
    can: ({ log }) => typeof standings(log).get(vessel)?.volume_L === 'number',
    play: async (model, bot) => {
      const said = await writes(`added ${ppm} ppm ${WORDS[vessel]} kmbs`, place, model, bot);
      const [, figure, unit] = /is ([\d ]+(?:\.\d+)?) (k?g)/.exec(firstLine(said)) ?? [];
      must(figure !== undefined, `no mass: ${textOf(said)}`);
      const mass_g = Number(figure?.replaceAll(' ', '')) * (unit === 'kg' ? 1000 : 1);
      const volume_L = Number(standings(model.log).get(vessel)?.volume_L);
      // 57.63 g of SO2 are in 100 g of the pure salt.
      must(Math.abs(mass_g / ((ppm * volume_L) / 576.3) - 1) < 0.03, `another mass: ${textOf(said)}`);
      shows(said, place.chat, { vessel, mass_g, told_at: model.now }, model);
    },
  };
}

/** `order T4 90 g kmbs`. */
export function orders(vessel: VesselName, mass_g: number, place: Place): Move {
  return {
    name: `orders ${mass_g} g for ${vessel}`,
    play: async (model, bot) => {
      const said = await writes(`order ${WORDS[vessel]} ${mass_g} g kmbs`, place, model, bot);
      const { entry } = note(model, { is: 'order', vessel, mass_g }, place);
      mustBeNoted(firstLine(said), entry);
      shows(said, place.chat, { vessel }, model);
    },
  };
}
