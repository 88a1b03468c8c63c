import type { Target } from '../../../core/wine.ts';
import type { Line } from '../../replies/reply.ts';
import { numberText } from '../../replies/number-text.ts';
import type { Manner } from '../manner.ts';

/** A target as values of a sentence that takes `target`: its kind, and its figure with unit. */
export function targetValues(target: Target, { mark, unit }: Manner): Line['values'] {
  if ('molecular_mg_L' in target)
    return { kind: 'molecular', value: `${numberText(target.molecular_mg_L, 2, mark)} ${unit}` };
  if ('free_mg_L' in target)
    return { kind: 'free', value: `${numberText(target.free_mg_L, 1, mark)} ${unit}` };
  return { kind: 'add', value: `${numberText(target.add_mg_L, 1, mark)} ${unit}` };
}
