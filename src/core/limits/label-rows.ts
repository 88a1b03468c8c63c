import type { Region } from './region.ts';
import type { Checked } from './limit-row.ts';

/** From how much SO2 on a label has to speak of sulfites. */
export interface LabelRow {
  readonly id: string;
  readonly regions: readonly Region[];
  /** mg/L, mg/kg or ppm, as the text has it; absent where any use has to be stated. */
  readonly threshold?: { readonly value: number; readonly unit: 'mg/kg or mg/L' | 'mg/kg' | 'ppm' };
  /** `>`: more than the figure; `>=`: the figure itself too; `any-use`: whatever went in. */
  readonly comparator: '>' | '>=' | 'any-use';
  /** `total`: what is natural counts too; `added`: only what went in. */
  readonly counts: 'total' | 'added';
  readonly text: string;
  readonly checked: Checked;
}

/** Ten of the unit, as nearly every market has it. */
const TEN_mg_kg_L = { value: 10, unit: 'mg/kg or mg/L' } as const;
const TEN_mg_kg = { value: 10, unit: 'mg/kg' } as const;
const TEN_ppm = { value: 10, unit: 'ppm' } as const;

// prettier-ignore
/**
 * The thresholds of the sulfite statement on file. At exactly 10 the US and Canada want it and the EU does not; Canada,
 * Australia and New Zealand count only what was added.
 *
 * Sources: the texts named in the rows; `checked` says what was read.
 *
 * @example
 * ```ts
 * LABEL_ROWS.find(({ id }) => id === 'label-us')?.comparator // => '>='
 * ```
 */
export const LABEL_ROWS: readonly LabelRow[] = [
  { id: 'label-eu', regions: ['eu'], threshold: TEN_mg_kg_L, comparator: '>', counts: 'total', text: 'Regulation (EU) 1169/2011, Annex II point 12', checked: 'agency' },
  { id: 'label-uk', regions: ['uk'], threshold: TEN_mg_kg_L, comparator: '>', counts: 'total', text: 'assimilated Regulation (EU) 1169/2011 (UK)', checked: 'agency' },
  { id: 'label-us', regions: ['us'], threshold: TEN_ppm, comparator: '>=', counts: 'total', text: '27 CFR 4.32(e)', checked: 'law-text' },
  { id: 'label-ca', regions: ['ca', 'ca-qc'], threshold: TEN_ppm, comparator: '>=', counts: 'added', text: 'Food and Drug Regulations B.01.010.2, consolidation to 5.6.2026', checked: 'law-text' },
  { id: 'label-anz', regions: ['au', 'nz'], threshold: TEN_mg_kg, comparator: '>=', counts: 'added', text: 'Food Standards Code 1.2.3 section 4 and Schedule 9', checked: 'memory' },
  { id: 'label-codex', regions: ['codex'], threshold: TEN_mg_kg, comparator: '>=', counts: 'total', text: 'CXS 1-1985, 4.2.1.4', checked: 'memory' },
  { id: 'label-cn', regions: ['cn'], comparator: 'any-use', counts: 'added', text: 'GB 7718-2011 and GB 2758-2012, an answer relayed by a trade body', checked: 'secondary' },
  { id: 'label-jp', regions: ['jp'], comparator: 'any-use', counts: 'added', text: 'Food Labelling Act (Japan)', checked: 'memory' },
  { id: 'label-kr', regions: ['kr'], threshold: TEN_mg_kg, comparator: '>=', counts: 'total', text: 'labelling standard (Korea)', checked: 'memory' },
  { id: 'label-hk', regions: ['hk'], threshold: TEN_ppm, comparator: '>=', counts: 'total', text: 'Cap. 132W (Hong Kong)', checked: 'memory' },
  { id: 'label-za', regions: ['za'], threshold: TEN_mg_kg, comparator: '>=', counts: 'total', text: 'labelling rules (South Africa)', checked: 'memory' },
  { id: 'label-ch', regions: ['ch'], threshold: TEN_mg_kg_L, comparator: '>', counts: 'total', text: 'food information ordinance (Switzerland)', checked: 'memory' },
  { id: 'label-in', regions: ['in'], threshold: TEN_mg_kg, comparator: '>=', counts: 'total', text: 'labelling rules 2020 (India)', checked: 'memory' },
  { id: 'label-eaeu', regions: ['eaeu'], threshold: TEN_mg_kg_L, comparator: '>', counts: 'total', text: 'TR TS 022/2011', checked: 'memory' },
  { id: 'label-ar-cl', regions: ['ar', 'cl'], threshold: TEN_mg_kg, comparator: '>=', counts: 'total', text: 'national food codes (Argentina, Chile)', checked: 'memory' },
];
