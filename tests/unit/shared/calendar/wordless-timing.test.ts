import { expect, it } from 'vitest';
import { wordlessTiming } from '#shared/calendar/wordless-timing.js';
import { timing } from '#tests/support/calendar-facts.js';

it('keeps what moves a day, and no word or name that anybody gave', () => {
  const seen = { date: '2027-06-20', by: 'Marrun', agreedBy: 'A-1' };
  const star = { markerKey: 'pleiades', phenomenon: 'heliacal-rising', occurrence: 1 } as const;
  const leads = [
    { type: 'fixed-date', date: { month: 6, day: 10 }, source: 'Old Marrun' },
    {
      type: 'nature-sign',
      name: 'Marrun’s bird',
      usual: { from: { month: 5, day: 1 }, to: { month: 5, day: 9 } },
      source: 'Marrun',
    },
    { type: 'marker-as-seen', ...star, seen },
    { type: 'sky', spec: { kind: 'moon-phase', event: 'full' }, occurrence: 1, seen },
  ] as const;
  for (const lead of leads) {
    const entry = timing({
      lead,
      crop: 'Marrun millet',
      hasLastDate: true,
      lastDate: { date: { month: 7, day: 1 }, source: 'Marrun' },
    });
    const kept = wordlessTiming(entry);
    expect(JSON.stringify(kept)).not.toMatch(/Marrun|A-1/u);
    expect(kept).toMatchObject({ offsets: entry.offsets, lastDate: { date: { month: 7, day: 1 } } });
  }
  expect(wordlessTiming(timing({ lead: { type: 'marker-as-seen', ...star, seen } })).lead).toMatchObject({
    seen: { date: '2027-06-20' },
  });
});
