import type { Titration } from '../../src/core/laboratory/titration.ts';

/** A printed factor or worked titration; `within` is the half of the last digit that the source prints, or as said. */
interface TitrationRow {
  readonly source: string;
  readonly titration: Titration;
  readonly printed_mg_L: number;
  readonly within_mg_L: number;
}

const aeration = { method: 'aeration', of: 'free' } as const;

export const TITRATIONS: readonly TitrationRow[] = [
  {
    source: 'The Grapevine Magazine, Jan/Feb 2022, p. 14: 2.3 mL of 0.01 N, 20 mL sample (read)',
    titration: { ...aeration, sample_mL: 20, titrant_mL: 2.3, titrant: { strength: 0.01, unit: 'N' } },
    printed_mg_L: 36.8,
    within_mg_L: 0.05,
  },
  {
    source: 'Regulation (EEC) No 2676/90, 2.2.3.2.1: 6.4 n with 0.01 M NaOH and 50 mL (read)',
    titration: { ...aeration, sample_mL: 50, titrant_mL: 1, titrant: { strength: 0.01, unit: 'M' } },
    printed_mg_L: 6.4,
    within_mg_L: 0.05,
  },
  {
    source: 'laboratory notes page, aeration: 16 mg/L per mL with 0.01 M and 20 mL (read, not citable)',
    titration: { ...aeration, sample_mL: 20, titrant_mL: 1, titrant: { strength: 0.01, unit: 'M' } },
    printed_mg_L: 16,
    within_mg_L: 0.5,
  },
  {
    source: 'JECFA 1999, method of assay: 1 mL of 0.1 N iodine is 3.203 mg SO2 (read); here in 1000 mL',
    titration: {
      method: 'iodine',
      of: 'free',
      sample_mL: 1000,
      titrant_mL: 1,
      titrant: { strength: 0.1, unit: 'N' },
    },
    // The methods of wine print 32 g an equivalent where the assay has 32.03: 0.1 % apart.
    printed_mg_L: 3.203,
    within_mg_L: 0.0033,
  },
  {
    source: 'OIV-MA-AS323-04B: 32 n with 0.025 M iodine and 50 mL (from memory)',
    titration: {
      method: 'iodine',
      of: 'total',
      sample_mL: 50,
      titrant_mL: 1,
      titrant: { strength: 0.025, unit: 'M' },
    },
    printed_mg_L: 32,
    within_mg_L: 0.5,
  },
  {
    source:
      'an amateur club’s procedure: 27.8 mg KIO3 in 500 mL, 10 mL wine, 5 mg/L per mL (read, not citable)',
    titration: {
      method: 'iodine',
      of: 'free',
      sample_mL: 10,
      titrant_mL: 1,
      titrant: { iodate_mg: 27.8, flask_mL: 500 },
    },
    printed_mg_L: 5,
    within_mg_L: 0.5,
  },
];
