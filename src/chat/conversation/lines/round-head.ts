import type { AdditiveAtHand } from '../../../core/additives/additive-id.ts';
import { ADDITIVES } from '../../../core/additives/additives.ts';
import { emptyReading } from '../../reader/empty-reading.ts';
import type { Fields } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import type { Manner } from '../manner.ts';
import { factsOf } from './facts.ts';
import { line, listLine } from './line.ts';
import { bindingParts } from './round-dose.ts';

/** What holds for every vessel of a round, once above its lines: the additive to take, and what the first line said. */
export function roundHead(additive: AdditiveAtHand | undefined, shared: Fields, manner: Manner): Line[] {
  const facts = factsOf(emptyReading('dose', { fields: shared }), manner).filter(
    ({ key }) => key !== 'fact-strength' && key !== 'fact-tablet',
  );
  const forAll = listLine('first', 'round-for-all', [...facts, ...bindingParts(shared, manner)]);
  if (additive === undefined) return forAll;
  const { kind } = ADDITIVES[additive.id];
  const size = additive.tablet_salt_g ?? additive.tablet_SO2_g ?? additive.strength_percent;
  const values = {
    kind: additive.tablet_salt_g === undefined ? kind : 'salt-tablet',
    additive: additive.id,
    size: size === undefined ? 'none' : numberText(size, 2, manner.mark),
  };
  return [line('first', 'round-head', values), ...forAll];
}
