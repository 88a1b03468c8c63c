import type { RoundSheet } from '../../attachments/round/round-sheet.ts';
import { roundTotals } from '../../attachments/round/round-totals.ts';
import type { RoundData } from '../ports.ts';

/** What a round comes to, as data. */
export function roundData({ rows }: Pick<RoundSheet, 'rows'>): RoundData {
  return { totals: roundTotals(rows), problems: rows.filter(({ is }) => is === 'open').length };
}
