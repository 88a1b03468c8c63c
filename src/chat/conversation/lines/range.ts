import { FREE_LOW_mg_L } from '../../../core/binding/free-expected.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import { concentrationText, massText, molecularText } from '../../replies/quantity-text.ts';
import type { Line, Room } from '../../replies/reply.ts';
import type { RangeData } from '../lab/lab-answer.ts';
import type { Manner } from '../manner.ts';
import { countOf } from '../to-requests.ts';
import { additiveVolumeText } from './amount-text.ts';
import { line } from './line.ts';
import { vesselText } from './vessel.ts';

/** The dose as a range, what one is sure of after it, and the ± that it rests on. */
export function rangeLines(reading: Reading, data: RangeData, manner: Manner, room: Room): Line[] {
  const { mark, unit } = manner;
  const { ph_plus_minus: ofPH, free_plus_minus_mg_L: ofFree } = reading.marks;
  const [low, high] = data.dose_mg_L;
  const text = (value: number): string => concentrationText(value, mark);
  return [
    line(room, 'range-dose', {
      vessel: vesselText(reading),
      low: text(low),
      high: text(high),
      unit,
      amount: amountOf(data, manner),
      count: countOf(reading) === undefined ? 'one' : 'several',
    }),
    line(room, sureKey(reading), { molecular: molecularText(data.molecular_sure_mg_L, mark), unit }),
    line('assumed', 'range-rests', {
      ph: numberText(data.ph_plus_minus, 3, mark),
      free: numberText(data.free_plus_minus_mg_L, 1, mark),
      unit,
      said:
        ofPH !== undefined && ofFree !== undefined
          ? 'both'
          : ofPH !== undefined || ofFree !== undefined
            ? 'one'
            : 'none',
    }),
  ];
}

/** What is sure hangs on what binds: on a share that was said, on none at all, or on nothing where all may bind. */
function sureKey({ fields }: Reading): 'range-sure' | 'range-sure-unbound' | 'range-sure-low' {
  if (fields.free_mg_L !== undefined && fields.free_mg_L < FREE_LOW_mg_L) return 'range-sure-low';
  const isStated = fields.binding_share !== undefined || fields.binding_allowance_percent !== undefined;
  return isStated ? 'range-sure' : 'range-sure-unbound';
}

/** A figure without its unit, where the one behind it has the same. */
function bareOf(low: string, high: string): string {
  const unit = / \S+$/.exec(high)?.[0] ?? '';
  return unit !== '' && low.endsWith(unit) ? low.slice(0, -unit.length) : low;
}

function amountOf({ mass_g, additive_volume_mL, tablets }: RangeData, { mark }: Manner): string {
  const between = (ends: readonly [number, number], as: (value: number) => string): string =>
    `${bareOf(as(ends[0]), as(ends[1]))}–${as(ends[1])}`;
  if (mass_g) return between(mass_g, (value) => massText(value, mark));
  if (additive_volume_mL) return between(additive_volume_mL, (value) => additiveVolumeText(value, mark));
  return tablets ? between(tablets, (value) => numberText(value, 1, mark)) : 'none';
}
