import type { EntryLead } from './entry-model.js';

/** An entry's free words and those of its record that are read in one breath: on the board, in prints, on Today. */
export interface SaidWords {
  otherSigns: string;
  ifLate: string;
  lead?: EntryLead | undefined;
  record?: { signs: { list: readonly { name: string }[] }; work: { ifLaterStill: string } } | undefined;
}

/** The sign of nature that leads, the signs for which people wait by name, and those that are written freely. */
export function signsSaid({ otherSigns, record, lead }: SaidWords): string {
  const named = (record?.signs.list ?? []).map(({ name }) => name).join(', ');
  const leading = lead?.type === 'nature-sign' ? lead.name : '';
  return [leading, named, otherSigns].filter((text) => text !== '').join('. ');
}

/** What to do if it is late, and if it is later still. */
export function lateSaid({ ifLate, record }: SaidWords): string {
  return [ifLate, record?.work.ifLaterStill ?? ''].filter((text) => text !== '').join('\n');
}
