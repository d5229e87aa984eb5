/** English texts of the namespace "today". Keys with _one and _other follow i18next's plural rules. */
export const texts = {} as const;
