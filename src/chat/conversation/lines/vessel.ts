import type { Reading } from '../../reader/understood.ts';
import { vesselNames } from '../../replies/vessel-name.ts';

/** More of a person's words than this would push the answer off its line. */
const LONGEST = 24;

/**
 * The vessel as the person wrote it (`T4`, `barrel 17`), codes in capitals; `none` where none is named, which the
 * sentences select on.
 */
export function vesselText(reading: Reading): string {
  const { vessel, vessels } = reading.fields;
  if (vessels !== undefined) return vesselsText(reading, vessels);
  if (vessel === undefined) return 'none';
  return asName(reading.where.vessel?.text ?? vessel, vessel);
}

function vesselsText(reading: Reading, vessels: readonly string[]): string {
  const short = vesselNames(vessels);
  return asName(reading.where.vessels?.text ?? short, short);
}

function asName(written: string, otherwise: string): string {
  // A line of a round goes by its own words.
  if (written === otherwise && written.includes(' ')) return written;
  const oneLine = written.replace(/[\p{C}\s]+/gu, ' ').trim();
  const name = oneLine === '' || oneLine.length > LONGEST ? otherwise : oneLine;
  if (!/[\p{L}]{4,}/u.test(name)) return name.toUpperCase();
  return name.slice(0, 1).toUpperCase() + name.slice(1);
}
