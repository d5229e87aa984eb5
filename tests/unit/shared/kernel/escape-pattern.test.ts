import { describe, expect, it } from 'vitest';
import { escapePattern } from '#shared/kernel/escape-pattern.js';

describe('letters as a pattern', () => {
  it('match themselves and nothing else', () => {
    const text = 'A-1 (b) [c] {d} \\ ^$ . * + ? | / ŋɔ́';
    const pattern = new RegExp(`^${escapePattern(text)}$`, 'u');
    expect(pattern.test(text)).toBe(true);
    expect(pattern.test(text.replace('.', 'x'))).toBe(false);
  });
});
