import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { countOf } from '../to-requests.ts';
import { line } from './line.ts';

/** What a sample mixed from several vessels does not tell; nothing where it is of one, or of none. */
export function mixedSampleLines(reading: Reading): Line[] {
  const count = countOf(reading);
  if (reading.marks.mixedSample === undefined || count === undefined) return [];
  return [line('effect', 'mixed-sample', { count: String(count) })];
}
