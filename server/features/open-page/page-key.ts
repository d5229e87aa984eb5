import { grouped, newCode } from '../session/one-time-codes.service.js';

/** 99 bits, and few enough letters to be typed from a wall. */
const LETTERS = 20;
const GROUP = 4;

export function newPageKey(): string {
  return newCode(LETTERS, GROUP);
}

/** What somebody typed: as it stands, for keys of before, or with letters of any size and hyphens anywhere. */
export function keysMeant(typed: string): string[] {
  const letters = typed.toUpperCase().replace(/[^A-Z0-9]/gu, '');
  return letters.length === LETTERS ? [typed, grouped(letters, GROUP)] : [typed];
}
