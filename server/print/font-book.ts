import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { create } from 'fontkit';
import type { Font } from 'fontkit';

export type FontWeight = 400 | 700;

/**
 * The typefaces of the boards, whole files: subsets put a letter and its mark into different files, and then
 * marks cannot attach. The first that has every character of a cluster draws it.
 */
const FACES = {
  andika: {
    400: '@expo-google-fonts/andika/Andika_400Regular.ttf',
    700: '@expo-google-fonts/andika/Andika_700Bold.ttf',
  },
  ethiopic: {
    400: '@expo-google-fonts/noto-sans-ethiopic/400Regular/NotoSansEthiopic_400Regular.ttf',
    700: '@expo-google-fonts/noto-sans-ethiopic/700Bold/NotoSansEthiopic_700Bold.ttf',
  },
  devanagari: {
    400: '@expo-google-fonts/noto-sans-devanagari/400Regular/NotoSansDevanagari_400Regular.ttf',
    700: '@expo-google-fonts/noto-sans-devanagari/700Bold/NotoSansDevanagari_700Bold.ttf',
  },
} as const;

export type FaceName = keyof typeof FACES;
const FACE_ORDER = Object.keys(FACES) as FaceName[];

export interface TextRun {
  readonly face: FaceName;
  readonly text: string;
}

const resolve = createRequire(import.meta.url).resolve;
const fonts = new Map<string, Font>();

/** A typeface as it is drawn with, read once for the whole process. */
export function fontOf(face: FaceName, weight: FontWeight): Font {
  const key = `${face}-${weight}`;
  const known = fonts.get(key);
  if (known) return known;
  const font = create(readFileSync(resolve(FACES[face][weight])));
  if (!('layout' in font)) throw new Error(`${key} is a collection, not a single typeface`);
  fonts.set(key, font);
  return font;
}

const graphemes = new Intl.Segmenter('und', { granularity: 'grapheme' });
/** Joiners, marks of direction and variation selectors need no picture of their own. */
const NEEDS_NO_GLYPH = /^(?:\p{Cf}|\p{Variation_Selector})$/u;
/** Spaces, figures and punctuation stay with the script around them where its typeface has them. */
const NEUTRAL = /^[\p{White_Space}\p{P}\p{S}]+$/u;

const REMEMBERED_TEXTS = 5_000;
const remembered = new Map<string, readonly TextRun[]>();

/** Cuts text into runs of one typeface each; a letter and its marks always stay together. Text is composed first. */
export function textRuns(text: string, weight: FontWeight): readonly TextRun[] {
  const key = `${weight} ${text}`;
  const known = remembered.get(key);
  if (known) return known;
  const runs = cutIntoRuns(text, weight);
  if (remembered.size >= REMEMBERED_TEXTS) remembered.clear();
  remembered.set(key, runs);
  return runs;
}

function cutIntoRuns(text: string, weight: FontWeight): TextRun[] {
  const runs: { face: FaceName; text: string }[] = [];
  for (const { segment } of graphemes.segment(text.normalize('NFC'))) {
    const last = runs.at(-1);
    const stays = last !== undefined && NEUTRAL.test(segment) && has(last.face, weight, segment);
    const face = stays ? last.face : (FACE_ORDER.find((name) => has(name, weight, segment)) ?? 'andika');
    if (last?.face === face) last.text += segment;
    else runs.push({ face, text: segment });
  }
  return runs;
}

function has(face: FaceName, weight: FontWeight, cluster: string): boolean {
  const font = fontOf(face, weight);
  return Array.from(cluster).every(
    (character) => NEEDS_NO_GLYPH.test(character) || font.hasGlyphForCodePoint(character.codePointAt(0) ?? 0),
  );
}

/** Letters that none of the typefaces can draw: they would print as empty boxes. */
export function unprintableClusters(text: string): string[] {
  const missing = new Set<string>();
  for (const { segment } of graphemes.segment(text.normalize('NFC'))) {
    if (!/^\s+$/u.test(segment) && !FACE_ORDER.some((face) => has(face, 400, segment))) missing.add(segment);
  }
  return [...missing];
}
