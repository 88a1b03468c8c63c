import type { LimitsFound } from '../../../core/limits/limit.ts';
import type { Line } from '../../replies/reply.ts';
import type { DecimalMark } from '../../replies/number-text.ts';
import { numberText } from '../../replies/number-text.ts';
import { rowOfRule } from './rule.ts';
import { part } from './line.ts';

/** What was assumed to find a limit, or has to be said beside it; each once. */
export function lawNotes({ notes }: LimitsFound, mark: DecimalMark): Omit<Line, 'room'>[] {
  const seen = new Set<string>();
  return notes.flatMap(({ code, rule }) => {
    if (seen.has(code) || code === 'designation-unknown') return [];
    seen.add(code);
    const row = rule === undefined ? undefined : rowOfRule(rule);
    const value = row?.value === undefined ? '' : numberText(row.value, 3, mark);
    return [part('law-note', { code, value, unit: row?.unit ?? 'mg/L' })];
  });
}
