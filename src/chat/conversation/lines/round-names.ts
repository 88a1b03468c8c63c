import type { Reading } from '../../reader/understood.ts';
import { shortened } from './problems.ts';

/** More of a line than this would push the answer off its row. */
const LONGEST = 24;

/**
 * The name that stands at the head of a line of a round: the vessel; without one the person's own words of that line,
 * up to its volume.
 */
export function roundName(message: string, reading: Reading): string | undefined {
  const { fields, where } = reading;
  if (fields.vessel !== undefined || fields.vessels !== undefined) return undefined;
  const first = Math.min(...Object.values(where).map(({ start }) => start));
  if (!Number.isFinite(first)) return undefined;
  const from = message.lastIndexOf('\n', first) + 1;
  const rest = message.slice(from).split('\n')[0] ?? '';
  const words = rest.slice(0, Math.max(0, (where.volume_L?.end ?? from + rest.length) - from));
  const name = shortened(words).replace(/[\s,;:.\-–]+$/u, '');
  return name.length <= LONGEST ? name : `${name.slice(0, LONGEST - 1)}…`;
}
