import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { LongLook } from '#shared/contracts/decades.js';
import type { RolledCalendar, RolloverReport } from '#shared/contracts/rollovers.js';
import { EntryEntity } from '#server/db/entities/entry.entity.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  entryInput,
  openVillage,
  readVersion,
  reasonOf,
  submit,
  type Village,
} from '#tests/support/calendar-api.js';
import { wholeRecord } from '#tests/support/event-record.js';
import { details } from '#tests/support/sharing-api.js';

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

/** Of sowing, with everything that is asked for before elders are. */
const whole = () => ({ record: wholeRecord(), giver: 'Elder A-1', ifLate: 'Sow short millet.' });

describe('the record of an event', () => {
  it('is saved with a draft however little it says, and frozen with a submission as it is', async () => {
    const { officer } = village;
    const entry = await addEntry(officer, calendar.id, whole());
    // Signs in its own words have an id from then on, by which they are marked as seen.
    expect(entry.content.record).toMatchObject(wholeRecord());
    const version = await submit(officer, calendar.id);
    const frozen = await readVersion(village.elder, version);
    expect(frozen.entries[0]?.content.record).toEqual(entry.content.record);
  });

  it('names at its field what cannot be, and keeps nothing', async () => {
    const signs = { ...wholeRecord().signs, needed: 5 };
    const answer = await village.officer
      .post(
        `/api/calendars/${calendar.id}/entries`,
        entryInput({ ...whole(), record: wholeRecord({ signs }) }),
      )
      .expect(422);
    expect((answer.body as Problem).errors).toMatchObject([
      { field: 'record.signs.needed', code: 'signs-needed' },
    ]);
    expect(await entriesOf(village.officer, calendar.id)).toEqual([]);
  });

  it('that is not whole, or not there, keeps the submission back, and names its entry', async () => {
    const { officer } = village;
    await addEntry(officer, calendar.id, { ...whole(), titleOfficer: 'Sow beans', ifLate: '' });
    const old = await addEntry(officer, calendar.id, { titleOfficer: 'Older', record: undefined });
    await api.dataSource.getRepository(EntryEntity).update({ id: old.id }, { isOlder: true });
    expect((await entriesOf(officer, calendar.id)).map(({ isOlder }) => isOlder)).toEqual([undefined, true]);
    await addEntry(officer, calendar.id, { titleOfficer: 'Nothing said', record: undefined });
    const answer = await officer.post(`/api/calendars/${calendar.id}/versions`);
    expect(reasonOf(answer)).toBe('409 record-incomplete');
    expect((answer.body as Problem).names).toEqual(['Sow beans', 'Nothing said']);
  });

  it('needs something that its days count from: a draft may wait for that, elders are not asked', async () => {
    const { officer } = village;
    const unled = { ...whole(), titleOfficer: 'Mend terraces', lead: { type: 'none', way: 'sky' } as const };
    const { id, content, dates } = await addEntry(officer, calendar.id, unled);
    expect(content.lead).toEqual(unled.lead);
    expect(dates).toMatchObject({ window: null, warnings: ['no-lead-yet'] });
    const answer = await officer.post(`/api/calendars/${calendar.id}/versions`);
    expect(reasonOf(answer)).toBe('409 record-incomplete');
    expect((answer.body as Problem).names).toEqual(['Mend terraces']);

    const look = await officer.get(`/api/calendars/${calendar.id}/long-look?from=2027`).expect(200);
    const [looked] = (look.body as LongLook).entries;
    expect(looked?.years.map(({ warnings }) => warnings[0])).toEqual(Array(10).fill('no-lead-yet'));
    const next = await officer.post(`/api/calendars/${calendar.id}/next-year`).expect(200);
    const { calendarId } = next.body as RolledCalendar;
    const report = await officer.get(`/api/calendars/${calendarId}/rollover`).expect(200);
    expect((report.body as RolloverReport).entries).toMatchObject([
      { titleOfficer: 'Mend terraces', outcome: 'without-days', after: { warnings: ['no-lead-yet'] } },
    ]);
    expect((await entriesOf(officer, calendarId))[0]?.content.lead).toEqual(unled.lead);

    const star = entryInput().lead;
    await officer
      .put(`/api/calendars/${calendar.id}/entries/${id}`, { content: { ...content, lead: star }, version: 1 })
      .expect(200);
    await submit(officer, calendar.id);
  });

  it('of an entry that its people keep is theirs: it keeps nothing back and is not told of', async () => {
    const { officer, elder } = village;
    await addEntry(officer, calendar.id);
    const kept = { ...whole(), ifLate: '', sharingLevel: 'elders' as const };
    await addEntry(elder, calendar.id, kept);
    await submit(officer, calendar.id);
  });

  it('does not name a giver who does not want to be named, and loses nothing by being written over', async () => {
    const { officer, elder } = village;
    const entry = await addEntry(officer, calendar.id, {
      ...whole(),
      giverId: elder.personId,
      sharing: details({ naming: 'not-named' }),
    });
    expect(entry.content.record?.trust.by).toBe('');
    const path = `/api/calendars/${calendar.id}/entries/${entry.id}`;
    const content = { ...entry.content, notes: 'Told again' };
    await officer.put(path, { content, version: 1 }).expect(200);
    const [own] = await entriesOf(elder, calendar.id);
    expect(own).toMatchObject({ content: { notes: 'Told again', record: { trust: { by: 'Elder A-1' } } } });
  });
});
