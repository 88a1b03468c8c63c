import type { ChartData } from './chart-data.ts';
import type { ChartFrame } from './chart-frame.ts';
import { isOdd } from './last-known.ts';
import { boundSign, freeSign, oddSign, totalSign } from './signs.ts';

/** The radius of a dot in units of the picture: the more there are, the smaller. */
export function dotRadius(count: number): number {
  const steps = [
    { most: 15, radius: 5 },
    { most: 40, radius: 4 },
    { most: 100, radius: 3 },
  ];
  return steps.find(({ most }) => count <= most)?.radius ?? 2.4;
}

/** The signs of the samples: the gaps, which other things may lie on, and what lies on all: totals, then free SO2. */
export function drawReadings(
  { readings }: ChartData,
  { x, y }: ChartFrame,
): { readonly gaps: string; readonly dots: string } {
  const radius = dotRadius(readings.length);
  const signs = readings.map((reading) => {
    const { at, free_mg_L, total_mg_L } = reading;
    const free = free_mg_L === undefined ? undefined : { x: x(at), y: y(free_mg_L) };
    const total = total_mg_L === undefined ? undefined : { x: x(at), y: y(total_mg_L) };
    return {
      gap: free && total && !isOdd(reading) ? boundSign(free, total, radius) : '',
      total: total ? totalSign(total, radius) : '',
      free: free ? freeSign(free, radius) : '',
      odd: free && total && isOdd(reading) ? oddSign(free, total, radius) : '',
    };
  });
  const all = (kind: keyof (typeof signs)[number]): string => signs.map((sign) => sign[kind]).join('');
  return { gaps: all('gap'), dots: all('total') + all('free') + all('odd') };
}
