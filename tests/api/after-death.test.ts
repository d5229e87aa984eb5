import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { AfterDeath } from '#shared/contracts/after-death.js';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { ConsentContent } from '#shared/contracts/consents.js';
import type { Today } from '#shared/contracts/today.js';
import type { ItemSharing } from '#shared/contracts/sharing.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  openVillage,
  reasonOf,
  type Village,
} from '#tests/support/calendar-api.js';
import { addConsent } from '#tests/support/consent-api.js';
import { tablesWith } from '#tests/support/search-everything.js';
import { sharingPath } from '#tests/support/sharing-api.js';

/* What somebody chose for after their death is done when the steward notes it, and can be undone while nothing is gone. */
const WORD = 'Ozzelfrum';
let api: TestApi;
let village: Village;
let calendar: Calendar;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendar = await beginCalendar(village);
});
afterAll(() => api.close());

/** An entry of elder A-1, with what they chose. */
async function given(chosen: Partial<ConsentContent>, titleOfficer = 'Sow') {
  const giverId = village.elder.personId;
  const entry = await addEntry(village.officer, calendar.id, {
    titleOfficer,
    giverId,
    sharingLevel: 'village',
  });
  await addConsent(village.officer, 'entry', entry.id, { giverId, giverName: 'Elder A-1', ...chosen });
  return entry.id;
}
const path = () => `/api/communities/${village.steward.communityId}/people/${village.elder.personId}/death`;
const note = (changes: object = {}) =>
  village.steward.put(path(), { diedOn: '2026-11-30', removesForGood: false, ...changes });
const sharingOf = async (id: string) =>
  (await village.elder2.get(sharingPath(village.elder2, 'entry', id)).expect(200)).body as ItemSharing;

describe('what was chosen for after a death', () => {
  it('keeps, tells to fewer, or passes on, each thing as its giver said', async () => {
    const kept = await given({ afterDeath: 'keep' });
    const told = await given({ afterDeath: 'tighten' });
    const passed = await given({ afterDeath: 'pass-to', passTo: 'Elder A-2' });
    const chosen = await village.steward.get(path()).expect(200);
    expect(chosen.body).toMatchObject({
      diedOn: null,
      chosen: { keep: 1, tighten: 1, passTo: 1, remove: 0 },
    });
    expect((await note().expect(200)).body).toMatchObject({ diedOn: '2026-11-30', mayUndo: true });
    expect(await sharingOf(kept)).toMatchObject({ sharing: { level: 'village' } });
    expect(await sharingOf(told)).toMatchObject({
      sharing: { level: 'elders', naming: 'role' },
      giverName: '',
    });
    expect(await sharingOf(passed)).toMatchObject({ giverId: village.elder2.personId });
    expect((await entriesOf(village.officer, calendar.id)).map(({ id }) => id)).not.toContain(told);
  });

  it('is undone where it was noted by mistake, and everything is shared as before', async () => {
    const told = await given({ afterDeath: 'tighten' });
    const passed = await given({ afterDeath: 'pass-to', passTo: 'Elder A-2' });
    await note().expect(200);
    const undone = (await village.steward.delete(path()).expect(200)).body as AfterDeath;
    expect(undone).toMatchObject({ diedOn: null, mayUndo: false });
    expect(await sharingOf(told)).toMatchObject({ sharing: { level: 'village', naming: 'named' } });
    expect(await sharingOf(passed)).toMatchObject({ giverId: village.elder.personId });
    await note().expect(200);
  });

  it('removes only where it is said twice; then it is gone for good and is not undone', async () => {
    await given({ afterDeath: 'remove' }, WORD);
    expect(reasonOf(await note())).toBe('409 removes-for-good');
    expect(await tablesWith(api, WORD)).not.toEqual([]);
    const noted = await note({ removesForGood: true }).expect(200);
    expect(noted.body).toMatchObject({ chosen: { remove: 1 }, mayUndo: false });
    expect(await tablesWith(api, WORD)).toEqual([]);
    expect(reasonOf(await village.steward.delete(path()))).toBe('409 removed-for-good');
  });

  it('is noted once, by the steward alone, for a day that has come', async () => {
    await given({ afterDeath: 'tighten' });
    expect((await note({ diedOn: '2030-01-01' }).expect(422)).body).toMatchObject({
      errors: [{ field: 'diedOn', code: 'in-the-future' }],
    });
    await note().expect(200);
    expect(reasonOf(await note())).toBe('409 death-noted');
    await village.officer.get(path()).expect(403);
  });

  it('waits where nobody here is called so, until the steward says who is meant; undone, it goes back', async () => {
    const passed = await given({ afterDeath: 'pass-to', passTo: 'My niece' });
    const heir = (personId: string, name = 'My niece') =>
      village.steward.post(`${path()}/heirs`, { name, personId });
    expect(reasonOf(await heir(village.elder3.personId))).toBe('409 nothing-to-pass');
    expect((await note().expect(200)).body).toMatchObject({ openHeirs: ['My niece'] });
    expect(await sharingOf(passed)).toMatchObject({ giverId: village.elder.personId });
    const waits = async () =>
      ((await village.steward.get(`/api/communities/${village.steward.communityId}/today`)).body as Today)
        .heirsOpen;
    expect(await waits()).toBe(1);
    expect(reasonOf(await heir(village.elder3.personId, 'My nephew'))).toBe('409 nothing-to-pass');
    expect((await heir(village.elder.personId)).status).toBe(422);
    expect((await heir((await api.signIn('officer2')).personId)).status).toBe(422);
    expect((await heir(village.elder3.personId).expect(200)).body).toMatchObject({ openHeirs: [] });
    expect(await sharingOf(passed)).toMatchObject({ giverId: village.elder3.personId });
    expect(await waits()).toBe(0);
    await village.steward.delete(path()).expect(200);
    expect(await sharingOf(passed)).toMatchObject({ giverId: village.elder.personId });
  });
});
