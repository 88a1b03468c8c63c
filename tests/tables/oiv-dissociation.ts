/** OIV-MA-AS323-04C as it stands in the copy that was read, row by row of alcohol (% vol), columns 20 to 40 °C. */
export const OIV_TABLE_1_AS_READ = {
  source: 'OIV-MA-AS323-04C (type IV), Table I, pKT (read for 0 to 15 % vol; 20 % from memory)',
  rows: [
    { alcohol_percent: 0, from: 'read', pKT: [1.798, 2.0, 2.219, 2.334, 2.493] },
    { alcohol_percent: 5, from: 'read', pKT: [1.897, 2.098, 2.299, 2.397, 2.527] },
    { alcohol_percent: 10, from: 'read', pKT: [1.997, 2.198, 2.394, 2.488, 2.606] },
    { alcohol_percent: 15, from: 'read', pKT: [2.099, 2.301, 2.503, 2.607, 2.728] },
    { alcohol_percent: 20, from: 'from memory', pKT: [2.203, 2.406, 2.628, 2.754, 2.895] },
  ],
} as const;

/** From memory; the ionic step anchors it to the rows of Table I that were read. */
export const OIV_TABLE_2_RECALLED = {
  source: 'OIV-MA-AS323-04C, Table II, pKM at I = 0.038 (from memory)',
  rows: [
    { alcohol_percent: 0, pKM: [1.723, 1.925, 2.143, 2.257, 2.416] },
    { alcohol_percent: 5, pKM: [1.819, 2.02, 2.22, 2.317, 2.446] },
    { alcohol_percent: 10, pKM: [1.916, 2.116, 2.311, 2.405, 2.522] },
    { alcohol_percent: 15, pKM: [2.014, 2.216, 2.417, 2.52, 2.64] },
    { alcohol_percent: 20, pKM: [2.114, 2.317, 2.538, 2.663, 2.803] },
  ],
} as const;

/** From memory: the only cells of the printed Table III that were recalled (first row, 20 °C, pH 2.8). */
export const OIV_TABLE_3_FIRST_ROW = {
  source: 'OIV-MA-AS323-04C, Table III, first row as recalled (from memory)',
  ph: 2.8,
  temperature_C: 20,
  molecular_percent: [7.73, 9.46, 11.55, 14.07, 17.09],
} as const;

/** Cells of the printed Table III that are recalled as misprints (from memory, to be confirmed on a print). */
export const OIV_TABLE_3_MISPRINTS = {
  source: 'OIV-MA-AS323-04C, Table III (from memory)',
  rows: [
    { temperature_C: 25, ph: 2.8, alcohol_percent: 0, printed: 11.47, computed: 11.77 },
    { temperature_C: 25, ph: 2.9, alcohol_percent: 20, printed: 22.71, computed: 20.71 },
  ],
} as const;

/**
 * Constants of Debye and Hückel in water at 25 °C, A in (L/mol)^½ and B in (L/mol)^½ an ångström, and the permittivity
 * of water and of ethanol–water at the other points. The size of the ion is chosen so that the two tables meet.
 */
export const DEBYE_HUCKEL = {
  source: 'physical chemistry handbooks; permittivities of ethanol–water: Åkerlöf 1932 (all from memory)',
  at: { temperature_C: 25, permittivity: 78.3, A: 0.509, B_per_angstrom: 0.329 },
  ion_angstrom: 5,
  rows: [
    { alcohol_percent: 0, temperature_C: 20, permittivity: 80.1 },
    { alcohol_percent: 0, temperature_C: 25, permittivity: 78.3 },
    { alcohol_percent: 0, temperature_C: 30, permittivity: 76.6 },
    { alcohol_percent: 0, temperature_C: 40, permittivity: 73.2 },
    { alcohol_percent: 5, temperature_C: 20, permittivity: 77.8 },
    { alcohol_percent: 10, temperature_C: 20, permittivity: 75.5 },
    { alcohol_percent: 15, temperature_C: 20, permittivity: 73.2 },
  ],
} as const;

/** From memory, as handbooks tabulate it; at 25 °C it agrees with OIV Table I within 0.012 (computed). */
export const USSEGLIO_TOMASSET_25C = {
  source: 'Usseglio-Tomasset & Bosia 1984, column 25 °C, as tabulated in handbooks (from memory)',
  pK: [2.0, 2.11, 2.21, 2.31, 2.41],
} as const;
