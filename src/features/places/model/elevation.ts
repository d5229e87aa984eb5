/**
 * Reads metres above the sea as people write them: `1950`, `1,950`, `1 950 m`, `-12.5`. A mark before exactly three
 * digits groups thousands; nobody measures a hill to the millimetre.
 * @returns metres, or null where it is no number
 */
export function readElevationM(text: string): number | null {
  const typed = text
    .trim()
    .replace(/\s*(m|metres?|meters?)$/iu, '')
    .replace(/^[−–]/u, '-');
  if (/^[-+]?\d{1,3}(?:[\s\u00a0\u202f,.'’]\d{3})+$/u.test(typed))
    return Number(typed.replace(/[^-\d]/gu, ''));
  return /^[-+]?\d+(?:[.,]\d+)?$/u.test(typed) ? Number(typed.replace(',', '.')) : null;
}
