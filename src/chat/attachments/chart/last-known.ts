import type { ChartData, ChartReading } from './chart-data.ts';

/** A measured figure in mg/L, and when it was. */
export interface LastFigure {
  readonly at: number;
  readonly value_mg_L: number;
}

/** The last free or total SO2 that was measured. */
export function lastKnown(
  { readings }: Pick<ChartData, 'readings'>,
  field: 'free_mg_L' | 'total_mg_L',
): LastFigure | undefined {
  const last = readings.findLast((reading) => reading[field] !== undefined);
  const value_mg_L = last?.[field];
  return last === undefined || value_mg_L === undefined ? undefined : { at: last.at, value_mg_L };
}

/** The bound SO2 of a sample in mg/L; undefined where one of the two was not measured or free is above total. */
export function boundOf({ free_mg_L, total_mg_L }: ChartReading): number | undefined {
  const isWhole = free_mg_L !== undefined && total_mg_L !== undefined && free_mg_L <= total_mg_L;
  return isWhole ? total_mg_L - free_mg_L : undefined;
}

/** Whether a sample shows more free than total SO2, which no wine has. */
export function isOdd({ free_mg_L, total_mg_L }: ChartReading): boolean {
  return free_mg_L !== undefined && total_mg_L !== undefined && free_mg_L > total_mg_L;
}
