/** A text of the law, or what tells of it. */
export interface LawText {
  readonly name: string;
}

/**
 * The texts that limits rest on, by key, in own words.
 *
 * @example
 * ```ts
 * LAW_TEXTS['oiv'].name // => 'OIV Compendium, OIV-MA-C1-01 (Oeno 9/98), annex C'
 * ```
 */
export const LAW_TEXTS = {
  oiv: { name: 'OIV Compendium, OIV-MA-C1-01 (Oeno 9/98), annex C' },
} as const satisfies Readonly<Record<string, LawText>>;

/** The key of a text. */
export type LawTextKey = keyof typeof LAW_TEXTS;
