import { ADDITIVES } from '../../../core/additives/additives.ts';
import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import type { Amount } from '../../../core/dose/answer.ts';
import type { Fields } from '../../reader/understood.ts';
import { numberText, type DecimalMark } from '../../replies/number-text.ts';
import { massText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { part } from './line.ts';

/** A volume of additive in millilitres, from a litre up in litres. */
export function additiveVolumeText(additive_volume_mL: number, mark: DecimalMark): string {
  if (additive_volume_mL >= 1000) return `${numberText(additive_volume_mL / 1000, 2, mark)} L`;
  return `${numberText(additive_volume_mL, additive_volume_mL >= 9.95 ? 0 : 1, mark)} mL`;
}

function sizeOf(fields: Fields | Partial<Amount>, mark: DecimalMark): string {
  const size = 'tablet_salt_g' in fields ? fields.tablet_salt_g : undefined;
  return size === undefined ? 'none' : numberText(size, 2, mark);
}

/** The amount that a person stated, as it goes into a list or a line; undefined where none is. */
export function statedAmount(
  fields: Fields | Partial<Amount>,
  additive: AdditiveId,
  mark: DecimalMark,
): Omit<Line, 'room'> | undefined {
  if (fields.tablets !== undefined)
    return part('amount-tablets', {
      amount: numberText(fields.tablets, 2, mark),
      additive,
      size: sizeOf(fields, mark),
    });
  if (fields.additive_volume_mL !== undefined)
    return part('amount', { amount: additiveVolumeText(fields.additive_volume_mL, mark), additive });
  if (fields.mass_g === undefined) return undefined;
  // The mass of effervescent tablets is told as the SO2 they give.
  const key = ADDITIVES[additive].kind === 'tablet' ? 'amount-SO2' : 'amount';
  return part(key, { amount: massText(fields.mass_g, mark), additive });
}
