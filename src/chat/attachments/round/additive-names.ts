import type { AdditiveAtHand } from '../../../core/additives/additive-id.ts';
import { numberText, type DecimalMark } from '../../replies/number-text.ts';
import type { SayLine } from './round-words.ts';

/** How an additive is called on a sheet, with its strength where it has one: `6 % SO2 solution in water`. */
export function additiveNames(sayLine: SayLine, mark: DecimalMark): (additive: AdditiveAtHand) => string {
  return ({ id, strength_percent }) => {
    const strength = strength_percent === undefined ? 'none' : numberText(strength_percent, 2, mark);
    return sayLine({ room: 'first', key: 'sheet-additive-name', values: { additive: id, strength } }).trim();
  };
}
