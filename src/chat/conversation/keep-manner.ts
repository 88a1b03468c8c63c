import type { Reading, Understood } from '../reader/understood.ts';
import type { Memory } from './memory.ts';

/** Whether a text shows with which mark its writer parts the decimals. */
function showsDecimals(text: string): boolean {
  return /\d[.,]\d{1,2}(?!\d)/.test(text);
}

/** A unit that the reader needs not look at, as the answer is a bare figure with it. */
function unitIn(text: string): Reading['concentrationUnit'] {
  return /\d\s*ppm\b/i.test(text) ? 'ppm' : /\d\s*mg\s*\/\s*l\b/i.test(text) ? 'mg/L' : undefined;
}

/** What was read, with the decimal mark and the unit of concentration that the person has used before. */
export function keepManner(understood: Understood, text: string, memory: Memory): Understood {
  const decimalMark = showsDecimals(text)
    ? understood.decimalMark
    : (memory.decimalMark ?? understood.decimalMark);
  const inText = unitIn(text);
  return {
    ...understood,
    decimalMark,
    readings: understood.readings.map((reading) => {
      const unit = reading.concentrationUnit ?? inText ?? memory.concentrationUnit;
      return unit === undefined ? reading : { ...reading, concentrationUnit: unit };
    }),
  };
}
