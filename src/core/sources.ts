/** One source: what it is, and whether its figures were read in a copy of it or written from memory. */
export interface Source {
  readonly title: string;
  /** `true`: the figures were read in a copy of the named text; `false`: from memory, to be checked. */
  readonly read: boolean;
}

/**
 * Every source once, by key. A figure in `core` names its key; nothing stands without one.
 *
 * @example
 * ```ts
 * SOURCES['jecfa-1999'].read // => true
 * ```
 */
export const SOURCES = {
  arithmetic: { title: 'plain arithmetic', read: true },
  'common-practice': { title: 'common practice, no source', read: false },
  'own-threshold': { title: 'a threshold of this project', read: true },
  label: { title: 'the strength on the label, as stated', read: true },
  'uc-1982': {
    title: 'University of California Cooperative Extension, Enology Briefs I (1), 1982, free SO2 table',
    read: true,
  },
  'association-table': {
    title: 'an amateur winemakers’ association (Vancouver), free SO2 by pH for 0.8 and 2.0 mg/L molecular',
    read: true,
  },
  'oiv-as323-04c': { title: 'OIV-MA-AS323-04C, molecular sulphur dioxide, formula and Table I', read: true },
  'oiv-as323-04c-table-2': { title: 'OIV-MA-AS323-04C, Table II (ionic strength 0.038)', read: false },
  'usseglio-tomasset-1984': {
    title: 'Usseglio-Tomasset & Bosia 1984, pK by alcohol and temperature, as tabulated in handbooks',
    read: false,
  },
  'goldberg-parker-1985': { title: 'Goldberg & Parker 1985, J. Res. NBS 90:341', read: false },
  'crc-handbook': { title: 'CRC Handbook of Chemistry and Physics', read: false },
  'ciaaw-2021': { title: 'IUPAC/CIAAW Standard Atomic Weights 2021', read: true },
  'iupac-conventional': { title: 'IUPAC conventional (single) atomic weights', read: false },
  'wine-chemistry-17.1': {
    title: 'Waterhouse, Sacks & Jeffery, Understanding Wine Chemistry, 2016, table 17.1',
    read: true,
  },
  'sweet-white-page': {
    title: 'a French-language page (Switzerland, no author) on SO2 in sweet whites: 1.5 mg/L',
    read: true,
  },
  'awri-mlf': {
    title: 'Australian Wine Research Institute, Ask the AWRI: malolactic fermentation',
    read: true,
  },
  'handbook-enology-8': { title: 'Handbook of Enology vol. 1, ch. 8', read: false },
  'oiv-c1-01': { title: 'OIV-MA-C1-01 (Oeno 9/98), total sulfur dioxide', read: true },
  'jecfa-1999': { title: 'JECFA 1999, FNP 52 Add 7, specifications of the sulfites', read: true },
  'usp-35': { title: 'USP 35-NF 30, potassium metabisulfite', read: true },
  'austrian-law': { title: 'Austrian federal law, RIS no. 10010710, s. 3', read: true },
  'oiv-potbis': { title: 'OIV Oenological Codex COEI-1-POTBIS (Oeno 38/2000)', read: true },
  'oiv-oeno-646-2019': { title: 'OIV-OENO 646-2019, potassium hydrogen sulfite', read: true },
  'oiv-oeno-46-2000': { title: 'OIV Oenological Codex, Oeno 46/2000, sulfur dioxide', read: true },
  'ifv-grid-2024': { title: 'IFV grid of oenological practices, 27/03/2024', read: true },
  'japan-ammonium': { title: 'Japanese specification, ammonium hydrogen sulfite water', read: true },
  'oiv-ii-1.12': { title: 'OIV Code of Oenological Practices II.1.12 and Oeno 7/2003', read: true },
  'campania-page': {
    title: 'agriculture press association of Campania, art. 29: aqueous SO2 in use 5 to 8 %',
    read: true,
  },
  'as-stated': { title: 'a figure as the person stated it', read: true },
  'oxygen-trade-figure': {
    title: 'trade figures of free SO2 lost to oxygen at bottling, not confirmed',
    read: false,
  },
  'reussir-vigne': { title: 'Réussir Vigne', read: true },
  'german-trade-text-2012': { title: 'a German trade text of 2012 on SO2 in must', read: true },
  'food-additives-data-book': {
    title: 'Food Additives Data Book, p. 780',
    read: true,
  },
  'encyclopedia-page': {
    title: 'an encyclopedia page',
    read: true,
  },
  'sodium-data-sheet': { title: 'a supplier data sheet of sodium metabisulfite', read: true },
  'us-24.246': { title: '27 CFR 24.246(a)(2), water used to dissolve additives (excerpt)', read: true },
  'icsc-sheets': { title: 'International Chemical Safety Cards 0074, 1134, 1175, 1254', read: true },
  'titration-general': {
    title:
      'SO2 in mg/L = mL × normality × 32 000 ÷ mL of sample (Italian university slides; Grapevine Magazine, Jan/Feb 2022, p. 14)',
    read: true,
  },
  'eec-2676-90-aeration': {
    title: 'Regulation (EEC) No 2676/90, consolidated 13.08.2005, sulphur dioxide (OIV-MA-AS323-04A)',
    read: true,
  },
  'oiv-as323-04a-repeatability': {
    title: 'OIV-MA-AS323-04A, repeatability of total SO2',
    read: false,
  },
  'oiv-as323-04b': { title: 'OIV-MA-AS323-04B, iodine titration', read: false },
  'iodine-equivalents': {
    title: 'one I2 takes up two electrons: N = 2 M (chemistry, no source needed)',
    read: true,
  },
  'bottle-study-quebec': {
    title: 'a Quebec wine site that reports a study: free SO2 left after three years in bottle',
    read: true,
  },
  'cfr-24-old-table': {
    title: 'an older table of wine treatments of 27 CFR (now 24.246 and 24.247, to be checked)',
    read: true,
  },
  'awri-tn06': { title: 'AWRI Technical Note TN06, hydrogen peroxide', read: true },
  'gallon-definitions': { title: 'NIST Handbook 44; UK Weights and Measures Act', read: false },
} as const satisfies Readonly<Record<string, Source>>;

/** The key of a source. */
export type SourceKey = keyof typeof SOURCES;
