import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import { cautionsOf } from '../../../core/additives/cautions.ts';
import type { Line } from '../../replies/reply.ts';
import { line, listLine, part } from './line.ts';

/** The cautions of an additive: in full the first time in a day, then one line with the button `Safety`. */
export function cautionLines(additive: AdditiveId, inFull: boolean): Line[] {
  if (!inFull) return [line('caution', 'cautions-short')];
  return listLine(
    'caution',
    'cautions',
    cautionsOf(additive).map((id) => part(`caution-${id}`)),
  );
}
