import { ADDITIVES } from '../../../core/additives/additives.ts';
import type { AdditiveAtHand } from '../../../core/additives/additive-id.ts';
import type { Amount } from '../../../core/dose/answer.ts';
import { numberText, type DecimalMark } from '../../replies/number-text.ts';
import { massText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { part } from './line.ts';

/** What somebody states has few digits, and none of them is rounded away. */
const isStated = (value: number): boolean => Math.abs(value * 100 - Math.round(value * 100)) < 1e-7;

/** A mass in grams as it was stated, from a kilogram up in kilograms where that loses nothing. */
function statedMassText(mass_g: number, mark: DecimalMark): string {
  if (!isStated(mass_g)) return massText(mass_g, mark);
  if (mass_g >= 1000 && Number.isInteger(mass_g / 10)) return massText(mass_g, mark);
  return `${numberText(mass_g, 2, mark)} g`;
}

/** A volume of additive in millilitres, from a litre up in litres where that loses nothing of what was stated. */
export function additiveVolumeText(additive_volume_mL: number, mark: DecimalMark): string {
  if (
    isStated(additive_volume_mL) &&
    !(additive_volume_mL >= 1000 && Number.isInteger(additive_volume_mL / 10))
  )
    return `${numberText(additive_volume_mL, 2, mark)} mL`;
  if (additive_volume_mL >= 1000) return `${numberText(additive_volume_mL / 1000, 2, mark)} L`;
  return `${numberText(additive_volume_mL, additive_volume_mL >= 9.95 ? 0 : 1, mark)} mL`;
}

/** The amount that a person stated, as it goes into a list or a line; undefined where none is. */
export function statedAmount(
  amount: Partial<Amount>,
  additive: AdditiveAtHand,
  mark: DecimalMark,
): Omit<Line, 'room'> | undefined {
  const { mass_g, additive_volume_mL } = amount;
  const { id, strength_percent } = additive;
  const tablets = amount.tablets ?? effervescentIn(mass_g, additive);
  if (tablets !== undefined) return tabletsOf(tablets, additive, mark);
  if (additive_volume_mL !== undefined) {
    const text = additiveVolumeText(additive_volume_mL, mark);
    if (strength_percent === undefined) return part('amount', { amount: text, additive: id });
    const strength = numberText(strength_percent, 2, mark);
    return part('amount-solution', { amount: text, additive: id, strength });
  }
  if (mass_g === undefined) return undefined;
  // The mass of effervescent tablets is told as the SO2 they give.
  const key = ADDITIVES[id].kind === 'tablet' ? 'amount-SO2' : 'amount';
  return part(key, { amount: statedMassText(mass_g, mark), additive: id });
}

/** How many effervescent tablets give so many grams of SO2, where it is a whole number of them or of halves. */
function effervescentIn(mass_g: number | undefined, { tablet_SO2_g }: AdditiveAtHand): number | undefined {
  if (mass_g === undefined || tablet_SO2_g === undefined) return undefined;
  const tablets = mass_g / tablet_SO2_g;
  return Math.abs(tablets * 2 - Math.round(tablets * 2)) < 1e-9 ? tablets : undefined;
}

function tabletsOf(tablets: number, additive: AdditiveAtHand, mark: DecimalMark): Omit<Line, 'room'> {
  const size = additive.tablet_salt_g ?? additive.tablet_SO2_g;
  return part('amount-tablets', {
    amount: numberText(tablets, 2, mark),
    unit: tablets <= 1 ? 'tablet' : 'tablets',
    additive: additive.id,
    size: size === undefined ? 'none' : numberText(size, 2, mark),
  });
}

/** Whether a stated amount is one thing or many, as the verb after it must agree. */
export function numberOf(amount: Omit<Line, 'room'> | undefined): 'one' | 'many' {
  return amount?.values['unit'] === 'tablets' ? 'many' : 'one';
}
