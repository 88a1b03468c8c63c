import type { Command } from '../../command.ts';
import { countAt, daysAt } from '../../moments/count-at.ts';
import type { Piece } from '../../own-pieces.ts';
import { isOwn } from '../../own-pieces.ts';
import type { Talk } from '../talk.ts';
import { says, saysOnly } from '../talk.ts';
import { set, setWrong } from './set.ts';

/** Longer no figure counts and no wine goes unlooked at; own threshold. */
const MOST_DAYS = 366;
/** As the usual check has it: a month after the last reading. */
const DAYS_A_MONTH = 30;

interface Days {
  readonly days: number;
  readonly said: readonly Piece[];
}

/** `14 days`, `two weeks`, `a month`, `every month`. */
function daysIn(said: readonly Piece[]): Days | undefined {
  for (let k = 0; k < said.length; k++) {
    const found = daysAt(said, k);
    if (found) return { days: found.count, said: said.slice(k, found.to + 1) };
    const counted = countAt(said, k);
    if (counted && isOwn(said, counted.to + 1, 'month'))
      return { days: counted.count * DAYS_A_MONTH, said: said.slice(k, counted.to + 2) };
    const each = isOwn(said, k - 1, 'every');
    if (each && isOwn(said, k, 'week', 'month'))
      return { days: isOwn(said, k, 'week') ? 7 : DAYS_A_MONTH, said: said.slice(k, k + 1) };
  }
  return undefined;
}

const isPossible = ({ days }: Days): boolean => Number.isInteger(days) && days >= 1 && days <= MOST_DAYS;

/** Reads `pH counts 14 days`, `check every 30 days`, `check barrels every two weeks`. */
export function readDays(talk: Talk): Command | undefined {
  const isPh = says(talk, 'ph') && says(talk, 'counts');
  const isCheck = says(talk, 'check') && says(talk, 'every');
  if (isPh === isCheck) return undefined;
  const found = daysIn(talk.said);
  if (!found) return undefined;
  const allowed = isPh
    ? (['ph', 'counts', 'for', 'is'] as const)
    : (['check', 'every', 'often', 'at', 'is', 'all', 'vessels'] as const);
  if (!saysOnly(talk, allowed, new Set(found.said))) return undefined;
  const of = isPh ? 'ph-days' : 'check-days';
  if (!isPossible(found)) return setWrong(talk, of, found.said);
  const { days } = found;
  return isPh
    ? set({ of: 'ph-days', days })
    : set({ of: 'check-days', of_what: says(talk, 'often') ? 'often' : 'usual', days });
}
