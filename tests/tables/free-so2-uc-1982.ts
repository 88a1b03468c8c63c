/** One row of the table: per cent of free SO2 as molecular, and free SO2 (mg/L) for 0.8 and 0.5 mg/L molecular. */
export interface UcRow {
  readonly ph: number;
  readonly molecular_percent: number;
  readonly free_for_0_8_mg_L: number;
  readonly free_for_0_5_mg_L: number;
}

const row = (ph: number, percent: number, free_for_0_8_mg_L: number, free_for_0_5_mg_L: number): UcRow => ({
  ph,
  molecular_percent: percent,
  free_for_0_8_mg_L,
  free_for_0_5_mg_L,
});

/** READ. The table holds two constants: its whole steps follow pK 1.81, its half steps pK 1.80. */
export const UC_1982 = {
  source:
    'University of California Cooperative Extension, Enology Briefs I (1), Feb/Mar 1982, as adapted in a laboratory handout (read; the 11 at pH 2.90 is cut to 1 in that copy and stands in all sister tables)',
  wholeSteps: {
    pK: 1.81,
    rows: [
      row(2.9, 7.5, 11, 7),
      row(3.0, 6.1, 13, 8),
      row(3.1, 4.9, 16, 10),
      row(3.2, 3.9, 21, 13),
      row(3.3, 3.1, 26, 16),
      row(3.4, 2.5, 32, 20),
      row(3.5, 2.0, 40, 25),
      row(3.6, 1.6, 50, 31),
      row(3.7, 1.3, 63, 39),
      row(3.8, 1.0, 79, 49),
      row(3.9, 0.8, 99, 62),
      row(4.0, 0.7, 125, 78),
    ],
  },
  halfSteps: {
    pK: 1.8,
    rows: [
      row(2.95, 6.6, 12, 7),
      row(3.05, 5.3, 15, 9),
      row(3.15, 4.3, 19, 12),
      row(3.25, 3.4, 23, 15),
      row(3.35, 2.7, 29, 18),
      row(3.45, 2.2, 37, 23),
      row(3.55, 1.8, 46, 29),
      row(3.65, 1.4, 57, 36),
      row(3.75, 1.1, 72, 45),
      row(3.85, 0.9, 91, 57),
      row(3.95, 0.7, 114, 71),
    ],
  },
  /** Four of the 69 cells do not follow the constant of their row: misprints or slips of rounding. */
  misprints: [
    { ph: 3.2, cell: 'free_for_0_8_mg_L', printed: 21, computed: 20.4 },
    { ph: 2.95, cell: 'free_for_0_5_mg_L', printed: 7, computed: 7.56 },
    { ph: 3.55, cell: 'molecular_percent', printed: 1.8, computed: 1.747 },
    { ph: 4.0, cell: 'molecular_percent', printed: 0.7, computed: 0.642 },
  ],
} as const;
