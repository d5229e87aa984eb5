export type CsvCell = string | number | null;

const NEEDS_QUOTES = /[",\r\n]/u;
/** What spreadsheets take for the beginning of a formula, the wide forms of East Asian keyboards included. */
const LOOKS_LIKE_FORMULA = /^'*[=+\-@\t\r\n＝＋－＠]/u;
const PLAIN_NUMBER = /^-\d+(?:\.\d+)?$/u;
/** Only what was guarded begins so, because words of their own that do are guarded once more. */
const GUARDED = /^'(?='*[=+\-@\t\r\n＝＋－＠])/u;

/**
 * A table as CSV after RFC 4180: commas, CRLF after every line, quotes where needed. Text that a spreadsheet would
 * run as a formula gets an apostrophe in front; numbers keep their sign, given as numbers or as plain text such as
 * "-5". Null is an empty cell.
 */
export function csvText(rows: readonly (readonly CsvCell[])[]): string {
  return rows.map((row) => `${row.map(cellText).join(',')}\r\n`).join('');
}

/** The words that stood in a cell before `csvText` wrote them. */
export function csvWords(cell: string): string {
  return cell.replace(GUARDED, '');
}

function cellText(cell: CsvCell): string {
  if (cell === null) return '';
  if (typeof cell === 'number') return String(cell);
  const text = LOOKS_LIKE_FORMULA.test(cell) && !PLAIN_NUMBER.test(cell) ? `'${cell}` : cell;
  return NEEDS_QUOTES.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
