import { describe, expect, it } from 'vitest';
import { fileNameOf } from '#server/print/file-name.js';

describe('fileNameOf', () => {
  it('keeps letters of every script and takes out what a file system refuses', () => {
    expect(fileNameOf('Ŋɔ́rɛ̃ 2027', 'pdf')).toBe('Ŋɔ́rɛ̃ 2027.pdf');
    expect(fileNameOf(' a/b\\c:d*e?f"g<h>i|j\u0001k ', 'csv')).toBe('a-b-c-d-e-f-g-h-i-j-k.csv');
  });
});
