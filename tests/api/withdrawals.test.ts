import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { erasersOf } from '#server/features/withdrawals/erasers.service.js';
import { replayWithdrawals } from '#server/features/withdrawals/replay.service.js';
import { AttachmentFilesService } from '#server/features/attachments/attachment-files.service.js';
import { CONSENT_USES } from '#shared/contracts/consents.js';
import type { Entry } from '#shared/contracts/calendars.js';
import type { MadeFeed } from '#shared/contracts/exports.js';
import type { Version } from '#shared/contracts/versions.js';
import type { ItemState, PausedItem, SheetToReplace } from '#shared/contracts/withdrawals.js';
import { addPicture } from '#tests/support/attachment-api.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  openVillage,
  publish,
  readVersion,
  reasonOf,
  says,
  submit,
  takeBack,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';
import { addConsent } from '#tests/support/consent-api.js';
import { askableAbout } from '#tests/support/askable-about.js';
import { pathsOf, READING, textOf } from '#tests/support/every-endpoint.js';
import { addFigure } from '#tests/support/figure-api.js';
import { copyTables, filesWith, putBack, tablesWith } from '#tests/support/search-everything.js';
import { switchOpenPageOn } from '#tests/support/open-page-api.js';
import { addVariant } from '#tests/support/variant-api.js';
import { withdraw } from '#tests/support/withdrawal-api.js';
import { furnishLevels } from '#tests/support/levelled-village.js';

/**
 * Withdrawn means: a search for a word of it finds nothing, in no table, file, answer, old version, record or copy of
 * old tables. Searched is whatever there is: every column of every table, every file of the store, every endpoint that
 * reads. Parts that come later and keep words elsewhere join this list with a search of their own:
 */
const TO_JOIN_LATER = ['files that were handed out', 'service workers of devices'];

const WORD = 'Kwizzelbrook';
let api: TestApi;
beforeAll(async () => {
  api = await openTestApi();
});
afterAll(() => api.close());

describe('a withdrawn entry', () => {
  let village: Village;
  let calendarId: string;
  let entry: Entry;
  let published: Version;
  let everybody: Client[];
  let feedKey: string;
  let openKey: string;

  beforeEach(async () => {
    await api.reset();
    village = await openVillage(api);
    calendarId = (await beginCalendar(village)).id;
    await addEntry(village.officer, calendarId, { titleOfficer: 'Weed' });
    entry = await addEntry(village.officer, calendarId, {
      ...{ titleOfficer: `Do ${WORD}`, titleVillage: WORD, notes: WORD, caution: WORD, otherSigns: WORD },
      ...{ ifLate: WORD, giver: WORD, giverId: village.elder.personId },
    });
    const done = { from: '2027-06-24', to: null, saidBy: WORD, plots: WORD };
    await village.officer
      .put(`/api/calendars/${calendarId}/entries/${entry.id}/actual-days`, done)
      .expect(200);
    const season = `/api/calendars/${calendarId}/season-review`;
    const about = { entryId: entry.id, text: WORD };
    await village.elder3.post(`${season}/lessons`, about).expect(201);
    await village.officer.post(`${season}/decisions`, { ...about, kind: 'later' }).expect(201);
    await addPicture(village.officer, entry.id, { subjectType: 'entry', title: WORD });
    await addVariant(village.elder3, calendarId, entry.id, { giver: WORD, note: WORD, otherSigns: WORD });
    const version = await submit(village.officer, calendarId);
    const answer = `${versionPath(version)}/entries/${entry.id}/answer`;
    await village.elder3.put(answer, says({ answer: 'not-mine-to-say', note: WORD })).expect(200);
    published = await publish(village, version);
    const feeds = `/api/communities/${village.officer.communityId}/feeds`;
    feedKey = ((await village.elder.post(feeds).expect(201)).body as MadeFeed).key;
    openKey = await switchOpenPageOn(village.officer);
    everybody = [
      ...Object.values(village).filter(isClient),
      await api.signIn('staff'),
      await api.signIn('observer'),
    ];
    expect(await tablesWith(api, WORD)).not.toEqual([]);
  });

  it('is found nowhere any more, in tables, files, answers, prints and records', async () => {
    // What leaves the village needs a yes.
    await addConsent(village.officer, 'entry', entry.id, { uses: [...CONSENT_USES] });
    const before = await placesWith(WORD);
    expect(before.length).toBeGreaterThan(8);
    const files = ['calendar.ics', 'calendar.csv', 'calendar.json', 'calendar.zip', 'feed.ics', 'open-page'];
    for (const file of [...files, 'season-review', 'season-tasks']) {
      expect(before.some((place) => place.includes(file))).toBe(true);
    }
    await withdraw(village.elder, 'entry', entry.id).expect(204);
    expect(await placesWith(WORD)).toEqual([]);
    expect(TO_JOIN_LATER).toHaveLength(2);
    // Everything is asked for twice.
  }, 90_000);

  it('leaves the hash of every version whole for what stays, and says that one entry was withdrawn', async () => {
    await withdraw(village.elder, 'entry', entry.id, { leavesTrace: true }).expect(204);
    const seen = await readVersion(village.officer, published);
    expect(seen).toMatchObject({
      entryCount: 1,
      withdrawnCount: 1,
      hash: published.hash,
      leaves: published.leaves,
    });
  });

  it('leaves no trace where its giver chose so', async () => {
    await withdraw(village.elder, 'entry', entry.id, { leavesTrace: false }).expect(204);
    expect(await readVersion(village.officer, published)).toMatchObject({ entryCount: 1, withdrawnCount: 0 });
  });

  it('is recorded with ids alone: who asked, who did it, when', async () => {
    await withdraw(village.officer, 'entry', entry.id, { askedById: village.elder.personId }).expect(204);
    const rows: unknown = await api.dataSource.query(
      "SELECT actor_id, details FROM audit_event WHERE action = 'item-withdrawn'",
    );
    expect(rows).toEqual([
      { actor_id: village.officer.personId, details: JSON.stringify({ askedBy: village.elder.personId }) },
    ]);
  });

  it('stays gone when older tables are put back: the next start takes it out again', async () => {
    const copy = await copyTables(api);
    await withdraw(village.elder, 'entry', entry.id).expect(204);
    await putBack(api, copy);
    expect(await tablesWith(api, WORD)).not.toEqual([]);
    const erasers = erasersOf(new AttachmentFilesService(api.storage, null), api.clock);
    expect(await replayWithdrawals(api.dataSource, erasers, api.withdrawals)).toBeGreaterThan(0);
    expect([...(await tablesWith(api, WORD)), ...filesWith(api, WORD)]).toEqual([]);
    expect(await replayWithdrawals(api.dataSource, erasers, api.withdrawals)).toBe(0);
  });

  it('is listed after a broken end that came before the list was written', async () => {
    await withdraw(village.elder, 'entry', entry.id).expect(204);
    const erasers = erasersOf(new AttachmentFilesService(api.storage, null), api.clock);
    const lines: string[] = [];
    const emptyList = {
      add: (line: object) => Promise.resolve(void lines.push(JSON.stringify(line))),
      all: () => Promise.resolve([]),
    };
    await replayWithdrawals(api.dataSource, erasers, emptyList);
    expect(lines.join()).toContain(entry.id);
  });

  it('is a task for whoever hangs sheets, until somebody says that the old one is down', async () => {
    const staff = await api.signIn('staff');
    await withdraw(village.elder, 'entry', entry.id).expect(204);
    const path = `/api/communities/${staff.communityId}/sheets-to-replace`;
    const sheets = async () =>
      ((await staff.get(path).expect(200)).body as { items: SheetToReplace[] }).items;
    const [sheet] = await sheets();
    expect(sheet).toMatchObject({ calendarId, number: published.number, label: published.label });
    await staff.post(`${path}/${sheet?.withdrawalId ?? ''}`).expect(204);
    expect(await sheets()).toEqual([]);
  });

  it('is told to every device of those who could see it, by its id', async () => {
    await withdraw(village.elder, 'entry', entry.id).expect(204);
    for (const client of everybody) {
      const answer = await client.get(`/api/communities/${client.communityId}/withdrawn`).expect(200);
      const { items } = answer.body as { items: { itemId: string }[] };
      expect(items.map(({ itemId }) => itemId)).toContain(entry.id);
    }
  });

  it('cannot be taken back by those whose it is not, and can be by steward and officer for whoever asks', async () => {
    const staff = await api.signIn('staff');
    expect(reasonOf(await withdraw(staff, 'entry', entry.id))).toBe('409 not-the-giver');
    expect(reasonOf(await withdraw(await api.signIn('officer2'), 'entry', entry.id))).toBe('404 not-found');
    await withdraw(village.steward, 'entry', entry.id, { askedById: village.elder.personId }).expect(204);
    await withdraw(village.steward, 'entry', entry.id).expect(204);
  });

  it('can be withdrawn while its draft is out for review, and the review goes on with the rest', async () => {
    const second = await submit(village.officer, calendarId);
    await withdraw(village.elder, 'entry', entry.id).expect(204);
    expect((await readVersion(village.officer, second)).entries).toHaveLength(1);
    expect((await publish(village, await readVersion(village.officer, second))).state).toBe('published');
    expect(await tablesWith(api, WORD)).toEqual([]);
  });

  async function placesWith(word: string): Promise<string[]> {
    const rolled = await village.officer.post(`/api/calendars/${calendarId}/next-year`).expect(200);
    const found = [...(await tablesWith(api, word)), ...filesWith(api, word)];
    const rolledId = (rolled.body as { calendarId: string }).calendarId;
    const askable = askableAbout({ village, calendarId, rolledId, itemId: entry.id, feedKey, openKey });
    for (const client of [village.officer, village.elder]) {
      for (const endpoint of READING) {
        for (const asked of pathsOf(endpoint, askable)) {
          if ((await textOf(client, asked, endpoint)).includes(word)) found.push(asked);
        }
      }
    }
    return found;
  }
});

describe('a withdrawn figure', () => {
  it('takes its name, story and tellings out of everything; entries go by its star and stay', async () => {
    await api.reset();
    const village = await openVillage(api);
    const calendarId = (await beginCalendar(village)).id;
    const figure = await addFigure(village.officer, {
      names: [{ tag: 'en', name: WORD }],
      story: WORD,
      variants: [{ toldBy: WORD, text: WORD }],
    });
    await addEntry(village.officer, calendarId, {
      lead: { type: 'marker', markerKey: figure.markerKey, phenomenon: 'heliacal-rising', occurrence: 1 },
    });
    const published = await publish(village, await submit(village.officer, calendarId));
    expect(await tablesWith(api, WORD)).not.toEqual([]);
    await withdraw(village.officer, 'figure', figure.id).expect(204);
    expect([...(await tablesWith(api, WORD)), ...filesWith(api, WORD)]).toEqual([]);
    const seen = await readVersion(village.elder, published);
    expect(seen).toMatchObject({ headerComplete: false, header: { markers: [{ name: 'Aldebaran' }] } });
    expect(seen.entries).toHaveLength(1);
    const [draft] = await entriesOf(village.officer, calendarId);
    expect(draft?.content.lead).toMatchObject({ markerKey: `hr${figure.indicatorHr ?? 0}` });
    const sheet = await textOf(village.officer, `${versionPath(published)}/sheet.pdf?layout=month-cards`, {
      fileType: 'application/pdf',
    });
    expect(sheet).not.toContain(WORD);
  });
});

describe('a paused thing', () => {
  let village: Village;
  let entry: Entry;
  let calendarId: string;
  beforeEach(async () => {
    await api.reset();
    village = await openVillage(api);
    calendarId = (await beginCalendar(village)).id;
    await addEntry(village.officer, calendarId, { titleOfficer: 'Weed' });
    entry = await addEntry(village.officer, calendarId, { giverId: village.elder.personId });
  });

  it('is seen by nobody and comes back as it was', async () => {
    await pause(village.elder).expect(204);
    for (const client of [village.officer, village.elder, village.steward]) {
      expect((await entriesOf(client, calendarId)).map(({ id }) => id)).not.toContain(entry.id);
    }
    await resume(village.officer).expect(204);
    expect((await entriesOf(village.officer, calendarId)).map(({ id }) => id)).toContain(entry.id);
  });

  it('does not hold a review up', async () => {
    await pause(village.elder).expect(204);
    const version = await submit(village.officer, calendarId);
    expect((await publish(village, version)).entries).toHaveLength(1);
  });

  it('is its giver’s alone to bring back once thirty days are over', async () => {
    await pause(village.elder).expect(204);
    api.clock.set(new Date('2026-12-31T06:00:01Z'));
    const [officer, elder] = [await api.signIn('officer'), await api.signIn('elder')];
    expect(reasonOf(await resume(officer))).toBe('409 pause-over');
    expect((await state(elder)).may).toMatchObject({ resume: true, pause: false });
    await resume(elder).expect(204);
  });

  it('stands in the list of those who may bring it back, by its name where they could see it, and in no other', async () => {
    await pause(village.elder).expect(204);
    const staff = await api.signIn('staff');
    expect(await paused(village.officer)).toMatchObject([
      { itemType: 'entry', itemId: entry.id, title: entry.content.titleOfficer },
    ]);
    expect(await paused(staff)).toEqual([]);
    api.clock.set(new Date('2026-12-31T06:00:01Z'));
    expect(await paused(await api.signIn('officer'))).toEqual([]);
    expect(await paused(await api.signIn('elder'))).toHaveLength(1);
  });

  it('that leaves no trace stands in no list of those who could not see it, steward or not', async () => {
    const sealed = await addEntry(village.elder2, calendarId, { sharingLevel: 'sealed', titleOfficer: WORD });
    const path = `/api/communities/${village.elder2.communityId}/items/entry/${sealed.id}/pause`;
    await village.elder2.post(path, { askedById: null }).expect(204);
    expect(await paused(village.steward)).toEqual([]);
    expect(await paused(village.elder2)).toMatchObject([{ itemId: sealed.id, title: WORD }]);
  });

  it('is known to a steward who takes it back unseen without its name', async () => {
    const kept = await addEntry(village.elder2, calendarId, { sharingLevel: 'elders', titleOfficer: WORD });
    const path = `/api/communities/${village.steward.communityId}/items/entry/${kept.id}/state`;
    const seen = (client: Client) => client.get(path).expect(200);
    expect((await seen(village.steward)).body).toMatchObject({
      ...{ title: null, isMine: false },
      may: { withdraw: true },
    });
    expect((await seen(village.elder2)).body).toMatchObject({ title: WORD, isMine: true });
  });

  const paused = async (client: Client) =>
    (
      (await client.get(`/api/communities/${client.communityId}/paused`).expect(200)).body as {
        items: PausedItem[];
      }
    ).items;
  const itemPath = (client: Client) => `/api/communities/${client.communityId}/items/entry/${entry.id}`;
  const pause = (client: Client) => client.post(`${itemPath(client)}/pause`, { askedById: null });
  const resume = (client: Client) => client.delete(`${itemPath(client)}/pause`);
  const state = async (client: Client) =>
    (await client.get(`${itemPath(client)}/state`).expect(200)).body as ItemState;
});

describe('a name that is taken off', () => {
  it('is gone from draft and versions; the thing stays, and the version still verifies', async () => {
    await api.reset();
    const village = await openVillage(api);
    const calendarId = (await beginCalendar(village)).id;
    const entry = await addEntry(village.officer, calendarId, {
      giver: WORD,
      giverId: village.elder.personId,
    });
    const published = await publish(village, await submit(village.officer, calendarId));
    await village.elder
      .post(`/api/communities/${village.elder.communityId}/items/entry/${entry.id}/name-removal`)
      .expect(204);
    expect(await tablesWith(api, WORD)).toEqual([]);
    const [seen] = (await readVersion(village.officer, published)).entries;
    expect(seen).toMatchObject({ entryId: entry.id, redacted: true, content: { giver: '' } });
  });
});

describe('things of every level', () => {
  it('vanish alike, and nothing that stays is hurt', async () => {
    const village = await furnishLevels(api);
    await takeBack(village.officer, {
      calendarId: village.calendarId,
      number: village.reviewedNumber,
    } as Version);
    const entries = await entriesOf(village.elder, village.calendarId);
    const kept = entries.filter(({ content }) => content.sharingLevel !== 'open');
    for (const { id } of kept) await withdraw(village.elder, 'entry', id).expect(204);
    const words = kept.map(({ content }) => content.titleVillage);
    for (const word of words) expect([word, await tablesWith(api, word)]).toEqual([word, []]);
    expect(await entriesOf(village.officer, village.calendarId)).toHaveLength(1);
    const path = versionPath({ calendarId: village.calendarId, number: village.publishedNumber });
    expect((await village.officer.get(path).expect(200)).body).toMatchObject({ entryCount: 1 });
  });
});

function isClient(value: unknown): value is Client {
  return typeof value === 'object' && value !== null && 'personId' in value;
}
