import { matchPath } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { PATTERNS, paths, safeNext } from '#src/lib/paths.js';

describe('addresses', () => {
  it('match the patterns that the router knows', () => {
    const made: [string, string][] = [
      [paths.star('hr1165'), PATTERNS.star],
      [paths.place('p'), PATTERNS.place],
      [paths.calendar('c'), PATTERNS.calendar],
      [paths.version('c', 3), PATTERNS.version],
      [paths.review('c', 'draft'), PATTERNS.review],
    ];
    for (const [path, pattern] of made) expect(matchPath(pattern, path), path).not.toBeNull();
  });

  it('keep what is odd in an id inside its part of the address', () => {
    expect(paths.star('a/b?c')).toBe('/stars/a%2Fb%3Fc');
  });

  it('leave out what was not asked for', () => {
    expect(paths.stars()).toBe('/stars');
    expect(paths.stars({ year: 2027 })).toBe('/stars?year=2027');
  });

  it('carry a one-time code behind the hash, where no log sees it', () => {
    expect(paths.welcome('AB-12')).toBe('/welcome#code=AB-12');
  });
});

describe('the page after signing in', () => {
  it('is the wanted one', () => {
    expect(safeNext('/stars?year=2027')).toBe('/stars?year=2027');
  });

  it('is Today for another site, a broken address and the sign-in page itself', () => {
    for (const next of [
      null,
      '',
      'https://elsewhere.example',
      '//elsewhere.example',
      '/\\elsewhere.example',
      '/sign-in',
    ]) {
      expect(safeNext(next), String(next)).toBe('/');
    }
  });
});
