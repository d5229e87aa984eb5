import { describe, expect, it } from 'vitest';
import { readListQuery, writeListQuery } from '#src/features/stars/model/star-list-query.js';

const read = (text: string) => readListQuery(new URLSearchParams(text), 2027);

describe('the address of the list', () => {
  it('means this year, good markers, in order of their first morning, while it says nothing', () => {
    expect(read('')).toEqual({
      year: 2027,
      search: '',
      show: 'good',
      does: 'any',
      sort: 'heliacal-rising',
      descending: false,
      rows: 50,
    });
  });

  it('written and read again is the same list, and keeps what is not its own', () => {
    const query = {
      year: -43,
      search: 'γ² Vel',
      show: 'all' as const,
      does: 'never-sets' as const,
      sort: 'vMag' as const,
      descending: true,
      rows: 150,
    };
    const address = writeListQuery(new URLSearchParams('placeId=p1&year=3'), query, 2027);
    expect(address.get('placeId')).toBe('p1');
    expect(readListQuery(address, 2027)).toEqual(query);
  });

  it('leaves out what is usual', () => {
    const usual = writeListQuery(new URLSearchParams('show=all&rows=100'), read(''), 2027);
    expect(usual.toString()).toBe('');
  });

  it('does not follow nonsense', () => {
    expect(read('year=99999&show=x&does=y&sort=z&rows=-4')).toEqual(read(''));
  });
});
