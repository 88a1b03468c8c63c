import { textOf, type Place } from './bot.ts';
import { picked } from './buttons.ts';
import type { Claimed, Model } from './model.ts';
import { MINUTE_ms, WORDS, type Move, type VesselName } from './move.ts';
import { standings } from './rules.ts';
import { firstLine, must, presses, writes } from './saying.ts';

const CLAIM_ms = 240 * MINUTE_ms;

/** "I do this one" under a dose. */
export function claims(pick: number, place: Place): Move {
  return {
    name: `${place.person} claims`,
    can: (model) => picked('y', place.chat, pick, model) !== undefined,
    play: async (model, bot) => {
      const { key, vessel } = picked('y', place.chat, pick, model)!;
      const taken = claimOf(vessel, model);
      const said = await presses(key, place, model, bot);
      const isOthers = taken !== undefined && taken.by !== place.person;
      must(/is on it since/.test(firstLine(said)) === isOthers, `taken or not: ${textOf(said)}`);
      if (!isOthers) model.claims.set(vessel, { by: place.person, at: model.now });
    },
  };
}

function claimOf(vessel: string, model: Model): Claimed | undefined {
  const claim = model.claims.get(vessel);
  return claim !== undefined && model.now < claim.at + CLAIM_ms ? claim : undefined;
}

/** `T4?`: who is about to dose it. */
export function asksWho(vessel: VesselName, place: Place): Move {
  return {
    name: `${place.person} asks for ${vessel}`,
    can: ({ log }) => standings(log).has(vessel),
    play: async (model, bot) => {
      const claim = claimOf(vessel, model);
      const reply = textOf(await writes(`${WORDS[vessel]}?`, place, model, bot));
      if (claim === undefined) must(!/on it since/.test(reply), `nobody is on it: ${reply}`);
      else if (claim.by !== place.person)
        must(reply.includes(`${claim.by} is on it since`), `${claim.by} is: ${reply}`);
    },
  };
}
