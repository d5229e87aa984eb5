import { describe, expect, it } from 'vitest';
import type { Entry } from '#shared/contracts/calendars.js';
import { adviceOfAll, savedOfSky, thingsToLookAt } from '#src/features/calendars/model/advice-of-all.js';
import type { ShownEntry } from '#src/features/calendars/model/preview-dates.js';
import { content, entryOf, tazimelMarkers } from '#tests/support/draft-of-tazimel.js';

const markers = await tazimelMarkers();
const saved = (changes = {}): Entry => ({
  ...entryOf(markers, 1, changes),
  advice: ['cloudy-season', 'moonlit'],
});
const shown = (entry: Entry, changes: Partial<ShownEntry> = {}): ShownEntry => ({
  ...{ id: entry.id, saved: entry, content: entry.content, dates: entry.dates, unsaved: false },
  ...changes,
});

describe('what to look at in entries as they look now', () => {
  it('takes from the server what rests on the sky, and finds the rest anew', () => {
    const entry = saved({ kind: 'safety', caution: '' });
    expect(adviceOfAll([shown(entry)], []).get(entry.id)).toEqual(['moonlit', 'no-safety-line']);
  });

  it('says nothing of the sky while an unsaved entry goes by another sign', () => {
    const entry = saved();
    const lead = { type: 'fixed-date', date: { month: 6, day: 1 }, source: 'the village' } as const;
    expect(savedOfSky(shown(entry, { content: content({ lead }), unsaved: true }))).toEqual([]);
    expect(savedOfSky(shown(entry))).toEqual(['moonlit']);
  });

  it('is counted together with what the days themselves say', () => {
    const entry = saved();
    const dates = { ...entry.dates, warnings: ['weak-marker' as const] };
    expect(thingsToLookAt(shown(entry, { dates }), ['moonlit'])).toBe(2);
  });
});
