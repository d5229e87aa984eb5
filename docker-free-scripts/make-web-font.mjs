// Writes public/fonts/dawnpeg-board.woff2 and its licence from the full Andika of npm @expo-google-fonts/andika.
// Run by hand when the font or the list of characters changes:  node docker-free-scripts/make-web-font.mjs
//
// One file instead of the usual split by script: a letter and its marks must come from the same file, or the marks
// do not attach. Latin with all its African and phonetic letters, every combining mark, signs and arrows.
import { createRequire } from 'node:module';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import subsetFont from 'subset-font';
import { fontName, renameFont } from './lib/rename-font.mjs';

const FAMILY = 'Dawnpeg Board';
const MOST_BYTES = 150 * 1024;
const LICENCE_NAME_ID = 13;
const COPYRIGHT_NAME_ID = 0;

/** Blocks of Unicode, first and last character. @type {readonly (readonly [number, number])[]} */
const BLOCKS = [
  [0x20, 0x7e], // Basic Latin
  [0xa0, 0xff], // Latin-1
  [0x100, 0x17f], // Latin Extended-A
  [0x180, 0x24f], // Latin Extended-B
  [0x250, 0x2af], // IPA
  [0x2b0, 0x2ff], // Spacing modifiers
  [0x300, 0x36f], // Combining marks
  [0x1ab0, 0x1aff], // Combining marks, extended
  [0x1d00, 0x1dbf], // Phonetic extensions
  [0x1dc0, 0x1dff], // Combining marks, supplement
  [0x1e00, 0x1eff], // Latin Extended Additional
  [0x2000, 0x206f], // Punctuation
  [0x2070, 0x209f], // Superscripts, subscripts
  [0x20a0, 0x20cf], // Currencies
  [0x20d0, 0x20ff], // Combining marks for symbols
  [0x2100, 0x214f], // Letter-like signs
  [0x2190, 0x21ff], // Arrows
  [0x2200, 0x22ff], // Minus, less or equal …
  [0x25a0, 0x25ff], // Shapes, the dotted circle among them
  [0x2c60, 0x2c7f], // Latin Extended-C
  [0xa700, 0xa71f], // Tone letters
  [0xa720, 0xa7ff], // Latin Extended-D
  [0xab30, 0xab6f], // Latin Extended-E
  [0xfb00, 0xfb06], // Ligatures
];

/** Small capitals and look-alike alternates stay out; what joins and places marks stays in. */
const FEATURES = ['ccmp', 'liga', 'locl', 'mark', 'mkmk', 'kern'];

const require = createRequire(import.meta.url);
const source = readFileSync(require.resolve('@expo-google-fonts/andika/Andika_400Regular.ttf'));
const text = BLOCKS.flatMap(([first, last]) =>
  Array.from({ length: last - first + 1 }, (_, index) => String.fromCodePoint(first + index)),
).join('');

const font = await subsetFont(renameFont(source, FAMILY), text, {
  targetFormat: 'woff2',
  keepFeatures: FEATURES,
  noHinting: true,
  preserveNameIds: [COPYRIGHT_NAME_ID, LICENCE_NAME_ID, 14],
});
if (font.length > MOST_BYTES) throw new Error(`${font.length} bytes are more than ${MOST_BYTES}`);

const folder = fileURLToPath(new URL('../public/fonts/', import.meta.url));
mkdirSync(folder, { recursive: true });
writeFileSync(`${folder}dawnpeg-board.woff2`, font);
writeFileSync(
  `${folder}OFL.txt`,
  `dawnpeg-board.woff2 is a subset of Andika under another name, as the licence asks of changed forms.\n\n${[
    fontName(source, COPYRIGHT_NAME_ID),
    fontName(source, LICENCE_NAME_ID),
  ]
    .join('\n\n')
    .replaceAll('\r\n', '\n')
    .replaceAll('\r', '\n')}\n`,
);
process.stdout.write(`public/fonts/dawnpeg-board.woff2: ${font.length} bytes\n`);
