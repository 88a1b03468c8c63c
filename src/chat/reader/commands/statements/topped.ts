import type { Finding } from '../../board.ts';
import { findingOf } from '../../board.ts';
import type { Command } from '../../command.ts';
import { keepOnly } from './route.ts';
import type { Item, Tale } from './tale.ts';
import { findsOnly, tells, tellsOnly } from './tale.ts';

/** `topped T4 with 20 L`, `topped T4 from T9, 20 L`; a volume behind the vessel alone may be what is in it now. */
function isAmount({ items }: Tale): boolean {
  const at = items.findIndex(({ finding }) => finding?.field === 'volume_L');
  const vessel = items.findIndex(({ finding }) => finding?.field === 'vessel');
  const isSource = ({ finding, piece }: Item): boolean =>
    finding === undefined && piece.ids.some((id) => id === 'with' || id === 'from');
  return at < vessel || items.slice(0, at).some(isSource);
}

/** Reads `topped T4`, `topped up T4 with 20 L`, `topped T4 with 20 L from T9`. */
export function readTopped(tale: Tale): Command | undefined {
  const { board, items } = tale;
  if (!tells(tale, 'topped') || !findsOnly(tale, 'vessel', 'vessels', 'volume_L')) return undefined;
  if (!tellsOnly(tale, ['topped', 'with', 'from', 'over', 'off', 'of', 'wine'])) return undefined;
  if (findingOf(board, 'volume_L') && !isAmount(tale)) return undefined;
  const many = findingOf(board, 'vessels');
  const vessels = board.findings.filter((one): one is Finding<'vessel'> => one.field === 'vessel');
  if (many) return vessels.length > 0 || findingOf(board, 'volume_L') ? undefined : { name: 'topped' };
  const [first, second, third] = vessels;
  if (first === undefined || third !== undefined) return undefined;
  if (second === undefined) return { name: 'topped' };
  const before = items[items.findIndex(({ finding }) => finding === second) - 1];
  const isFromIt = before?.piece.ids.some((id) => id === 'from' || id === 'with') === true;
  if (!isFromIt || before?.finding !== undefined || first.value === second.value) return undefined;
  keepOnly(tale, first);
  return { name: 'topped', from: second.value };
}
