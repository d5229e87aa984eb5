import { createHash, randomInt } from 'node:crypto';

/** No 0/O, 1/I/L: the code is read aloud and copied by hand. 31 letters, 12 of them: 59 bits. */
const ALPHABET = 'ABCDEFGHJKMNPQRSTUVWXYZ23456789';
const LENGTH = 12;
const GROUP = 4;
export const CODE_LIFETIME_DAYS = 14;
export const CODE_TRIES = 10;

/** A fresh code, in groups for reading. Each letter is worth 4.95 bits. */
export function newCode(length = LENGTH, group = GROUP): string {
  const letters = Array.from({ length }, () => ALPHABET[randomInt(ALPHABET.length)]).join('');
  return grouped(letters, group);
}

/** A code from a number that is large and known to nobody, such as a digest. */
export function codeOf(number: bigint): string {
  const base = BigInt(ALPHABET.length);
  let rest = number;
  let letters = '';
  while (letters.length < LENGTH) {
    letters += ALPHABET[Number(rest % base)] ?? '';
    rest /= base;
  }
  return grouped(letters, GROUP);
}

export function grouped(letters: string, group: number): string {
  return letters.replace(new RegExp(`(.{${group}})(?=.)`, 'gu'), '$1-');
}

/** What is stored of a code or token. Hyphens and case do not count. */
export function codeHash(code: string): string {
  return createHash('sha256')
    .update(code.toUpperCase().replace(/[^A-Z0-9]/gu, ''))
    .digest('hex');
}
