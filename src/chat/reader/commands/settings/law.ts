import type { Command } from '../../command.ts';
import { LAW_IDS, regionsSaid } from '../regions-said.ts';
import type { Talk } from '../talk.ts';
import { says, saysOnly } from '../talk.ts';
import { set, setWrong } from './set.ts';

/** Reads `law EU`, `we sell in Canada`; `law Atlantis` names a market that is not on file. */
export function readLaw(talk: Talk): Command | undefined {
  const [opener] = talk.said.filter(({ ids }) => !ids.includes('filler') || ids.includes('law'));
  if (opener?.ids.includes('law') !== true) return undefined;
  const regions = regionsSaid(talk.said);
  const [region] = regions;
  if (region !== undefined && regions.length === 1)
    return saysOnly(talk, ['law', 'is', 'to', 'of', 'for', 'in', 'work-in', ...LAW_IDS])
      ? set({ of: 'law', region })
      : undefined;
  const others = talk.said.filter(({ ids }) => !ids.includes('law') && !ids.includes('is'));
  const isName = others.length === 1 && others[0]?.kind === 'word';
  return isName && says(talk, 'law') ? setWrong(talk, 'law', others) : undefined;
}
