import type { Finding } from '../../board.ts';
import type { OwnWordId } from '../../words/words.ts';
import type { Item, Tale } from './tale.ts';

/** Two vessels of a statement: out of which and into which. */
export interface Route {
  readonly from: Finding<'vessel'>;
  readonly to: Finding<'vessel'>;
}

const isVessel = (item: Item | undefined): item is Item & { finding: Finding<'vessel'> } =>
  item?.finding?.field === 'vessel';

/** Whether the word that leads to item `k` is one of those. */
function isLed({ items }: Tale, k: number, ids: readonly OwnWordId[]): boolean {
  const before = items[k - 1];
  return before?.finding === undefined && before?.piece.ids.some((id) => ids.includes(id)) === true;
}

/** From which vessel to which: `T4 to T9`, `from T4 into T9`, `to T9 from T4`; undefined where the words do not say. */
export function routeOf(tale: Tale): Route | undefined {
  const at = tale.items.flatMap((item, k) => (isVessel(item) ? [k] : []));
  const [first, second, third] = at;
  if (first === undefined || second === undefined || third !== undefined) return undefined;
  const to = at.filter((k) => isLed(tale, k, ['to']));
  const [into] = to;
  if (into === undefined || to.length > 1) return undefined;
  const outOf = into === first ? second : first;
  if (outOf === second && !isLed(tale, second, ['from'])) return undefined;
  const [from, target] = [tale.items[outOf], tale.items[into]];
  if (!isVessel(from) || !isVessel(target) || from.finding.value === target.finding.value) return undefined;
  return { from: from.finding, to: target.finding };
}

/** Leaves on the board the one vessel that the statement is about. */
export function keepOnly({ board }: Tale, kept: Finding<'vessel'>): void {
  const others = board.findings.filter((finding) => finding.field !== 'vessel' || finding === kept);
  board.findings.splice(0, board.findings.length, ...others);
}
