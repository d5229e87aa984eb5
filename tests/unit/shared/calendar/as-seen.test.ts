import { expect, it } from 'vitest';
import { goesAsSeen, seenOf, withSeen } from '#shared/calendar/as-seen.js';
import type { EntryLead } from '#shared/calendar/entry-model.js';

const seen = { date: '2027-02-09', by: 'Tirel', agreedBy: 'Elder A-1' };
const star = { markerKey: 'pleiades', phenomenon: 'heliacal-rising', occurrence: 1 } as const;
const moon = { type: 'sky', spec: { kind: 'moon-phase', event: 'full' }, occurrence: 1 } as const;

it('takes the day on which people saw it where the lead waits for one, and leaves every other lead as it is', () => {
  const waiting: EntryLead[] = [
    { type: 'marker-as-seen', ...star, seen: null },
    { ...moon, seen: null },
  ];
  for (const lead of waiting) {
    expect([goesAsSeen(lead), seenOf(lead), seenOf(withSeen(lead, seen))]).toEqual([true, null, seen]);
  }
  const computed: EntryLead[] = [{ type: 'marker', ...star }, moon];
  for (const lead of computed) {
    expect([goesAsSeen(lead), seenOf(lead), withSeen(lead, seen)]).toEqual([false, null, lead]);
  }
});
