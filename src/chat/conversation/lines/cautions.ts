import type { AdditiveAtHand } from '../../../core/additives/additive-id.ts';
import { cautionsOf, type CautionUse } from '../../../core/additives/cautions.ts';
import type { Line } from '../../replies/reply.ts';
import { line, listLine, part } from './line.ts';

/**
 * The cautions of an additive: in full the first time in a day, then one line with the button `Safety`.
 *
 * @param use whether it goes into wine, or into water
 */
export function cautionLines(
  { id, tablet_salt_g }: Pick<AdditiveAtHand, 'id' | 'tablet_salt_g'>,
  inFull: boolean,
  use: CautionUse = 'wine',
): Line[] {
  if (!inFull) return [line('caution', 'cautions-short')];
  return listLine(
    'caution',
    'cautions',
    cautionsOf(id, use, tablet_salt_g !== undefined).map((caution) => part(`caution-${caution}`)),
  );
}
