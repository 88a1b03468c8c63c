import type { LimitFacts } from '../../src/core/limits/limit-facts.ts';

/** A wine on one side of a sugar or class boundary, the rule that holds, and SO2 on both sides of its figure, mg/L. */
export interface LimitCase {
  readonly rule: string;
  readonly facts: LimitFacts;
  readonly of?: 'free';
  /** The most that still passes, as the text has it … */
  readonly passes: number;
  /** … and what does not. */
  readonly fails: number;
}

/** Cases of one text. */
export interface LimitTable {
  readonly source: string;
  readonly cases: readonly LimitCase[];
}

const red = { style: 'red' } as const;
const white = { style: 'white' } as const;
const rosé = { style: 'rosé' } as const;

/** Limits typed from the texts, not from the program's own rows; a figure "at most" passes itself, "less than" does not. */
// prettier-ignore
export const SULFITE_LIMITS: readonly LimitTable[] = [
  {
    source: 'OIV-MA-C1-01 (Oeno 9/98), annex C, issue of 2019, read: 4 g/L of reducing substances is still dry',
    cases: [
      { rule: 'oiv-red-dry', facts: { ...red, sugar_g_L: 4 }, passes: 150, fails: 150.1 },
      { rule: 'oiv-any-sweet', facts: { ...red, sugar_g_L: 4.1 }, passes: 300, fails: 300.1 },
      { rule: 'oiv-wr-dry', facts: { ...white, sugar_g_L: 4 }, passes: 200, fails: 200.1 },
      { rule: 'oiv-wr-dry', facts: { ...rosé, sugar_g_L: 3.9 }, passes: 200, fails: 200.1 },
      { rule: 'oiv-any-sweet', facts: { ...rosé, sugar_g_L: 4.01 }, passes: 300, fails: 300.1 },
      { rule: 'oiv-special-sweet-white', facts: { ...white, sugar_g_L: 90, designated_mg_L: 400 }, passes: 400, fails: 400.1 },
    ],
  },
  {
    source: 'Delegated Regulation (EU) 2019/934, Annex I Part B, read: glucose and fructose below 5 g/L, or not less; A.4 up to 50 in declared years, C.2 up to 40 for sparkling',
    cases: [
      { rule: 'eu-red-dry', facts: { region: 'eu', ...red, sugar_g_L: 4.99 }, passes: 150, fails: 150.1 },
      { rule: 'eu-red-5', facts: { region: 'eu', ...red, sugar_g_L: 5 }, passes: 200, fails: 200.1 },
      { rule: 'eu-wr-dry', facts: { region: 'eu', ...white, sugar_g_L: 4.99 }, passes: 200, fails: 200.1 },
      { rule: 'eu-wr-5', facts: { region: 'eu', ...rosé, sugar_g_L: 5 }, passes: 250, fails: 250.1 },
      { rule: 'eu-wr-5', facts: { region: 'eu', ...white, sugar_g_L: 60 }, passes: 250, fails: 250.1 },
      { rule: 'eu-wr-5', facts: { region: 'eu', ...white, sugar_g_L: 5, uplift: true }, passes: 300, fails: 300.1 },
      { rule: 'eu-red-dry', facts: { region: 'eu', ...red, sugar_g_L: 2, uplift: true }, passes: 200, fails: 200.1 },
      { rule: 'eu-desig-300', facts: { region: 'eu', ...white, sugar_g_L: 60, designated_mg_L: 300 }, passes: 300, fails: 300.1 },
      { rule: 'eu-desig-300', facts: { region: 'eu', ...white, sugar_g_L: 60, designated_mg_L: 300, uplift: true }, passes: 300, fails: 300.1 },
      { rule: 'eu-liq-dry', facts: { region: 'eu', category: 'fortified', sugar_g_L: 4.99 }, passes: 150, fails: 150.1 },
      { rule: 'eu-liq-5', facts: { region: 'eu', category: 'fortified', sugar_g_L: 5 }, passes: 200, fails: 200.1 },
      { rule: 'eu-qsp', facts: { region: 'eu', ...red, category: 'sparkling', quality: true }, passes: 185, fails: 185.1 },
      { rule: 'eu-qsp', facts: { region: 'eu', ...white, category: 'sparkling' }, passes: 185, fails: 185.1 },
      { rule: 'eu-sp', facts: { region: 'eu', ...white, category: 'sparkling', quality: false }, passes: 235, fails: 235.1 },
      { rule: 'eu-qsp', facts: { region: 'eu', category: 'sparkling', quality: true, uplift: true }, passes: 225, fails: 225.1 },
    ],
  },
  {
    source: 'Regulation (EC) 1333/2008, Annex II Part E, 14.2.2, read in a copy of the list',
    cases: [{ rule: 'eu-dealc', facts: { region: 'eu', product: 'alcohol-free' }, passes: 200, fails: 200.1 }],
  },
  {
    source: 'Regulation (EC) 889/2008, Annex VIIIa point 7 (by 203/2012), read: 100 and 150 below 2 g/L, else the limit of the general rules less 30',
    cases: [
      { rule: 'euorg-red-lt2', facts: { region: 'eu', organic: true, ...red, sugar_g_L: 1.99 }, passes: 100, fails: 100.1 },
      { rule: 'euorg-red-2to5', facts: { region: 'eu', organic: true, ...red, sugar_g_L: 2 }, passes: 120, fails: 120.1 },
      { rule: 'euorg-red-5', facts: { region: 'eu', organic: true, ...red, sugar_g_L: 5 }, passes: 170, fails: 170.1 },
      { rule: 'euorg-wr-lt2', facts: { region: 'eu', organic: true, ...white, sugar_g_L: 1.99 }, passes: 150, fails: 150.1 },
      { rule: 'euorg-wr-2to5', facts: { region: 'eu', organic: true, ...white, sugar_g_L: 2 }, passes: 170, fails: 170.1 },
      { rule: 'euorg-wr-2to5', facts: { region: 'eu', organic: true, ...rosé, sugar_g_L: 4.99 }, passes: 170, fails: 170.1 },
      { rule: 'euorg-wr-5', facts: { region: 'eu', organic: true, ...rosé, sugar_g_L: 5 }, passes: 220, fails: 220.1 },
      { rule: 'euorg-desig-300', facts: { region: 'eu', organic: true, ...white, sugar_g_L: 80, designated_mg_L: 300 }, passes: 270, fails: 270.1 },
      { rule: 'euorg-liq-dry', facts: { region: 'eu', organic: true, category: 'fortified', sugar_g_L: 4.9 }, passes: 120, fails: 120.1 },
      { rule: 'euorg-liq-5', facts: { region: 'eu', organic: true, category: 'fortified', sugar_g_L: 5 }, passes: 170, fails: 170.1 },
      { rule: 'euorg-qsp', facts: { region: 'eu', organic: true, category: 'sparkling', quality: true }, passes: 155, fails: 155.1 },
      { rule: 'euorg-sp', facts: { region: 'eu', organic: true, category: 'sparkling', quality: false }, passes: 205, fails: 205.1 },
    ],
  },
  {
    source: 'assimilated Regulation (EU) 2019/934 (UK), Annex I Part B, point in time 15.7.2024, read',
    cases: [
      { rule: 'uk-red-dry', facts: { region: 'uk', ...red, sugar_g_L: 4.99 }, passes: 150, fails: 150.1 },
      { rule: 'uk-red-5', facts: { region: 'uk', ...red, sugar_g_L: 5 }, passes: 200, fails: 200.1 },
      { rule: 'uk-wr-dry', facts: { region: 'uk', ...white, sugar_g_L: 4.99 }, passes: 200, fails: 200.1 },
      { rule: 'uk-wr-5', facts: { region: 'uk', ...white, sugar_g_L: 5 }, passes: 250, fails: 250.1 },
      { rule: 'uk-wr-5', facts: { region: 'uk', ...white, sugar_g_L: 45, designated_mg_L: 300 }, passes: 250, fails: 250.1 },
      { rule: 'uk-origin-45', facts: { region: 'uk', ...white, sugar_g_L: 45.1, designated_mg_L: 300 }, passes: 300, fails: 300.1 },
    ],
  },
  {
    source: 'Wine Regulations 2011 (SI 2011/2936), Schedule 2 paragraph 3, read: less than 45 and more than 45 g/L, free 45 dry and 60 other',
    cases: [
      { rule: 'ukpdo-tot-red-dry', facts: { region: 'uk', pdo: true, ...red, sugar_g_L: 4.9 }, passes: 150, fails: 150.1 },
      { rule: 'ukpdo-tot-red-5', facts: { region: 'uk', pdo: true, ...red, sugar_g_L: 5 }, passes: 200, fails: 200.1 },
      { rule: 'ukpdo-tot-wr-dry', facts: { region: 'uk', pdo: true, ...white, sugar_g_L: 4.9 }, passes: 200, fails: 200.1 },
      { rule: 'ukpdo-tot-wr-5', facts: { region: 'uk', pdo: true, ...white, sugar_g_L: 44.9 }, passes: 250, fails: 250.1 },
      { rule: 'ukpdo-tot-wr-5', facts: { region: 'uk', pdo: true, ...white, sugar_g_L: 45 }, passes: 250, fails: 250.1 },
      { rule: 'ukpdo-tot-gt45', facts: { region: 'uk', pdo: true, ...white, sugar_g_L: 45.1 }, passes: 300, fails: 300.1 },
      { rule: 'ukpdo-free-dry', facts: { region: 'uk', pdo: true, ...white, sugar_g_L: 3 }, of: 'free', passes: 45, fails: 46 },
      { rule: 'ukpdo-free-other', facts: { region: 'uk', pdo: true, ...white, sugar_g_L: 30 }, of: 'free', passes: 60, fails: 61 },
    ],
  },
  {
    source: 'assimilated Regulation (EC) 889/2008 (UK), Annex VIIIa point 7, as at 31.1.2020, read',
    cases: [
      { rule: 'ukorg-red-lt2', facts: { region: 'uk', organic: true, ...red, sugar_g_L: 1.9 }, passes: 100, fails: 100.1 },
      { rule: 'ukorg-red-2to5', facts: { region: 'uk', organic: true, ...red, sugar_g_L: 2 }, passes: 120, fails: 120.1 },
      { rule: 'ukorg-red-5', facts: { region: 'uk', organic: true, ...red, sugar_g_L: 5 }, passes: 170, fails: 170.1 },
      { rule: 'ukorg-wr-lt2', facts: { region: 'uk', organic: true, ...white, sugar_g_L: 1.9 }, passes: 150, fails: 150.1 },
      { rule: 'ukorg-wr-2to5', facts: { region: 'uk', organic: true, ...white, sugar_g_L: 2 }, passes: 170, fails: 170.1 },
      { rule: 'ukorg-wr-5', facts: { region: 'uk', organic: true, ...white, sugar_g_L: 5 }, passes: 220, fails: 220.1 },
    ],
  },
  {
    source: '27 CFR 4.22(b)(1), CFR revised 1.4.2004, read: not more than 350 in finished wine, all classes',
    cases: [
      { rule: 'us-wine', facts: { region: 'us', ...red, sugar_g_L: 2 }, passes: 350, fails: 351 },
      { rule: 'us-wine', facts: { region: 'us', category: 'sparkling' }, passes: 350, fails: 351 },
      { rule: 'us-wine', facts: { region: 'us', category: 'fortified' }, passes: 350, fails: 351 },
    ],
  },
  {
    source: 'Quebec, S-13, r. 4, s. 16(3), 27.9.2023, read: 70 free, 420 combined',
    cases: [
      { rule: 'caqc-cider-comb', facts: { region: 'ca-qc', product: 'cider' }, passes: 420, fails: 420.1 },
      { rule: 'caqc-cider-free', facts: { region: 'ca-qc', product: 'cider' }, of: 'free', passes: 70, fails: 70.1 },
    ],
  },
  {
    source: 'page of the national wine agency on Standard 4.5.1, read; exactly 35 g/L by the clause, from memory',
    cases: [
      { rule: 'au-lt35', facts: { region: 'au', ...white, sugar_g_L: 34.9 }, passes: 250, fails: 250.1 },
      { rule: 'au-ge35', facts: { region: 'au', ...white, sugar_g_L: 35 }, passes: 300, fails: 300.1 },
      { rule: 'au-ge35', facts: { region: 'au', category: 'fortified', sugar_g_L: 35.1 }, passes: 300, fails: 300.1 },
    ],
  },
  {
    source: 'market sheet South Africa of another country’s wine institute, undated, read',
    cases: [
      { rule: 'za-total', facts: { region: 'za', ...red }, passes: 200, fails: 200.1 },
      { rule: 'za-free-bottled', facts: { region: 'za', ...red }, of: 'free', passes: 60, fails: 60.1 },
      { rule: 'za-free-bulk', facts: { region: 'za', ...red, bulk: true }, of: 'free', passes: 40, fails: 40.1 },
    ],
  },
  {
    source: 'market sheet Argentina of another country’s wine institute, undated, read: dry and sweet without a figure',
    cases: [
      { rule: 'ar-red-dry', facts: { region: 'ar', ...red }, passes: 130, fails: 130.1 },
      { rule: 'ar-wr-dry', facts: { region: 'ar', ...white }, passes: 180, fails: 180.1 },
      { rule: 'ar-red-sweet', facts: { region: 'ar', ...red, category: 'sweet' }, passes: 180, fails: 180.1 },
      { rule: 'ar-wr-sweet', facts: { region: 'ar', ...white, category: 'sweet' }, passes: 210, fails: 210.1 },
    ],
  },
  {
    source: 'country sheet Chile of a trade association’s legal service, undated, read',
    cases: [
      { rule: 'cl-total', facts: { region: 'cl', ...red }, passes: 250, fails: 250.1 },
      { rule: 'cl-total', facts: { region: 'cl', ...white, sugar_g_L: 60 }, passes: 250, fails: 250.1 },
      { rule: 'cl-total-sweet', facts: { region: 'cl', ...white, sugar_g_L: 60, designated_mg_L: 400 }, passes: 400, fails: 400.1 },
      { rule: 'cl-free', facts: { region: 'cl', category: 'sparkling' }, of: 'free', passes: 75, fails: 75.1 },
      { rule: 'cl-free-sweet', facts: { region: 'cl', ...white, sugar_g_L: 60, designated_mg_L: 400 }, of: 'free', passes: 100, fails: 100.1 },
    ],
  },
  {
    source: 'Japanese use standard for sulfites, ministry paper of 2003, read: 0.35 g or more per kg must not remain (other liquors 0.030 g); mg/L = g/kg × 1000 × kg/L',
    cases: [
      { rule: 'jp-wine', facts: { region: 'jp', ...red, density_kg_L: 1 }, passes: 349.9, fails: 350 },
      { rule: 'jp-wine', facts: { region: 'jp', ...red, density_kg_L: 0.995 }, passes: 348.2, fails: 348.25 },
      { rule: 'jp-wine', facts: { region: 'jp', category: 'fortified', density_kg_L: 1.08 }, passes: 377.9, fails: 378 },
      { rule: 'jp-wine', facts: { region: 'jp', ...white }, passes: 346.4, fails: 346.5 },
      { rule: 'jp-other-liq', facts: { region: 'jp', product: 'mead', density_kg_L: 1 }, passes: 29.9, fails: 30 },
    ],
  },
  {
    source: 'Korean food ministry, page of 22.8.2024, read: less than 0.350 g/kg; notice of 27.9.2023 (press report, read): less than 0.20 g/kg',
    cases: [
      { rule: 'kr-wine', facts: { region: 'kr', ...red, density_kg_L: 1 }, passes: 349.9, fails: 350 },
      { rule: 'kr-wine', facts: { region: 'kr', ...white }, passes: 346.4, fails: 346.5 },
      { rule: 'kr-na', facts: { region: 'kr', product: 'alcohol-free', density_kg_L: 1 }, passes: 199.9, fails: 200 },
    ],
  },
  {
    source: 'GB 2760, table A.1, read in a copy: 0.25 g/L, sweet wine 0.4 g/L; sweet above 45 g/L by GB/T 15037-2006 (secondary)',
    cases: [
      { rule: 'cn-wine', facts: { region: 'cn', ...red }, passes: 250, fails: 250.1 },
      { rule: 'cn-wine', facts: { region: 'cn', ...white, sugar_g_L: 45 }, passes: 250, fails: 250.1 },
      { rule: 'cn-sweet', facts: { region: 'cn', ...white, sugar_g_L: 45.1 }, passes: 400, fails: 400.1 },
    ],
  },
  {
    source: 'Codex GSFA, CXS 192-1995, 14.2.3, notes 44 and 103, read: mg/kg',
    cases: [
      { rule: 'codex-wine', facts: { region: 'codex', ...red, density_kg_L: 1 }, passes: 350, fails: 350.1 },
      { rule: 'codex-wine', facts: { region: 'codex', ...white, density_kg_L: 0.992 }, passes: 347.2, fails: 349 },
      { rule: 'codex-white', facts: { region: 'codex', ...white, designated_mg_L: 400, density_kg_L: 1.02 }, passes: 408, fails: 408.1 },
    ],
  },
  {
    source: 'Swiss federal list of permitted practices, undated, read: the annexes of (EU) 2019/934',
    cases: [
      { rule: 'ch-1', facts: { region: 'ch', ...red, sugar_g_L: 4.99 }, passes: 150, fails: 150.1 },
      { rule: 'ch-2', facts: { region: 'ch', ...white, sugar_g_L: 4.99 }, passes: 200, fails: 200.1 },
      { rule: 'ch-3', facts: { region: 'ch', ...red, sugar_g_L: 5 }, passes: 200, fails: 200.1 },
      { rule: 'ch-4', facts: { region: 'ch', ...white, sugar_g_L: 5 }, passes: 250, fails: 250.1 },
      { rule: 'ch-5', facts: { region: 'ch', category: 'fortified', sugar_g_L: 4.99 }, passes: 150, fails: 150.1 },
      { rule: 'ch-6', facts: { region: 'ch', category: 'fortified', sugar_g_L: 5 }, passes: 200, fails: 200.1 },
      { rule: 'ch-7', facts: { region: 'ch', category: 'sparkling', quality: true }, passes: 185, fails: 185.1 },
      { rule: 'ch-8', facts: { region: 'ch', category: 'sparkling', quality: false }, passes: 235, fails: 235.1 },
    ],
  },
  {
    source: 'country sheet Georgia of a trade association’s legal service, undated, read: below 5 and more than 5 g/L',
    cases: [
      { rule: 'ge-red-dry', facts: { region: 'ge', ...red, sugar_g_L: 4.99 }, passes: 160, fails: 160.1 },
      { rule: 'ge-red-dry', facts: { region: 'ge', ...red, sugar_g_L: 5 }, passes: 160, fails: 160.1 },
      { rule: 'ge-red-5', facts: { region: 'ge', ...red, sugar_g_L: 5.1 }, passes: 210, fails: 210.1 },
      { rule: 'ge-wr-dry', facts: { region: 'ge', ...white, sugar_g_L: 4.99 }, passes: 210, fails: 210.1 },
      { rule: 'ge-wr-5', facts: { region: 'ge', ...white, sugar_g_L: 5.1 }, passes: 260, fails: 260.1 },
      { rule: 'ge-free', facts: { region: 'ge', ...red }, of: 'free', passes: 30, fails: 30.1 },
    ],
  },
];
