/** A titration as a message tells it; volumes in mL, ascorbic acid in mg/L. What is not told is absent. */
export interface SaidTitration {
  readonly method?: 'aeration' | 'iodine';
  /** Unsaid it is free SO2, and the reply says so. */
  readonly of?: 'free' | 'total';
  readonly sample_mL?: number;
  readonly titrant_mL?: number;
  readonly blank_mL?: number;
  /** Iodine without N or M is asked about: one is twice the other. */
  readonly titrant?:
    | {
        /** In the unit beside it. */
        readonly strength: number;
        readonly unit?: 'N' | 'M';
      }
    | { readonly iodate_mg: number; readonly flask_mL: number };
  readonly ascorbic_mg_L?: number;
}
