import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { icalDate, icalInstant, icalText, icalWords } from '#shared/kernel/ical-text.js';

describe('lines of a calendar file (RFC 5545)', () => {
  it('are no longer than 75 octets, break no letter, and unfold to what they were', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 400 }), (words) => {
        const value = icalWords(words);
        const text = icalText([['SUMMARY', value]]);
        for (const line of text.split('\r\n')) {
          expect(Buffer.byteLength(line, 'utf8')).toBeLessThanOrEqual(75);
          expect(line).not.toContain('\ufffd');
        }
        expect(text.replaceAll('\r\n ', '')).toBe(`SUMMARY:${value}\r\n`);
      }),
    );
  });

  it('mask what has a meaning, and let nobody begin a line of their own', () => {
    expect(icalWords('a;b,c\\d\nBEGIN:VEVENT\r\nEND\u0007')).toBe('a\\;b\\,c\\\\d\\nBEGIN:VEVENT\\nEND ');
  });

  it('write days and instants without marks', () => {
    expect(icalDate('2027-06-07')).toBe('20270607');
    expect(icalInstant('2027-06-07T06:05:04.123Z')).toBe('20270607T060504Z');
  });
});
