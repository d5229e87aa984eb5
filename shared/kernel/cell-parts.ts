/**
 * Several things in one cell of a table: a line each, its parts with bars between. What stands in a part may itself hold
 * bars, backslashes and line breaks; these are marked with a backslash.
 */
export function partsCell(lines: readonly (readonly string[])[]): string {
  return lines
    .map((parts) => {
      const last = parts.findLastIndex((part) => part !== '');
      return parts
        .slice(0, last + 1)
        .map(marked)
        .join(' | ');
    })
    .join('\n');
}

/** What `partsCell` wrote, or a person by hand; lines that say nothing are passed over. */
export function partsOfCell(cell: string): string[][] {
  return cell
    .split(/\r\n?|\n/u)
    .map(partsOfLine)
    .filter((parts) => parts.some((part) => part !== ''));
}

function marked(part: string): string {
  return part.replace(/[\\|]/gu, String.raw`\$&`).replace(/\n/gu, String.raw`\n`);
}

function partsOfLine(line: string): string[] {
  const parts: string[] = [];
  let part = '';
  for (const [, mark, letter = ''] of line.matchAll(/(\\)?([^])/gu)) {
    if (mark === undefined && letter === '|') {
      parts.push(part);
      part = '';
    } else part += mark !== undefined && letter === 'n' ? '\n' : letter;
  }
  return [...parts, part].map((each) => each.trim());
}
