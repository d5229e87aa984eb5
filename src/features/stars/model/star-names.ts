/** A catalogue designation taken apart: `γ² Vel` → letter γ, index 2, constellation Vel. */
export interface Designation {
  /** A Greek letter, or empty. */
  letter: string;
  /** The small number beside a letter, or empty. */
  index: string;
  /** Flamsteed's number, or empty. */
  number: string;
  /** Three letters of the constellation. */
  constellation: string;
}

const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** Null where it is no Greek letter or number with a constellation. */
export function readDesignation(designation: string): Designation | null {
  const found = /^(?:([α-ω])([⁰¹²³⁴-⁹]*)|(\d+))\s+([A-Z][A-Za-z]{2})$/u.exec(designation.trim());
  if (found === null) return null;
  const index = (found[2] ?? '').replace(/./gu, (digit) => String(SUPERSCRIPTS.indexOf(digit)));
  return { letter: found[1] ?? '', index, number: found[3] ?? '', constellation: found[4] ?? '' };
}

/** `2` → `²` */
export function superscript(index: string): string {
  return index.replace(/\d/gu, (digit) => SUPERSCRIPTS.charAt(Number(digit)));
}

/** Marks and capitals do not matter while searching, and small raised numbers are numbers. */
export function plainWords(text: string): string[] {
  return text
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .split(/[^\p{L}\p{N}]+/u)
    .filter((word) => word !== '');
}
