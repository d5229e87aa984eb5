/** Stand in a translated line for the number of the page and of all pages, which only the printing browser knows. */
export const PAGE = '\u{E000}';
export const PAGES = '\u{E001}';

export interface PageHeads {
  /** From the second page on. */
  running: string;
  /** With `PAGE` and `PAGES` in it. */
  number: string;
}

/** Rules of the printed year's pages: their numbers, and what the first page says at its top on all that follow. */
export function pageHeads({ running, number }: PageHeads): string {
  return [
    `@page season { @top-left { content: ${cssText(running)} } @bottom-right { content: ${numberText(number)} } }`,
    '@page season:first { @top-left { content: none } }',
  ].join('\n');
}

function numberText(line: string): string {
  const parts = line.split(new RegExp(`([${PAGE}${PAGES}])`, 'u')).filter((part) => part !== '');
  const counters = new Map([
    [PAGE, 'counter(page)'],
    [PAGES, 'counter(pages)'],
  ]);
  return parts.map((part) => counters.get(part) ?? cssText(part)).join(' ');
}

/** People's words as a string of a style sheet: whatever could end it is written as its number. */
function cssText(words: string): string {
  const safe = words.replace(/["\\<\p{Cc}]/gu, (letter) => `\\${(letter.codePointAt(0) ?? 0).toString(16)} `);
  return `"${safe}"`;
}
