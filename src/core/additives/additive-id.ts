/** The additives the project knows, by the names of the message language. */
export type AdditiveId =
  | 'potassium-metabisulfite'
  | 'sodium-metabisulfite'
  | 'potassium-metabisulfite-solution'
  | 'sodium-metabisulfite-solution'
  | 'potassium-bisulfite-solution'
  | 'ammonium-bisulfite-solution'
  | 'sulfur-dioxide-solution'
  | 'sulfur-dioxide-gas'
  | 'tablet';

/**
 * One additive as it stands in the cellar: which, and how strong.
 *
 * `strength_percent` means what the table "Strengths" of the message language says for that additive
 * (assay or SO2 yield of a powder, grams of salt or of SO2 per 100 mL of a solution);
 * `strength_of` says `salt` where the word salt stood beside a bisulfite solution.
 */
export interface AdditiveAtHand {
  readonly id: AdditiveId;
  readonly strength_percent?: number;
  readonly strength_of?: 'salt';
  /** Grams of SO2 that one effervescent tablet gives. */
  readonly tablet_SO2_g?: number;
  /** Grams of metabisulfite salt in one small plain tablet (Campden). */
  readonly tablet_salt_g?: number;
}
