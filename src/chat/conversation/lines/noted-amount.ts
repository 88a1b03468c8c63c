import type { AdditiveAtHand } from '../../../core/additives/additive-id.ts';
import type { AdditiveNoted, AmountNoted } from '../../../core/cellar/entry.ts';
import type { DecimalMark } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import { statedAmount } from './amount-text.ts';
import { part } from './line.ts';

/** An additive as the log keeps it, as it stands in the cellar; the usual salt where the log has none. */
export function atHand(noted: AdditiveNoted): AdditiveAtHand {
  const {
    additive = 'potassium-metabisulfite',
    strength_percent,
    strength_of,
    tablet_SO2_g,
    tablet_salt_g,
  } = noted;
  return {
    id: additive,
    ...(strength_percent !== undefined && { strength_percent }),
    ...(strength_of !== undefined && { strength_of }),
    ...(tablet_SO2_g !== undefined && { tablet_SO2_g }),
    ...(tablet_salt_g !== undefined && { tablet_salt_g }),
  };
}

/** The lot on the additive's label and the remark of an entry, as parts of a line. */
export function besideAmount({
  chemical_lot,
  remark,
}: {
  readonly chemical_lot?: string;
  readonly remark?: string;
}): Omit<Line, 'room'>[] {
  return [
    ...(chemical_lot === undefined ? [] : [part('fact-chemical-lot', { lot: chemical_lot })]),
    ...(remark === undefined ? [] : [part('fact-remark', { remark })]),
  ];
}

/** An amount of the log as a part of a line; undefined where only its mg/L is known. */
export function notedAmount(
  noted: AdditiveNoted & AmountNoted,
  mark: DecimalMark,
): Omit<Line, 'room'> | undefined {
  const { mass_g, additive_volume_mL, tablets } = noted;
  const amount = {
    ...(mass_g !== undefined && { mass_g }),
    ...(additive_volume_mL !== undefined && { additive_volume_mL }),
    ...(tablets !== undefined && { tablets }),
  };
  return statedAmount(amount, atHand(noted), mark);
}
