import type { Command } from '../../command.ts';
import type { Talk } from '../talk.ts';
import { says, saysOnly } from '../talk.ts';
import { set } from './set.ts';

/** Reads `short replies`, `keep answers short`, `long replies`, `no short replies`. */
export function readReplies(talk: Talk): Command | undefined {
  if (!says(talk, 'replies') || !saysOnly(talk, ['replies', 'short', 'long', 'no', 'off', 'is', 'work-in']))
    return undefined;
  const [isShort, isLong] = [says(talk, 'short'), says(talk, 'long')];
  if (isShort === isLong) return undefined;
  return set({ of: 'short-replies', on: isShort !== says(talk, 'no', 'off') });
}
