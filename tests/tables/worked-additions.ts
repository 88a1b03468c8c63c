/** Worked cases and rows of tables, with the answer that is printed. `off` where the print itself is known to be off. */
export const WORKED_ADDITIONS = [
  {
    source:
      'L01: Purdue Wine Grape Team, Winemaking Calculations, 29 Apr 2011 (read; a later slide repeats 423 g, a misprint)',
    volume: { value: 1000, unit: 'galUS' },
    add_mg_L: 65,
    additive: { id: 'potassium-metabisulfite', strength_percent: 100 / 1.7 },
    mass_g: 418,
    within: 0.002, // it takes 3.785 L and 1.7
    exact_mass_g: 427.0, // with the exact share
  },
  {
    source: 'L02: DLR Rheinpfalz, note on bisulfite solutions (read; printed 550 for 555.6)',
    volume: { value: 1000, unit: 'L' },
    add_mg_L: 100,
    additive: { id: 'potassium-bisulfite-solution', strength_percent: 18 },
    additive_volume_mL: 550,
    within: 0.0105,
  },
  {
    source: 'L13: German trade text 2012 (read, not citable)',
    volume: { value: 1, unit: 'hL' },
    add_mg_L: 50,
    additive: { id: 'potassium-metabisulfite', strength_percent: 50 },
    mass_g: 10,
    within: 1e-9,
  },
  {
    source: 'L14: Colorado State University handout (read; the whole table is 2.5 % low in additive)',
    volume: { value: 1, unit: 'galUS' },
    add_mg_L: 30,
    additive: { id: 'potassium-metabisulfite' },
    mass_g: 0.1921,
    within: 0.026,
  },
  {
    source: 'L15: Colorado State University handout (read; the whole table is 2.5 % low in additive)',
    volume: { value: 1, unit: 'galUS' },
    add_mg_L: 50,
    additive: { id: 'potassium-metabisulfite' },
    mass_g: 0.3202,
    within: 0.026,
  },
  {
    source: 'L16: Colorado State University handout (read; the whole table is 2.5 % low in additive)',
    volume: { value: 1, unit: 'galUS' },
    add_mg_L: 100,
    additive: { id: 'potassium-metabisulfite' },
    mass_g: 0.6404,
    within: 0.026,
  },
  {
    source: 'L17: handout on bench trials, author not named (read, not citable)',
    volume: { value: 1000, unit: 'galUS' },
    add_mg_L: 100,
    additive: { id: 'potassium-metabisulfite', strength_percent: 50 },
    mass_g: 757,
    within: 0.001,
  },
  {
    source: 'L18: handout on bench trials, author not named (read, not citable)',
    volume: { value: 60, unit: 'galUS' },
    add_mg_L: 100,
    additive: { id: 'potassium-metabisulfite', strength_percent: 50 },
    mass_g: 45.4,
    within: 0.001,
  },
  {
    source: 'L19: handout on bench trials, author not named (read, not citable; 5 % counted as SO2)',
    volume: { value: 1, unit: 'galUS' },
    add_mg_L: 100,
    additive: { id: 'sulfur-dioxide-solution', strength_percent: 5 },
    additive_volume_mL: 7.6,
    within: 0.005,
  },
  {
    source: 'L20: handout on bench trials, author not named (read, not citable)',
    volume: { value: 1, unit: 'galUS' },
    add_mg_L: 100,
    additive: { id: 'sulfur-dioxide-solution', strength_percent: 6 },
    additive_volume_mL: 6.3,
    within: 0.005,
  },
] as const;

/** L27: with a third of the addition binding. */
export const BINDING_CASE = {
  source: 'L27: Central Texas wine guild article, SO2 addition advice (read)',
  free_mg_L: 10,
  target_free_mg_L: 30,
  binding_share: 1 / 3,
  dose_mg_L: 30,
} as const;

/** L03: sulphur burnt in a barrel. The sulphur's mass is the oxygen's: 10 g of oxygen take 10 g of sulphur. */
export const BURNT_SULPHUR = {
  source: 'L03: TU München-Weihenstephan, 5.3 Schwefelung (read)',
  barrel_L: 100,
  O2_g: 10,
  SO2_g: 20,
  SO2_mg_L: 200,
  in_wine_share: 0.5,
  in_wine_mg_L: 100,
} as const;

/** Titration factors: mg/L of SO2 = mL × normality × 32,030 ÷ mL of sample (32.03 mg an equivalent). */
export const TITRATIONS = [
  {
    source: 'L04: The Grapevine Magazine, Jan/Feb 2022, p. 14 (read)',
    titrant_mL: 2.3,
    normality: 0.01,
    sample_mL: 20,
    SO2_mg_L: 36.8,
  },
  {
    source: 'L08: Regulation (EEC) No 2676/90, 2.2.3.2.1 (read)',
    titrant_mL: 1,
    normality: 0.01,
    sample_mL: 50,
    SO2_mg_L: 6.4,
  },
  {
    source: 'L09: laboratory notes page (read, not citable)',
    titrant_mL: 1,
    normality: 0.01,
    sample_mL: 20,
    SO2_mg_L: 16,
  },
] as const;

/** L05: mg of SO2 that 1 mL of 0.1 N iodine takes. */
export const IODINE_FACTOR = { source: 'L05: JECFA 1999, method of assay (read)', SO2_mg: 3.203 } as const;

/** L06, L07: grams of KHSO3 in a litre and the SO2 that they are. */
export const BISULFITE_SOLUTIONS = [
  { source: 'L06: OIV Oenological Codex COEI-1-POTBIS (read)', KHSO3_g_L: 281, SO2_g_L: 150 },
  { source: 'L07: OIV Oenological Codex COEI-1-POTBIS (read)', KHSO3_g_L: 375, SO2_g_L: 200 },
] as const;

/** L28: grams of powder for 10 g of SO2, in practice (read; implies a yield of 55.6 %; exact 17.35 g). */
export const PRACTICAL_YIELD = {
  source: 'L28: agriculture press association of Campania, art. 29 (read, not citable)',
  SO2_g: 10,
  powder_g: 18,
  exact_powder_g: 17.35,
} as const;
