/** English texts for submissions, published versions and their comparison. Keys with _one and _other follow plural rules. */
export const texts = {} as const;
