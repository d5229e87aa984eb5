import { describe, expect, it } from 'vitest';
import { ENTRY_WARNINGS } from '#shared/contracts/calendars.js';
import { newDraft } from '#src/features/calendars/model/entry-draft.js';
import { collidingWith, waysOut } from '#src/features/calendars/model/warning-ways.js';
import type { ShownEntry } from '#src/features/calendars/model/preview-dates.js';
import { entryOf, tazimelMarkers } from '#tests/support/draft-of-tazimel.js';

const markers = await tazimelMarkers();

describe('ways out of a warning', () => {
  it('exist for every warning', () => {
    // What older versions froze about print is answered in the register, not in the form.
    const here = ENTRY_WARNINGS.filter((warning) => warning !== 'belief-not-agreed-to-print');
    for (const warning of here) {
      expect(waysOut(warning, newDraft(), null), warning).not.toEqual([]);
    }
  });

  it('offer other days of the same star only where they come this year', () => {
    const draft = newDraft({
      type: 'marker',
      markerKey: 'pleiades',
      phenomenon: 'heliacal-rising',
      occurrence: 1,
    });
    const dated = waysOut('no-date-this-year', draft, markers.get('pleiades') ?? null);
    expect(dated).toContainEqual({ kind: 'otherDay', phenomenon: 'acronychal-rising' });
    expect(dated).not.toContainEqual({ kind: 'otherDay', phenomenon: 'heliacal-rising' });
    // Polaris (HR 424) never sets at 12° N, so none of its days is ever dated.
    const never = waysOut('star-does-not-serve', draft, markers.get('hr424') ?? null);
    expect(never.map(({ kind }) => kind)).toEqual(['otherStar', 'fixedDate']);
  });
});

describe('windows that collide', () => {
  it('are named for each entry', () => {
    const shown = (id: number, changes = {}): ShownEntry => {
      const saved = entryOf(markers, id, changes);
      return { id: saved.id, saved, content: saved.content, dates: saved.dates, unsaved: false };
    };
    const [one, two, three] = [shown(1), shown(2), shown(3, { crop: 'beans' })];
    expect(collidingWith(one, [one, two, three]).map(({ id }) => id)).toEqual([two.id]);
    expect(collidingWith(three, [one, two, three])).toEqual([]);
  });
});
