import type { LocalMinute } from '../../../src/core/time/local-time.ts';

/** A date or a minute as it is written in a table, `2026-03-29T02:30`. */
export function written(text: string): LocalMinute {
  const [year = 0, month = 0, day = 0, hour = 0, minute = 0] = text.split(/[-T:]/).map(Number);
  return { year, month, day, hour, minute };
}
