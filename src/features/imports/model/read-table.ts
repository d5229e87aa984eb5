import Papa from 'papaparse';
import { csvWords } from '#shared/kernel/csv.js';

/** A table as it was saved: its titles, and every line that says something, with its number in the spreadsheet. */
export interface SavedTable {
  titles: readonly string[];
  lines: readonly { line: number; cells: readonly string[] }[];
}

/** Reads text whatever parts its cells: commas, semicolons or tabs. */
export function readTable(text: string): SavedTable {
  const plain = text.replace(/^\ufeff/u, '');
  const { data } = Papa.parse<string[]>(plain, { delimiter: markOf(plain) });
  const rows = data.map((cells, index) => ({
    line: index + 1,
    cells: cells.map((cell) => csvWords(cell).trim()),
  }));
  const said = rows.filter(({ cells }) => cells.some((cell) => cell !== ''));
  const [head, ...lines] = said;
  return { titles: head?.cells ?? [], lines };
}

const MARKS = [',', ';', '\t'] as const;

/** What parts the cells of the titles parts all others. */
function markOf(text: string): string {
  const titles = MARKS.map((delimiter) => {
    const { data } = Papa.parse<string[]>(text.trimStart(), { delimiter, preview: 1 });
    return { delimiter, count: data[0]?.length ?? 0 };
  });
  return titles.reduce((best, each) => (each.count > best.count ? each : best)).delimiter;
}

/** Null where the bytes are no UTF-8: guessing another code would turn letters into others in silence. */
export function utf8TextOf(bytes: ArrayBuffer): string | null {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return null;
  }
}
