import { describe, expect, it } from 'vitest';
import { phenomenonOn, readLookAddress } from '#src/features/look/model/look-address.js';

const read = (search: string) => readLookAddress(new URLSearchParams(search));

describe('the address', () => {
  it('names the star, the kind of day and the day', () => {
    expect(read('marker=hr2491&phenomenon=heliacal-setting&date=2027-05-03')).toEqual({
      marker: 'hr2491',
      phenomenon: 'heliacal-setting',
      date: '2027-05-03',
    });
  });

  it('counts what makes no sense as not asked', () => {
    expect(read('phenomenon=noon&date=soon')).toEqual({
      marker: null,
      phenomenon: 'heliacal-rising',
      date: null,
    });
    expect(read('date=1850-01-01').date).toBeNull();
    expect(read('date=2201-01-01').date).toBeNull();
  });
});

describe('morning or evening', () => {
  it('keeps a kind of day that belongs there, else takes the star’s coming or going', () => {
    expect(phenomenonOn('dawn', 'cosmical-setting')).toBe('cosmical-setting');
    expect(phenomenonOn('dawn', 'heliacal-setting')).toBe('heliacal-rising');
    expect(phenomenonOn('dusk', 'heliacal-rising')).toBe('heliacal-setting');
  });
});
