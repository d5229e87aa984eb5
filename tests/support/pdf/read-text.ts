import { execFileSync } from 'node:child_process';

/** The text of a PDF as another program reads it: poppler's pdftotext (Debian package poppler-utils). */
export function readPdfText(file: Buffer): string {
  return execFileSync('pdftotext', ['-enc', 'UTF-8', '-', '-'], { input: file, encoding: 'utf8' });
}

/** Names of the embedded typefaces by poppler's pdffonts, with whether each is embedded and has a map to Unicode. */
export function readPdfFonts(file: Buffer): { name: string; isEmbedded: boolean; hasUnicode: boolean }[] {
  const lines = execFileSync('pdffonts', ['-'], { input: file, encoding: 'utf8' }).split('\n').slice(2);
  return lines
    .filter((line) => line.trim() !== '')
    .map((line) => {
      const [name = '', ...rest] = line.trim().split(/\s{2,}|\s(?=yes|no)/u);
      const flags = rest.join(' ').match(/\b(yes|no)\b/gu) ?? [];
      return { name, isEmbedded: flags[0] === 'yes', hasUnicode: flags[2] === 'yes' };
    });
}

/** The title that the file gives itself, by poppler's pdfinfo. */
export function readPdfTitle(file: Buffer): string {
  return (
    /^Title:\s*(.*)$/mu.exec(execFileSync('pdfinfo', ['-'], { input: file, encoding: 'utf8' }))?.[1] ?? ''
  );
}
