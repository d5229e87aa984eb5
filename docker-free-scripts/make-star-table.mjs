// Writes shared/sky/data/star-rows.ts from tests/fixtures/sky/bright-stars.csv.
// Run by hand when the table changes:  node docker-free-scripts/make-star-table.mjs
import { readFileSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

const input = fileURLToPath(new URL('../tests/fixtures/sky/bright-stars.csv', import.meta.url));
const output = fileURLToPath(new URL('../shared/sky/data/star-rows.ts', import.meta.url));

const [header = '', ...lines] = readFileSync(input, 'utf8').trim().split('\n');
const columns = header.split(',');
/** @type {(value: string) => string} */
const text = (value) => `'${value.replaceAll("'", "\\'")}'`;
/** @type {(value: string) => string} */
const number = (value) => (value === '' ? 'null' : String(Number(value)));
/** Columns that hold text; the others hold numbers. */
const textColumns = new Set(['name', 'bayer', 'flamsteed', 'constellation']);

const rows = lines.map((line) => {
  const cells = line.split(',');
  if (cells.length !== columns.length) throw new Error(`not ${columns.length} cells: ${line}`);
  return `  [${cells
    .slice(0, -1) // B−V is not used by the core
    .map((cell, index) => (textColumns.has(columns[index] ?? '') ? text(cell) : number(cell)))
    .join(', ')}],`;
});

writeFileSync(
  output,
  `/**
 * ${rows.length} stars to V 4.5. Made by docker-free-scripts/make-star-table.mjs from tests/fixtures/sky/bright-stars.csv; do not edit.
 * Source: Bright Star Catalogue, 5th revised edition (Hoffleit & Warren 1991, CDS V/50). Licence: public domain.
 * HIP numbers by HD number from the star file of npm's d3-celestial (BSD). Names: IAU or traditional.
 * Columns: HR, HIP, name, Bayer letter, Flamsteed number, constellation, right ascension and declination (J2000, FK5, degrees),
 * proper motion (right ascension × cos declination, declination; mas per year), parallax (mas), radial velocity (km/s), V.
 */
export type StarRow = readonly [
  hr: number,
  hip: number | null,
  name: string,
  bayer: string,
  flamsteed: string,
  constellation: string,
  raDeg: number,
  decDeg: number,
  pmRaCosDecMasPerYear: number,
  pmDecMasPerYear: number,
  parallaxMas: number | null,
  radialVelocityKmPerS: number | null,
  vMag: number,
];

// prettier-ignore
export const STAR_ROWS: readonly StarRow[] = [
${rows.join('\n')}
];
`,
);
