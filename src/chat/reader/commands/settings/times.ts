import type { Command } from '../../command.ts';
import type { Talk } from '../talk.ts';
import { says, saysOnly } from '../talk.ts';
import { minutesIn } from './minute-at.ts';
import { set, setWrong } from './set.ts';

/** Reads `quiet 20 to 6`, `quiet hours 21:00-7:00`. */
function readQuiet(talk: Talk): Command | undefined {
  const [from, to, another] = minutesIn(talk.said);
  if (!says(talk, 'quiet') || !from || !to || another) return undefined;
  const dashes = talk.said.filter(({ kind, text }) => kind === 'mark' && text === '-');
  const read = new Set([...from.said, ...to.said, ...dashes]);
  if (!saysOnly(talk, ['quiet', 'from', 'to', 'until', 'at', 'is'], read)) return undefined;
  if (from.minute === undefined || to.minute === undefined)
    return setWrong(talk, 'quiet', [...from.said, ...to.said]);
  return set({ of: 'quiet', from_minute: from.minute, to_minute: to.minute });
}

/** Reads `daily list at 7:30`, `no daily list`. */
function readDaily(talk: Talk): Command | undefined {
  if (!says(talk, 'daily')) return undefined;
  const [at, another] = minutesIn(talk.said);
  if (!saysOnly(talk, ['daily', 'at', 'is', 'to', 'show', 'no', 'off'], new Set(at?.said)) || another)
    return undefined;
  if (!at) return says(talk, 'no', 'off') ? set({ of: 'daily', at_minute: 'off' }) : undefined;
  if (says(talk, 'no', 'off')) return undefined;
  return at.minute === undefined
    ? setWrong(talk, 'daily', at.said)
    : set({ of: 'daily', at_minute: at.minute });
}

/** Reads when the bot may write by itself. */
export const readTimes = (talk: Talk): Command | undefined => readQuiet(talk) ?? readDaily(talk);
