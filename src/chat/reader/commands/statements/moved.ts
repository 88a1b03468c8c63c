import { findingOf } from '../../board.ts';
import type { Command } from '../../command.ts';
import { keepOnly, routeOf } from './route.ts';
import type { Tale } from './tale.ts';
import { findsOnly, tells, tellsOnly } from './tale.ts';

const vesselsIn = ({ board }: Tale): number =>
  board.findings.filter(({ field }) => field === 'vessel' || field === 'vessels').length;

/** `racked T4`, `racked T4 off the lees, 6100 L`. */
function readRacked(tale: Tale): Command | undefined {
  if (!tells(tale, 'racked') || !tellsOnly(tale, ['racked', 'off-lees', 'and', 'is', 'has', 'in-it', 'left']))
    return undefined;
  const isEach =
    findingOf(tale.board, 'vessels') !== undefined && findingOf(tale.board, 'volume_L') !== undefined;
  return isEach ? undefined : { name: 'racked' };
}

/** Reads wine that went from one vessel to another, or off its lees: `moved T4 to T9`, `racked T4 6100 L`. */
export function readMoved(tale: Tale): Command | undefined {
  if (!findsOnly(tale, 'vessel', 'vessels', 'volume_L')) return undefined;
  if (vesselsIn(tale) === 1) return readRacked(tale);
  const route = routeOf(tale);
  if (!route) return undefined;
  const isBlend = tells(tale, 'blended');
  const verbs = isBlend ? (['blended'] as const) : (['moved', 'racked', 'pumped'] as const);
  if (!tells(tale, ...verbs)) return undefined;
  if (!tellsOnly(tale, [...verbs, 'to', 'from', 'of', 'all', 'over', 'off-lees', 'wine'])) return undefined;
  const to = route.to.value;
  // `racked B1 to B24`: one barrel into another, or all of them?
  if (tells(tale, 'racked') && [to, route.from.value].every((name) => /^(barrel |B\d)/.test(name)))
    return undefined;
  keepOnly(tale, route.from);
  return { name: isBlend ? 'blended' : 'moved', to };
}
