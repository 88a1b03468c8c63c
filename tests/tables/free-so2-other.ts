/** Free-SO2 tables of other hands, each with the constant that it rests on. All READ. */
export const ASSOCIATION = {
  source:
    'Vancouver amateur winemakers’ association, free SO2 as a function of pH and molecular SO2 (read, two copies agree)',
  pK: 1.77,
  /** pH, free SO2 in mg/L for 0.8 and for 2.0 mg/L molecular. */
  rows: [
    [2.8, 9, 23],
    [2.9, 12, 29],
    [3.0, 14, 36],
    [3.1, 18, 45],
    [3.2, 22, 56],
    [3.3, 28, 70],
    [3.4, 35, 87],
    [3.5, 44, 109],
    [3.6, 55, 137],
    [3.7, 69, 172],
    [3.8, 87, 216],
    [3.9, 109, 272],
    [4.0, 137, 342],
    [4.1, 172, 430],
    [4.2, 216, 540],
  ],
} as const;

/** READ. Rounded by its author; pK 1.80 gives every row within 10 %. */
export const SWEET_WHITES = {
  source: 'French-language page (Switzerland), author not named: free SO2 for 1.5 mg/L active (read)',
  pK: 1.8,
  /** pH, free SO2 in mg/L for 1.5 mg/L molecular. */
  rows: [
    [2.8, 15],
    [3.0, 25],
    [3.2, 40],
    [3.4, 64],
    [3.6, 100],
    [3.8, 150],
  ],
} as const;

/**
 * READ. A check of the arithmetic, no basis for a dose: the page carries a second constant of 5e-6, which is a
 * misprint or another definition (the accepted one is about 6e-8).
 */
export const TWO_CONSTANTS = {
  source: 'mead-making page computing from K1 = 1.7e-2, K2 = 5e-6 (quoting Amerine, p. 202) (read)',
  K1_mol_L: 1.7e-2,
  K2_mol_L: 5e-6,
  /** pH, per cent active, free SO2 in mg/L for 10 mg/L active. */
  rows: [
    [3.0, 5.52, 181],
    [3.2, 3.55, 282],
    [3.4, 2.26, 442],
    [3.6, 1.43, 700],
    [3.8, 0.9, 1116],
    [4.0, 0.56, 1795],
    [4.2, 0.34, 2918],
  ],
} as const;

/** READ. Follows pK 1.77. */
export const VIRGINIA = {
  source: 'Virginia research-exchange note on SO2 chemistry (citing Handbook of Enology) (read)',
  pK: 1.77,
  rows: [
    { ph: 3.0, molecular_percent: 5.6, decimals: 1 },
    { ph: 4.0, molecular_percent: 0.585, decimals: 3 },
  ],
} as const;

/** READ. The dosage charts by alcohol could not be read; these sentences could. */
export const HIGH_PH = {
  source: 'Purdue Extension FS-52-W, Use of SO2 in High-pH Wines (read, two copies)',
  ph: 3.95,
  free_range_mg_L: [79, 112],
  /** With a target of 0.8 mg/L the ends of that range imply these constants (computed). */
  implied_pK: [1.96, 1.81],
  needAt4: { timesNeedAt3: 10 },
} as const;
