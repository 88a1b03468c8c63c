import type { LabelFacts } from '../../src/core/limits/label-for.ts';
import type { Region } from '../../src/core/limits/region.ts';

/** Whether a label has to speak of sulfites, with the text that says so. */
export interface LabelCase {
  readonly region: Region;
  readonly facts: LabelFacts;
  readonly needed: boolean | undefined;
  readonly source: string;
}

const EU =
  'Regulation (EU) 1169/2011, Annex II point 12, on an agency page, read: more than 10 mg/kg or mg/L';
const UK = 'the same, assimilated, on an agency page of Northern Ireland, read';
const US = '27 CFR 4.32(e), read: 10 or more parts per million';
const CANADA =
  'Food and Drug Regulations B.01.010.2, consolidation to 5.6.2026, read: 10 ppm or more, of what was added';
const MEMORY = 'from memory';

/** Both sides of each threshold, and the two traps: exactly 10, and SO2 that is natural. */
// prettier-ignore
export const SULFITE_LABELS: readonly LabelCase[] = [
  { region: 'eu', facts: { total_mg_L: 10 }, needed: false, source: EU },
  { region: 'eu', facts: { total_mg_L: 10.1 }, needed: true, source: EU },
  { region: 'eu', facts: { total_mg_L: 15, added_mg_L: 0 }, needed: true, source: EU },
  { region: 'uk', facts: { total_mg_L: 10 }, needed: false, source: UK },
  { region: 'uk', facts: { total_mg_L: 10.1 }, needed: true, source: UK },
  { region: 'us', facts: { total_mg_L: 9.9 }, needed: false, source: US },
  { region: 'us', facts: { total_mg_L: 10 }, needed: true, source: US },
  { region: 'us', facts: { total_mg_L: 15, added_mg_L: 0 }, needed: true, source: US },
  { region: 'ca', facts: { total_mg_L: 15, added_mg_L: 0 }, needed: false, source: CANADA },
  { region: 'ca', facts: { total_mg_L: 15, added_mg_L: 9.9 }, needed: false, source: CANADA },
  { region: 'ca', facts: { total_mg_L: 15, added_mg_L: 10 }, needed: true, source: CANADA },
  { region: 'ca', facts: { total_mg_L: 15 }, needed: undefined, source: CANADA },
  { region: 'ca-qc', facts: { added_mg_L: 10 }, needed: true, source: CANADA },
  { region: 'au', facts: { total_mg_L: 15, added_mg_L: 0 }, needed: false, source: MEMORY },
  { region: 'nz', facts: { total_mg_L: 15, added_mg_L: 10 }, needed: true, source: MEMORY },
  { region: 'ch', facts: { total_mg_L: 10 }, needed: false, source: MEMORY },
  { region: 'kr', facts: { total_mg_L: 10 }, needed: true, source: MEMORY },
  { region: 'cn', facts: { total_mg_L: 3, added_mg_L: 1 }, needed: true, source: 'GB 7718-2011 and GB 2758-2012, an answer relayed by a trade body, read: any use' },
  { region: 'br', facts: { total_mg_L: 15 }, needed: undefined, source: 'not found' },
  { region: 'oiv', facts: { total_mg_L: 15 }, needed: undefined, source: 'the code sets no label' },
];
