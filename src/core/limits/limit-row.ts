import type { Style } from '../wine.ts';
import type { LawTextKey } from './law-texts.ts';
import type { Region } from './region.ts';

/** What kind of drink a row is for. A still wine of grapes is `still`; `alcohol-free` is wine without its alcohol. */
export type LimitProduct =
  | 'still'
  | 'quality-sparkling'
  | 'other-sparkling'
  | 'fortified'
  | 'cider'
  | 'mead'
  | 'fruit-wine'
  | 'alcohol-free';

/** From whom the figure was learnt. Only `memory` makes a row unconfirmed. */
export type Checked =
  'law-text' | 'law-copy' | 'agency' | 'foreign-agency' | 'trade-guide' | 'secondary' | 'memory';

/** `read`: the figure was seen in the named source; `unconfirmed`: from memory, so it never makes a dose smaller. */
export type Confidence = 'read' | 'unconfirmed';

/** Whether the row may be used. Anything but `in-force` is told as a note and never compared with. */
export type RowStatus = 'in-force' | 'repealed' | 'other-unit' | 'not-found' | 'second-value';

/** The unit that the law has its figure in. */
export type LimitUnit = 'mg/L' | 'ppm' | 'mg/kg' | 'g/kg' | 'g/L' | 'mg/dm3' | 'ppm added';

/** Sugar in g/L of the basis that the law names; the ends as the text has them. */
export interface SugarBand {
  readonly from_g_L?: number;
  /** Whether the lower end is in the band; absent with no lower end. */
  readonly fromIncluded?: boolean;
  readonly to_g_L?: number;
  readonly toIncluded?: boolean;
  readonly basis: 'reducing-substances' | 'glucose-fructose' | 'residual-sugar' | 'total-sugar' | 'sugar';
}

/** What opens a row beside colour and sugar; it is said of a wine and never inferred. */
export type Designation =
  | 'sweet-300' // a class of sweet wines, by the figure that the law gives without organic rules
  | 'sweet-350'
  | 'sweet-400'
  | 'national-pdo'
  | 'national-pdo-dry'
  | 'national-pdo-other'
  | 'dry'
  | 'sweet'
  | 'bulk-export'
  | 'made-with-organic';

/** A row of the table of limits: which wine it is for, the figure as the law has it, and how we know. */
export interface LimitRow {
  readonly id: string;
  readonly region: Region;
  readonly products: readonly LimitProduct[];
  /** Absent: any colour. */
  readonly styles?: readonly Style[];
  readonly sugar?: SugarBand;
  readonly designation?: Designation;
  readonly organic?: true;
  /** `combined` is compared with the total, which is the stricter reading; `added` forbids the addition. */
  readonly of: 'total' | 'free' | 'combined' | 'added';
  readonly operator: '<=' | '<';
  /** Absent where the figure was not found. */
  readonly value?: number;
  readonly unit: LimitUnit;
  /** The most that a declared year may add, mg/L. */
  readonly uplift_mg_L?: number;
  readonly text: LawTextKey;
  readonly provision?: string;
  readonly version?: string;
  readonly checked: Checked;
  readonly status: RowStatus;
  /** Another value that is told elsewhere, or what else the text leaves open. */
  readonly note?: LimitNoteId;
}

/** What the reply may have to say about a row; the sentences are the locales'. */
export type LimitNoteId =
  | 'recommends-only' // the code recommends, it does not bind
  | 'other-value-told' // another figure is told elsewhere
  | 'boundary-open' // the text leaves the very boundary open, the stricter side was taken
  | 'boundary-told-otherwise' // the page that was read has the other side of the boundary
  | 'dry-undefined' // the text says dry and sweet without a figure
  | 'band-misprinted' // the sheet prints the band the wrong way round
  | 'by-reference' // the reference was read, the figure is the one referred to
  | 'derived' // two figures that were read, subtracted
  | 'combined-as-total' // the text says combined; it is compared with the total
  | 'from-seven-percent' // for wine of 7 % vol and above
  | 'bulk-has-less' // bulk wine for export has a lower limit
  | 'stacks-on-general'; // the general limit holds beside it
