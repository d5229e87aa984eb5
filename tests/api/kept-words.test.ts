import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { AttachmentFilesService } from '#server/features/attachments/attachment-files.service.js';
import { erasersOf } from '#server/features/withdrawals/erasers.service.js';
import { replayWithdrawals } from '#server/features/withdrawals/replay.service.js';
import type { Attachment } from '#shared/contracts/attachments.js';
import type { Entry } from '#shared/contracts/calendars.js';
import { addRecording } from '#tests/support/attachment-api.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { addEntry, beginCalendar, openVillage, reasonOf, type Village } from '#tests/support/calendar-api.js';
import { addFigure } from '#tests/support/figure-api.js';
import { webm } from '#tests/support/media.js';
import { addNote, noteInput, notesOn, notesPath } from '#tests/support/notes-api.js';
import { copyTables, filesWith, putBack } from '#tests/support/search-everything.js';

/* Short of taking all of it back: the voice goes and the words stay, or the words are put right. */
const WORD = 'Kwizzelbrook';
let api: TestApi;
beforeAll(async () => {
  api = await openTestApi();
});
afterAll(() => api.close());

describe('a recording that is removed while its words are kept', () => {
  const SOUND = 'Vuzzlemurmur';
  let village: Village;
  let entry: Entry;
  let recording: Attachment;
  const removal = (client: Client, askedById: string | null = null) =>
    client.post(`/api/communities/${client.communityId}/items/attachment/${recording.id}/sound-removal`, {
      askedById,
    });
  const writeOut = (client: Client, text: string, version: number | null = null) =>
    client.put(`/api/attachments/${recording.id}/words`, {
      ...{ kind: 'words', language: 'en', text, checkedBySpeaker: false, version },
    });

  beforeEach(async () => {
    await api.reset();
    village = await openVillage(api);
    entry = await addEntry(village.officer, (await beginCalendar(village)).id);
    recording = await addRecording(
      village.officer,
      entry.id,
      { subjectType: 'entry', giverId: village.elder.personId, sharingLevel: 'elders' },
      [SOUND, `${SOUND} again`],
    );
    expect(filesWith(api, SOUND)).toHaveLength(2);
  });

  it('has no sound any more, in files or tables, and no agreement clip; its words, authors and level stay', async () => {
    await writeOut(village.elder2, WORD).expect(200);
    await removal(village.elder).expect(204);
    expect(filesWith(api, SOUND)).toEqual([]);
    expect(filesWith(api, 'I agree')).toEqual([]);
    expect(await api.dataSource.query('SELECT part FROM attachment_part')).toEqual([]);
    for (const part of [0, 1, 2]) {
      expect((await village.elder.get(`/api/attachments/${recording.id}/parts/${part}`)).status).toBe(404);
    }
    const kept = (await village.elder3.get(`/api/attachments/${recording.id}`).expect(200))
      .body as Attachment;
    expect(kept).toMatchObject({ hasWordsAlone: true, sharingLevel: 'elders', parts: [] });
    expect(kept.words).toMatchObject([{ text: WORD, authorName: 'Elder A-2' }]);
    expect((await (await api.signIn('officer2')).get(`/api/attachments/${recording.id}`)).status).toBe(404);
  });

  it('stays so when older tables are put back, and when its sender sends it once more', async () => {
    await writeOut(village.elder2, WORD).expect(200);
    const copy = await copyTables(api);
    await removal(village.elder).expect(204);
    await putBack(api, copy);
    const erasers = erasersOf(new AttachmentFilesService(api.storage, null), api.clock);
    expect(await replayWithdrawals(api.dataSource, erasers, api.withdrawals)).toBe(1);
    expect(await api.dataSource.query('SELECT part FROM attachment_part')).toEqual([]);
    expect(await replayWithdrawals(api.dataSource, erasers, api.withdrawals)).toBe(0);
    const part = { part: 1, seconds: 2 };
    const again = village.officer.upload(
      `/api/attachments/${recording.id}/parts`,
      part,
      webm({ note: SOUND }),
    );
    expect(reasonOf(await again)).toBe('409 part-missing');
    expect(filesWith(api, SOUND)).toEqual([]);
  });

  it('is recorded without a word, for whoever asked', async () => {
    await writeOut(village.elder2, WORD).expect(200);
    await removal(village.steward, village.elder.personId).expect(204);
    const rows: unknown = await api.dataSource.query(
      "SELECT actor_id, details FROM audit_event WHERE action = 'sound-removed'",
    );
    expect(rows).toEqual([
      { actor_id: village.steward.personId, details: JSON.stringify({ askedBy: village.elder.personId }) },
    ]);
  });

  it('needs written words, and is not for those whose it is not', async () => {
    expect(reasonOf(await removal(village.elder))).toBe('409 nothing-written-out');
    await writeOut(village.elder2, WORD).expect(200);
    expect(reasonOf(await removal(await api.signIn('staff')))).toBe('404 not-found');
    expect(filesWith(api, SOUND)).toHaveLength(2);
  });
});

describe('a correction', () => {
  it('of what was written from a voice is its giver’s to make, whatever their role', async () => {
    await api.reset();
    const village = await openVillage(api);
    const [observer, staff] = [await api.signIn('observer'), await api.signIn('staff')];
    const figure = await addFigure(village.officer);
    const changes = { giverId: observer.personId, sharingLevel: 'village' } as const;
    const recording = await addRecording(village.officer, figure.id, changes);
    const path = `/api/attachments/${recording.id}/words`;
    const words = { kind: 'words', language: 'en', checkedBySpeaker: false } as const;
    await village.officer.put(path, { ...words, text: 'Ten nights', version: null }).expect(200);
    const right = { ...words, text: 'Two nights', checkedBySpeaker: true, version: 1 };
    expect(reasonOf(await staff.put(path, right))).toBe('409 not-yours');
    const corrected = await observer.put(path, right).expect(200);
    expect(corrected.body).toMatchObject({ words: [{ text: 'Two nights', checkedBySpeaker: true }] });
  });

  it('of an entry is asked for by its giver as a note, in a draft that they see nothing else of', async () => {
    await api.reset();
    const village = await openVillage(api);
    const observer = await api.signIn('observer');
    const calendar = await beginCalendar(village);
    const own = await addEntry(village.officer, calendar.id, { giverId: observer.personId });
    const other = await addEntry(village.officer, calendar.id, { titleOfficer: 'Weed' });
    await addNote(observer, { subjectId: own.id, text: 'It was the second rain.' });
    expect(reasonOf(await observer.post(notesPath(observer), noteInput({ subjectId: other.id })))).toBe(
      '404 not-found',
    );
    const content = { ...own.content, notes: 'After the second rain' };
    const entryPath = `/api/calendars/${calendar.id}/entries/${own.id}`;
    await village.officer.put(entryPath, { content, version: own.version }).expect(200);
    const [asked] = await notesOn(observer, 'entry', own.id);
    await observer.put(notesPath(observer, `/${asked?.id ?? ''}/closed`)).expect(200);
  });
});
