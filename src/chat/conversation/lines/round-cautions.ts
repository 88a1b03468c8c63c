import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import { cautionsOf } from '../../../core/additives/cautions.ts';
import type { Line } from '../../replies/reply.ts';
import { cautionLines } from './cautions.ts';
import { line, listLine, part } from './line.ts';

/** The cautions of all additives of a round: what they have in common once, then what each has of its own. */
export function roundCautions(additives: readonly AdditiveId[], cautioned: ReadonlySet<string>): Line[] {
  const fresh = additives.filter((id) => !cautioned.has(id));
  const [first, another] = fresh;
  const before: Line[] = fresh.length < additives.length ? [line('caution', 'cautions-short')] : [];
  if (first === undefined) return before;
  if (another === undefined) return [...cautionLines({ id: first }, true), ...before];
  const isCommon = (caution: string): boolean =>
    fresh.every((id) => cautionsOf(id).some((one) => one === caution));
  const common = cautionsOf(first).filter(isCommon);
  const own = fresh.flatMap((additive): Line[] => {
    const list = cautionsOf(additive)
      .filter((one) => !isCommon(one))
      .map((id) => part(`caution-${id}`));
    return list.length === 0 ? [] : [{ ...line('caution', 'cautions-of', { additive }), list }];
  });
  const shared = listLine(
    'caution',
    'cautions',
    common.map((id) => part(`caution-${id}`)),
  );
  return [...shared, ...own, ...before];
}
