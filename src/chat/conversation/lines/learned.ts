import type { Learned } from '../../../core/binding/learned.ts';
import { numberText, type DecimalMark } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import { line } from './line.ts';

/** What share of its additions a wine has bound so far, with its ± and how many they were. */
export function learnedLine({ share, spread, cases }: Learned, mark: DecimalMark): Line {
  return line('effect', 'learned', {
    share: numberText(100 * share, 0, mark),
    spread: numberText(Math.max(1, 100 * spread), 0, mark),
    count: String(cases),
  });
}
