import { describe, expect, it } from 'vitest';
import { civilDateAt } from '#server/features/places/place-day.service.js';

describe('civilDateAt', () => {
  it.each([
    ['Africa/Addis_Ababa', '2027-06-07T20:59:59Z', '2027-06-07'],
    ['Africa/Addis_Ababa', '2027-06-07T21:00:00Z', '2027-06-08'],
    ['America/Lima', '2028-01-01T04:59:59Z', '2027-12-31'],
    ['America/Lima', '2028-01-01T05:00:00Z', '2028-01-01'],
  ])('in %s at %s is %s', (timeZone, now, date) => {
    expect(civilDateAt(new Date(now), { timeZone, longitudeDeg: 0 })).toBe(date);
  });
});
