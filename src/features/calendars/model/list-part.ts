import type { ShownEntry } from './preview-dates.js';

/** So many entries of a long draft are drawn at once. */
export const LIST_PART = 40;

/** Which entries of a list are drawn: from the one up to before the other. */
export interface ListPart {
  from: number;
  to: number;
}

export const FIRST_PART: ListPart = { from: 0, to: LIST_PART };

/** The part with the open entry in it: the one that is drawn where it is in it, else the one around it. */
export function partWith(part: ListPart, openIndex: number): ListPart {
  if (openIndex < 0 || (openIndex >= part.from && openIndex < part.to)) return part;
  const from = Math.floor(openIndex / LIST_PART) * LIST_PART;
  return { from, to: from + LIST_PART };
}

/** Entries whose names or crop hold every word that is looked for, in any order. */
export function foundBy(entries: readonly ShownEntry[], wanted: string): readonly ShownEntry[] {
  const words = plain(wanted).split(/\s+/u).filter(Boolean);
  if (words.length === 0) return entries;
  return entries.filter(({ content: { titleOfficer, titleVillage, crop } }) => {
    const text = plain(`${titleOfficer} ${titleVillage} ${crop}`);
    return words.every((word) => text.includes(word));
  });
}

function plain(text: string): string {
  return text.normalize('NFC').toLowerCase();
}
