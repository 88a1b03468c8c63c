/** SO2 shares and formula weights as published, in per cent by mass and g/mol. */
export const PUBLISHED_SHARES = [
  {
    source: 'JECFA 1999, FNP 52 Add 7, E 224 (read)',
    id: 'potassium-metabisulfite',
    formula_weight_g_mol: 222.33,
  },
  {
    source: 'USP 35-NF 30, potassium metabisulfite (read)',
    id: 'potassium-metabisulfite',
    formula_weight_g_mol: 222.33,
    SO2_percent: 57.6, // greatest content: the pure salt
  },
  {
    source: 'Food Additives Data Book, p. 780 (read)',
    id: 'potassium-metabisulfite',
    formula_weight_g_mol: 222.32,
    SO2_percent: 57.6,
  },
  {
    source: 'JECFA 1999, FNP 52 Add 7, E 223 (read)',
    id: 'sodium-metabisulfite',
    formula_weight_g_mol: 190.11,
  },
  {
    source: 'OIV Oenological Codex COEI-1-POTBIS (read)',
    id: 'potassium-bisulfite-solution',
    formula_weight_g_mol: 120.2,
    SO2_percent: 53.3,
  },
  {
    source: 'Japanese specification, ammonium hydrogen sulfite water (read)',
    id: 'ammonium-bisulfite-solution',
    formula_weight_g_mol: 99.11,
  },
] as const;

/** A salt of a stated assay and the SO2 that goes with it, both in per cent. */
export const PUBLISHED_ASSAYS = [
  {
    source: 'Austrian federal law, RIS no. 10010710, s. 3 (read; old text)',
    id: 'potassium-metabisulfite',
    assay_percent: 95,
    SO2_percent: 54.7,
  },
  {
    source: 'USP 35 lower limit 51.8 (read); the pairing with the assay of 90 of JECFA 1999 (read) is ours',
    id: 'potassium-metabisulfite',
    assay_percent: 90,
    SO2_percent: 51.8,
  },
  {
    source: 'Regulation (EU) No 231/2012, E 223 (from memory)',
    id: 'sodium-metabisulfite',
    assay_percent: 95,
    SO2_percent: 64,
  },
] as const;

/** Shares that cellars reckon with, and what they are per cent of (read). */
export const CONVENTIONS = [
  { source: 'Practical Winery & Vineyard, Jan 2014, p. 58 (read)', SO2_percent: 57.6 },
  { source: 'TU München-Weihenstephan, 5.3 (read)', SO2_percent: 57.5 },
  { source: 'Purdue workshop slides, 29 Apr 2011 (read)', SO2_percent: 58 },
  { source: 'German trade text 2012 (read)', SO2_percent: 50 },
] as const;

/** mg/L of the ion that 100 mg/L of SO2 brings along (computed from atomic weights). */
export const IONS_PER_100_mg_L = [
  { source: 'computed from IUPAC atomic weights', id: 'potassium-metabisulfite', element: 'K', mg_L: 61.0 },
  { source: 'computed from IUPAC atomic weights', id: 'sodium-metabisulfite', element: 'Na', mg_L: 35.9 },
  {
    source: 'computed from IUPAC atomic weights',
    id: 'ammonium-bisulfite-solution',
    element: 'N',
    mg_L: 21.9,
  },
] as const;
