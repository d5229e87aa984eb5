import { readFileSync } from 'node:fs';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { startTheme, THEMES } from '#src/lib/theme.js';

const tokens = readFileSync('src/styles/tokens.css', 'utf8');

beforeEach(() => {
  localStorage.clear();
  vi.unstubAllGlobals();
  delete document.documentElement.dataset['theme'];
});

describe('the look at the start', () => {
  it('is what the person chose on this device', () => {
    localStorage.setItem('dawnpeg.theme', '"ink"');
    startTheme();
    expect(document.documentElement.dataset['theme']).toBe('ink');
  });

  it('is strong contrast where the system asks for it and nobody chose', () => {
    vi.stubGlobal('matchMedia', () => ({ matches: true }));
    startTheme();
    expect(document.documentElement.dataset['theme']).toBe('contrast');
  });

  it('is the limewash otherwise, also when something else was kept', () => {
    localStorage.setItem('dawnpeg.theme', '"neon"');
    startTheme();
    expect(document.documentElement.dataset['theme']).toBeUndefined();
  });
});

/** Ink on its ground, and how strong the contrast must be (WCAG 2.2: 1.4.6 for texts, 1.4.3, 1.4.11 for edges). */
const PAIRS: readonly (readonly [ink: string, ground: string, ratio: number])[] = [
  ...['lime', 'lime-deep', 'chalk', 'field', 'indigo-pale', 'ochre-pale'].flatMap((ground) => [
    ['umber', ground, 7] as const,
    ['umber-soft', ground, 7] as const,
  ]),
  ...['lime', 'lime-deep', 'chalk', 'indigo-pale'].map((ground) => ['indigo', ground, 4.5] as const),
  ['on-dark', 'madder', 4.5],
  ['chalk', 'umber', 7],
  ['ochre-ink', 'ochre-pale', 4.5],
  ['moss', 'moss-pale', 4.5],
  ['rust', 'rust-pale', 4.5],
  ['rust', 'chalk', 4.5],
  ...['lime', 'chalk', 'field'].flatMap((ground) => [
    ['edge', ground, 3] as const,
    ['ochre', ground, 3] as const,
    ['indigo', ground, 3] as const,
    ['ridge', ground, 3] as const,
  ]),
];

describe.each(THEMES)('colours of the theme "%s"', (theme) => {
  const colours = coloursOf(theme);
  it.each(PAIRS)('%s on %s reach a contrast of %d to 1', (ink, ground, ratio) => {
    expect(contrast(colours[ink] ?? '', colours[ground] ?? '')).toBeGreaterThanOrEqual(ratio);
  });
});

function coloursOf(theme: string): Record<string, string> {
  const own =
    theme === 'default' ? '' : (tokens.split(`[data-theme='${theme}'] {`)[1]?.split('\n}')[0] ?? '');
  const base = tokens.split('@theme static {')[1]?.split('\n}')[0] ?? '';
  return Object.fromEntries(
    [...(base + own).matchAll(/--color-([a-z-]+): (#[0-9a-f]{6});/g)].map(([, name = '', value = '']) => [
      name,
      value,
    ]),
  );
}

/** WCAG 2.2: (L1 + 0.05) / (L2 + 0.05) with the relative luminance of sRGB. */
function contrast(a: string, b: string): number {
  const [light = 0, dark = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (light + 0.05) / (dark + 0.05);
}

function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const value = parseInt(hex.slice(at, at + 2), 16) / 255;
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}
