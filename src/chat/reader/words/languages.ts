/** The languages that are read and spoken, by their ISO 639-1 codes; English first, as it stands in for what another lacks. */
export const LANGUAGES = ['en', 'es', 'fr', 'it', 'de', 'pt'] as const;

/** The code of one of them. */
export type Language = (typeof LANGUAGES)[number];
