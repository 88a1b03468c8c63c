import { localTimeOf } from '../../../core/time/local-time-of.ts';

/** The name of a sheet's file by the day it was worked out: `weigh-out-2026-12-01.xlsx`; pictures carry their number. */
export function roundName(
  at: number,
  zone: string,
  { ending, place }: { readonly ending: string; readonly place?: number },
): string {
  const { year, month, day } = localTimeOf(at, zone);
  const date = [String(year), ...[month, day].map((part) => String(part).padStart(2, '0'))].join('-');
  return `weigh-out-${date}${place === undefined ? '' : `-${place}`}.${ending}`;
}
