import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { line } from './line.ts';
import { vesselText } from './vessel.ts';

/** Before any figure for wine in bottles: what an addition to it means. */
export function bottledLines(reading: Reading): Line[] {
  if (reading.fields.stage !== 'bottled') return [];
  return [line('first', 'dose-bottled', { vessel: vesselText(reading) })];
}
