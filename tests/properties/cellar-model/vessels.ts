import type { Place } from './bot.ts';
import { note } from './model.ts';
import { mustBeNoted, WORDS, type Move, type VesselName } from './move.ts';
import { holdsWine, standings } from './rules.ts';
import { firstLine, writes } from './saying.ts';

/** What is told of a vessel in words. */
export type Told =
  | { readonly is: 'racked'; readonly volume_L?: number }
  | { readonly is: 'told'; readonly volume_L: number }
  | { readonly is: 'stage'; readonly stage: 'malolactic' | 'over' }
  | { readonly is: 'topped' | 'acid' | 'emptied' | 'forgotten' };

function wordsFor(told: Told, vessel: VesselName): string {
  const name = WORDS[vessel];
  switch (told.is) {
    case 'racked':
      return `racked ${name}${told.volume_L === undefined ? '' : ` ${told.volume_L} L`}`;
    case 'told':
      return `${name} is ${told.volume_L} L now`;
    case 'stage':
      return told.stage === 'malolactic' ? `${name} in malo` : `${name} finished`;
    case 'topped':
      return `topped ${name}`;
    case 'acid':
      return `added tartaric acid to ${name}`;
    case 'emptied':
      return `${name} empty`;
    case 'forgotten':
      return `forget ${name}`;
  }
}

/** Something happens to a vessel that was heard of, or is told of it. */
export function tells(vessel: VesselName, told: Told, place: Place): Move {
  return {
    name: `tells of ${vessel}: ${JSON.stringify(told)}`,
    can: ({ log }) => standings(log).has(vessel),
    play: async (model, bot) => {
      const said = await writes(wordsFor(told, vessel), place, model, bot);
      const { entry } = note(model, { ...told, vessel }, place);
      mustBeNoted(firstLine(said), entry);
    },
  };
}

/** Wine goes from one vessel into another, all of it or a part, or is blended into the wine there. */
export function pours(from: VesselName, to: VesselName, place: Place, part?: number | 'blend'): Move {
  return {
    name: `moves ${part ?? 'all'} of ${from} to ${to}`,
    can: ({ log }) => {
      const all = standings(log);
      const [known, other] = [all.get(from), all.get(to)];
      if (from === to || known === undefined || !holdsWine(known)) return false;
      if (part === 'blend') return other !== undefined && holdsWine(other);
      return part === undefined || !(Number(known.volume_L) <= part);
    },
    play: async (model, bot) => {
      const how = part === 'blend' || part === undefined ? '' : `${part} L `;
      const [does, into] = part === 'blend' ? ['blended', 'into'] : ['moved', 'to'];
      const said = await writes(`${does} ${how}${WORDS[from]} ${into} ${WORDS[to]}`, place, model, bot);
      const volume = part === 'blend' || part === undefined ? {} : { volume_L: part };
      const is = part === 'blend' ? 'blended' : 'moved';
      const { entry } = note(model, { is, vessel: from, to, ...volume }, place);
      mustBeNoted(firstLine(said), entry);
    },
  };
}
