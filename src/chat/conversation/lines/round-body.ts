import type { RoundRow, RoundSheet } from '../../attachments/round/round-sheet.ts';
import { roundTotals } from '../../attachments/round/round-totals.ts';
import type { TotalToFetch } from '../../../core/dose/totals-to-fetch.ts';
import { numberText, type DecimalMark } from '../../replies/number-text.ts';
import { measureText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { line, listLine, part } from './line.ts';

/** Lines up to which a round stands whole in its reply; of a longer one the sheet has the rest. */
export const WHOLE_ROUND = 12;

/** Rows of a longer round that its reply has room for, beside the totals, the problems and the cautions. */
const ROOM = { cautioned: 9, fresh: 4 } as const;
const MOST_NAMES = 8;

/** The rows of a round and its totals, what has no amount apart, as far as one screen has room for them. */
export function roundBody(
  { head, rows, mark }: Pick<RoundSheet, 'head' | 'rows' | 'mark'>,
  hasFullCautions: boolean,
): Line[] {
  const open = rows.filter(({ is }) => is === 'open');
  const done = rows.filter(({ is }) => is !== 'open');
  if (rows.length <= WHOLE_ROUND)
    return [...head, ...linesOf(done), ...totalLines(rows, mark), ...openLines(open)];
  const shown = done.slice(0, ROOM[hasFullCautions ? 'fresh' : 'cautioned']);
  const warned = done.slice(shown.length).filter(({ lines }) => lines.some(isWarning));
  return [
    ...totalLines(rows, mark),
    ...(open.length === 1 ? openLines(open) : namesLine('first', 'round-open-names', open)),
    ...head,
    ...linesOf(shown),
    ...(done.length > shown.length
      ? [line('first', 'round-more', { count: String(done.length - shown.length) })]
      : []),
    ...namesLine('caution', 'round-warned', warned),
  ];
}

/** What stands under a round: under a long one, whose names were said above, in fewer words. */
export function roundFootShown({ rows, foot }: Pick<RoundSheet, 'rows' | 'foot'>): Line[] {
  if (rows.length <= WHOLE_ROUND) return [...foot];
  return foot
    .filter(({ key }) => key !== 'round-again')
    .map((one) => (one.key === 'round-effect' ? line(one.room, 'round-effect-short') : one));
}

const isWarning = ({ key }: Line): boolean => key.startsWith('warning-');

/** Each row in its line; what a warning is about stands above it. */
export function linesOf(rows: readonly RoundRow[]): Line[] {
  return rows.flatMap(({ lines }) => [...lines.filter((one) => !isWarning(one)), ...lines.filter(isWarning)]);
}

/** What has no amount, under a heading of its own: nothing of it is in the totals. */
function openLines(open: readonly RoundRow[]): Line[] {
  if (open.length === 0) return [];
  const count = open.length === 1 ? 'one' : String(open.length);
  return [line('first', 'round-open', { count }), ...linesOf(open)];
}

/** Rows by their names, where their lines have no room. */
function namesLine(
  room: 'first' | 'caution',
  key: 'round-open-names' | 'round-warned',
  rows: readonly RoundRow[],
): Line[] {
  const names = rows.slice(0, MOST_NAMES).map(({ name }) => part('round-name', { name }));
  const rest = rows.length - names.length;
  return listLine(room, key, [
    ...names,
    ...(rest > 0 ? [part('round-and-more', { count: String(rest) })] : []),
  ]);
}

/** What to fetch of each additive, and that it is the sum of the amounts as they are shown; nothing for a single amount. */
export function totalLines(rows: readonly RoundRow[], mark: DecimalMark): Line[] {
  const amounts = rows.filter(({ is }) => is === 'amount');
  const count = amounts.flatMap(({ weighed }) => weighed).reduce((sum, one) => sum + one.count, 0);
  const totals = roundTotals(rows);
  // Where each additive is measured once, its line has all of it.
  if (count <= totals.length) return [];
  const list = totals.map((total) => totalPart(total, mark));
  return listLine('first', 'round-total', list).map((one) => ({ ...one, values: { count: String(count) } }));
}

/** The total of an additive, with what it has to be told from others by. */
export function totalPart(total: TotalToFetch, mark: DecimalMark): Omit<Line, 'room'> {
  const { additive, measure, strength_percent, tablet_SO2_g, tablet_salt_g } = total;
  const size = tablet_salt_g ?? tablet_SO2_g;
  return part('round-total-of', {
    amount: measureText(measure, mark),
    kind: measure.unit !== 'tablets' ? 'other' : tablet_salt_g === undefined ? 'tablet' : 'salt-tablet',
    additive,
    size: numberText(size ?? 0, 2, mark),
    strength: strength_percent === undefined ? 'none' : numberText(strength_percent, 2, mark),
  });
}
