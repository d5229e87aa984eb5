import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import {
  anyDate,
  id,
  isoDate,
  line,
  listOf,
  monthDay,
  pageQuery,
  rowVersion,
  text,
} from '#shared/contracts/common.js';

const messageOf = (schema: z.ZodType, value: unknown) =>
  schema.safeParse(value).error?.issues.map(({ message }) => message);

describe('line', () => {
  it('is composed and trimmed before its length counts', () => {
    // é as e and a mark: two characters that become one.
    expect(line(3).parse('  ae\u0301b ')).toBe('a\u00e9b');
  });

  it('holds no line break, tab or other control character', () => {
    for (const value of ['a\nb', 'a\tb', 'a\u0000b', 'a\u007fb']) {
      expect(messageOf(line(10), value)).toEqual(['one-line']);
    }
  });

  it('says with a code what is missing or too long', () => {
    expect(messageOf(line(10, 1), '   ')).toEqual(['required']);
    expect(messageOf(line(2), 'abc')).toEqual(['too-long']);
    expect(line(10).parse('')).toBe('');
  });
});

describe('text', () => {
  it('keeps line breaks, all of one kind, and nothing else that cannot be seen', () => {
    expect(text(20).parse(' a\r\nb\rc\n')).toBe('a\nb\nc');
    expect(messageOf(text(20), 'a\u0007b')).toEqual(['no-control-characters']);
    expect(messageOf(text(2), 'abc')).toEqual(['too-long']);
  });
});

describe('monthDay', () => {
  it.each([
    [1, 31],
    [2, 28],
    [4, 30],
    [12, 31],
  ])('takes the last day of month %i that every year has, %i, and not the day after', (month, day) => {
    expect(monthDay.parse({ month, day })).toEqual({ month, day });
    const after = monthDay.safeParse({ month, day: day + 1 });
    expect(after.error?.issues[0]?.path).toEqual(['day']);
  });
});

describe('dates, ids and versions', () => {
  it('write a year with four digits; before year 0 with a sign, where such years are offered', () => {
    expect(isoDate.safeParse('2027-06-07').success).toBe(true);
    expect(isoDate.safeParse('-0043-07-19').success).toBe(false);
    expect(anyDate.safeParse('-0043-07-19').success).toBe(true);
    expect(anyDate.safeParse('43-07-19').success).toBe(false);
  });

  it('take a UUID for an id and a counting number for a version', () => {
    expect(id.safeParse('00000000-0000-4000-8000-000000000001').success).toBe(true);
    expect(id.safeParse('1 OR 1=1').success).toBe(false);
    for (const version of [0, 1.5, '1']) expect(rowVersion.safeParse(version).success).toBe(false);
  });
});

describe('lists', () => {
  it('have items and where to go on, and nothing else', () => {
    const list = listOf(z.number());
    expect(list.parse({ items: [1], nextCursor: null })).toEqual({ items: [1], nextCursor: null });
    expect(list.safeParse({ items: [1] }).success).toBe(false);
    expect(list.safeParse({ items: [1], nextCursor: null, total: 1 }).success).toBe(false);
  });

  it('come in pages of at most 200', () => {
    expect(pageQuery.parse({ limit: '200' })).toEqual({ limit: 200 });
    expect(pageQuery.safeParse({ limit: '201' }).success).toBe(false);
    expect(pageQuery.safeParse({ limit: '0' }).success).toBe(false);
  });
});
