/** The colour of a wine: it chooses the usual target and the row of the limit. */
export type Style = 'red' | 'white' | 'rosé';

/** What kind of wine, where the kind changes target or law. A still dry table wine has none. */
export type Category = 'sweet' | 'sparkling' | 'fortified';

/** What is fermented, when it is not grapes; and wine without its alcohol, which the law has apart. */
export type Product = 'cider' | 'mead' | 'fruit-wine' | 'alcohol-free';

/** Where the wine stands on its way. The usual targets are for `finished` wine only. */
export type Stage = 'must' | 'fermenting' | 'malolactic' | 'base' | 'finished' | 'bottled';

/** The stages at which no usual target exists, so that the dose is asked for and never assumed. */
export const STAGES_WITHOUT_TARGET: readonly Stage[] = ['must', 'fermenting', 'malolactic', 'base'];

/** What a person aims at: so much free, so much molecular, or a stated rise of free SO2; all in mg/L. */
export type Target =
  { readonly free_mg_L: number } | { readonly molecular_mg_L: number } | { readonly add_mg_L: number };

/** The table of dissociation constants a figure rests on. */
export type Basis = 'pk-1.81' | 'oiv';
