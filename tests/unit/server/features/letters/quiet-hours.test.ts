import { describe, expect, it } from 'vitest';
import { afterQuietHours, nextDigestAt } from '#server/features/letters/quiet-hours.js';

const night = { fromHour: 20, toHour: 7 };
const at = (text: string) => new Date(text);

describe('quiet hours', () => {
  it('hold a letter back until they are over, by the village’s clock', () => {
    // Nairobi is three hours before UTC all year.
    expect(afterQuietHours(at('2026-12-01T18:10:00Z'), 'Africa/Nairobi', night)).toEqual(
      at('2026-12-02T04:00:00Z'),
    );
    expect(afterQuietHours(at('2026-12-01T16:59:00Z'), 'Africa/Nairobi', night)).toEqual(
      at('2026-12-01T16:59:00Z'),
    );
  });

  it('may lie within one day, or be all hours but one', () => {
    const noon = { fromHour: 12, toHour: 14 };
    expect(afterQuietHours(at('2026-12-01T12:00:00Z'), 'UTC', noon)).toEqual(at('2026-12-01T14:00:00Z'));
    const allButNine = { fromHour: 9, toHour: 9 };
    expect(afterQuietHours(at('2026-12-01T10:00:00Z'), 'UTC', allButNine)).toEqual(
      at('2026-12-02T09:00:00Z'),
    );
  });

  it('end at the same hour of the clock in a night when the clock is changed', () => {
    // In Berlin the clock goes back from 3 to 2 on 25 October 2026.
    expect(afterQuietHours(at('2026-10-24T20:00:00Z'), 'Europe/Berlin', night)).toEqual(
      at('2026-10-25T06:00:00Z'),
    );
  });

  it('are none where none were chosen', () => {
    expect(afterQuietHours(at('2026-12-01T02:00:00Z'), 'UTC', null)).toEqual(at('2026-12-01T02:00:00Z'));
  });
});

describe('the digest', () => {
  it('goes at seven in the morning, or after quiet hours that last longer', () => {
    expect(nextDigestAt(at('2026-12-01T12:20:00Z'), 'UTC', null)).toEqual(at('2026-12-02T07:00:00Z'));
    expect(nextDigestAt(at('2026-12-01T07:20:00Z'), 'UTC', null)).toEqual(at('2026-12-02T07:00:00Z'));
    expect(nextDigestAt(at('2026-12-01T05:00:00Z'), 'UTC', { fromHour: 20, toHour: 9 })).toEqual(
      at('2026-12-01T09:00:00Z'),
    );
  });
});
