import type { Fields, Reading } from '../reader/understood.ts';

/** A reading of a round with the facts of the first line, which apply to all; what its own line says goes first. */
export function withShared(reading: Reading, shared: Fields): Reading {
  return { ...reading, fields: { ...shared, ...reading.fields } };
}
