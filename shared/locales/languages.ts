/** Languages with a folder of texts, in the order in which a person chooses among them. */
export const LANGUAGES = ['en'] as const;
export type Language = (typeof LANGUAGES)[number];
export const DEFAULT_LANGUAGE: Language = 'en';
