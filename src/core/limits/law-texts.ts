/** A text of the law, or what tells of it. */
export interface LawText {
  readonly name: string;
}

/**
 * The texts that limits rest on, by key, in own words.
 *
 * @example
 * ```ts
 * LAW_TEXTS.oiv.name // => 'OIV Compendium, OIV-MA-C1-01 (Oeno 9/98), annex C'
 * ```
 */
export const LAW_TEXTS = {
  oiv: { name: 'OIV Compendium, OIV-MA-C1-01 (Oeno 9/98), annex C' },
  eu: { name: 'Delegated Regulation (EU) 2019/934, Annex I Part B' },
  'eu-additives': { name: 'Regulation (EC) 1333/2008, Annex II Part E' },
  'eu-organic': { name: 'Regulation (EC) 889/2008, Annex VIIIa (by 203/2012)' },
  'eu-organic-other': { name: 'Implementing Regulation (EU) 2021/1165, Annex V Part A' },
  uk: { name: 'assimilated Delegated Regulation (EU) 2019/934 (UK), Annex I Part B' },
  'uk-pdo': { name: 'Wine Regulations 2011 (SI 2011/2936), Schedule 2' },
  'uk-organic': { name: 'assimilated Regulation (EC) 889/2008 (UK), Annex VIIIa' },
  us: { name: '27 CFR part 4' },
  'us-organic': { name: '7 CFR part 205 (National Organic Program)' },
  'ca-repealed': { name: 'Food and Drug Regulations (Canada), C.R.C. c. 870' },
  ca: { name: 'List of Permitted Preservatives (Canada)' },
  'ca-qc-cider': { name: 'Quebec regulation on cider and other apple drinks, S-13, r. 4' },
  'ca-organic': { name: 'CAN/CGSB-32.311 (Canada organic, permitted substances)' },
  au: { name: 'Food Standards Code, Standard 4.5.1 (Australia only)' },
  nz: { name: 'Food Standards Code, Schedule 15 with Standard 1.3.1' },
  'za-sheet': { name: 'market sheet South Africa, citing the rules under Act 60 of 1989' },
  za: { name: 'Regulations GN R1433/1990 under the Liquor Products Act 60 of 1989' },
  'ar-sheet': { name: 'market sheet Argentina, citing Law 14.878 and INV rules' },
  'cl-sheet': { name: 'country sheet Chile, citing Decree 78/1986 under Law 18.455' },
  cl: { name: 'Decree 78/1986 under Law 18.455 (Chile)' },
  mercosur: { name: 'GMC Resolution 45/96 (Mercosur)' },
  br: { name: 'ANVISA RDC 123/2016, now IN 211/2023' },
  uy: { name: 'national food regulation (Uruguay), Decree 315/994' },
  jp: { name: 'Japanese standards for food additives, sulfites' },
  'jp-sheet': { name: 'market sheet Japan' },
  cn: { name: 'GB 2760 (China), table A.1' },
  in: { name: 'Alcoholic Beverages Regulations 2018 (India)' },
  kr: { name: 'Food Additives Code (Korea), sulfites' },
  'kr-sheet': { name: 'country sheet Korea' },
  hk: { name: 'Preservatives in Food Regulation, Cap. 132BD (Hong Kong)' },
  codex: { name: 'Codex GSFA, CXS 192-1995, sulfites' },
  ch: { name: 'Ordinance on beverages (SR 817.022.12), by reference to (EU) 2019/934' },
  'ge-sheet': { name: 'country sheet Georgia' },
  md: { name: 'Government Decision 356 of 2015 (Moldova)' },
  eaeu: { name: 'TR TS 029/2012 (Eurasian union)' },
} as const satisfies Readonly<Record<string, LawText>>;

/** The key of a text. */
export type LawTextKey = keyof typeof LAW_TEXTS;
