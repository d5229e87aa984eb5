import { beforeEach, describe, expect, it } from 'vitest';
import { draftOf } from '#src/features/calendars/model/entry-draft.js';
import { forgetEdit, keepEdit, readEdits } from '#src/features/calendars/model/kept-edits.js';
import { forgetAll, keep } from '#src/lib/device-storage.js';
import { draftPrefix } from '#src/lib/kept-draft.js';
import { content } from '#tests/support/draft-of-tazimel.js';

const edit = {
  draft: draftOf(content()),
  base: content(),
  baseVersion: 3,
  keptAt: '2027-06-07T06:00:00.000Z',
};

beforeEach(() => {
  localStorage.clear();
});

describe('unsaved entries on this device', () => {
  it('come back one by one, for their person and their calendar only', () => {
    keepEdit('beyno', 'c1', 'e1', edit);
    keepEdit('beyno', 'c1', 'new-1', { ...edit, base: null, baseVersion: null });
    keepEdit('beyno', 'c2', 'e9', edit);
    keepEdit('lume', 'c1', 'e1', edit);
    expect([...readEdits('beyno', 'c1').keys()].sort()).toEqual(['e1', 'new-1']);
    expect(readEdits('beyno', 'c1').get('e1')).toEqual(edit);
    forgetEdit('beyno', 'c1', 'e1');
    expect([...readEdits('beyno', 'c1').keys()]).toEqual(['new-1']);
  });

  it('go when their person signs out', () => {
    keepEdit('beyno', 'c1', 'e1', edit);
    forgetAll(draftPrefix('beyno'));
    expect(readEdits('beyno', 'c1').size).toBe(0);
  });

  it('keep a sign of the sky with all that was set about it, and nothing that is no sign', () => {
    const spec = {
      kind: 'sun-azimuth',
      event: 'sunrise',
      azimuthDeg: 112.5,
      pointName: 'the notch',
    } as const;
    const led = { ...edit, draft: { ...edit.draft, leadType: 'sky', sky: { spec, occurrence: 2 } } as const };
    keepEdit('beyno', 'c1', 'e1', led);
    keep(`${draftPrefix('beyno')}entry.c1.e2`, {
      ...led,
      draft: { ...led.draft, sky: { spec: { kind: 'comet' }, occurrence: 1 } },
    });
    expect([...readEdits('beyno', 'c1')]).toEqual([['e1', led]]);
  });

  it('of another shape are left alone, not half read', () => {
    const { giver: _giver, ...older } = edit.draft;
    keep(`${draftPrefix('beyno')}entry.c1.e1`, { ...edit, draft: older });
    keep(`${draftPrefix('beyno')}entry.c1.e2`, 'nonsense');
    keep(`${draftPrefix('beyno')}entry.c1.e3`, { ...edit, base: { titleOfficer: 1 } });
    expect(readEdits('beyno', 'c1').size).toBe(0);
    expect(localStorage.length).toBe(3);
  });
});
