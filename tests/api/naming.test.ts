import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar, Entry } from '#shared/contracts/calendars.js';
import type { ItemConsents } from '#shared/contracts/consents.js';
import type { Figure } from '#shared/contracts/figures.js';
import { GIVER_BY_ROLE } from '#shared/contracts/sharing.js';
import type { Variant } from '#shared/contracts/variants.js';
import { addRecording } from '#tests/support/attachment-api.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  publish,
  readVersion,
  submit,
  type Village,
} from '#tests/support/calendar-api.js';
import { addConsent, consentsPath } from '#tests/support/consent-api.js';
import { pathsOf, READING, textOf } from '#tests/support/every-endpoint.js';
import { addFigure, figureInput } from '#tests/support/figure-api.js';
import { addNote, notesOn } from '#tests/support/notes-api.js';
import { tablesWith } from '#tests/support/search-everything.js';
import { details } from '#tests/support/sharing-api.js';
import { variantInput } from '#tests/support/variant-api.js';

/*
 * How givers are named holds for all that they gave: entries, timings beside them, tellings, notes, recordings and what
 * was agreed. The server says the name, a code for their role, or nothing.
 */
const NAME = 'Quorrebine';
let api: TestApi;
let village: Village;
let observer: Client;
let calendar: Calendar;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  observer = await api.signIn('observer');
  calendar = await beginCalendar(village);
});
afterAll(() => api.close());

const variantsPath = (entryId: string) => `/api/calendars/${calendar.id}/entries/${entryId}/variants`;

/** Everything that one giver can give to one entry, each with their name. */
async function give(naming: 'named' | 'role' | 'not-named') {
  const giverId = village.elder.personId;
  const sharing = details({ naming });
  const entry = await addEntry(village.officer, calendar.id, {
    ...{ giver: NAME, giverId, sharingLevel: 'village', sharing },
  });
  const body = variantInput({ giver: NAME, giverId, sharingLevel: 'village', sharing });
  const variant = (await village.officer.post(variantsPath(entry.id), body).expect(201)).body as Variant;
  const recording = await addRecording(village.officer, entry.id, {
    ...{ subjectType: 'entry', speaker: NAME, giverId, sharingLevel: 'village', sharing },
  });
  const consent = await addConsent(village.steward, 'entry', entry.id, { giverName: NAME, giverId, naming });
  return { entry, variant, recording, consent };
}

/** Where somebody reads the word, whatever they ask for. */
async function readsAt(client: Client, word: string, { entry, variant, recording, consent }: Given) {
  const found: string[] = [];
  const askable = {
    params: {
      communityId: [client.communityId],
      placeId: [village.placeId],
      calendarId: [calendar.id],
      entryId: [entry.id],
      number: ['1', 'draft'],
      figureId: [entry.id],
      markerKey: ['pleiades'],
      itemType: ['entry', 'variant', 'attachment'],
      itemId: [entry.id, variant.variantId, recording.id],
      groupId: [entry.id],
      personId: [village.elder.personId],
      deviceId: ['0'.repeat(64)],
      attachmentId: [recording.id],
      part: ['1'],
      withdrawalId: [entry.id],
      consentId: [consent.id],
      noteId: [entry.id],
      cardId: [entry.id],
      variantId: [variant.variantId],
    },
    queries: {
      compareVersions: ['?from=1&to=draft'],
      listAttachments: [`?subjectType=entry&subjectId=${entry.id}`],
      listNotes: [`?subjectType=entry&subjectId=${entry.id}`],
      listAuditEvents: ['?limit=200'],
      printSheet: ['?layout=month-cards'],
      readSheet: ['?layout=year-board'],
    },
  };
  // What the sky says of a place names no giver.
  for (const endpoint of READING.filter(({ path }) => !path.startsWith('/api/places/'))) {
    for (const path of pathsOf(endpoint, askable)) {
      if ((await textOf(client, path, endpoint)).includes(word)) found.push(path);
    }
  }
  return found;
}
type Given = Awaited<ReturnType<typeof give>>;

describe('a giver who is not named', () => {
  it('is named to nobody, wherever they gave something; they themselves read their name', async () => {
    const given = await give('not-named');
    await publish(village, await submit(village.officer, calendar.id));
    for (const client of [village.elder2, observer]) expect(await readsAt(client, NAME, given)).toEqual([]);
    // What people wrote themselves is theirs to take along, the name in it, too.
    expect(await readsAt(village.officer, NAME, given)).toEqual(['/api/privacy/own-data']);
    expect((await readsAt(village.elder, NAME, given)).length).toBeGreaterThan(4);
  }, 120_000);

  it('is known to the steward in the register alone, who has to know whom to ask again', async () => {
    const given = await give('not-named');
    const path = `/api/communities/${village.steward.communityId}/items/entry/${given.entry.id}/consents`;
    const seen = async (client: Client) => {
      const { items, giverName } = (await client.get(path).expect(200)).body as ItemConsents;
      return [giverName, ...items.map(({ giverName: name, content }) => [name, content.giverId])];
    };
    expect(await seen(village.steward)).toEqual([NAME, [NAME, village.elder.personId]]);
    expect(await seen(village.officer)).toEqual(['', ['', null]]);
  });

  it('keeps their name where somebody writes over what they were shown', async () => {
    const { consent, variant, entry } = await give('role');
    const change = { content: { ...consent.content, giverName: GIVER_BY_ROLE, giverId: null }, version: 1 };
    await village.officer.put(consentsPath(village.officer, consent.id), change).expect(200);
    const path = `${variantsPath(entry.id)}/${variant.variantId}`;
    const content = { ...variant.content, giver: GIVER_BY_ROLE, giverId: null, note: 'Later' };
    await village.officer.put(path, { content, version: 1 }).expect(200);
    expect(await tablesWith(api, GIVER_BY_ROLE)).toEqual([]);
    const { items } = (await village.elder.get(variantsPath(entry.id)).expect(200)).body as {
      items: Variant[];
    };
    expect(items).toMatchObject([{ content: { giver: NAME, note: 'Later' } }]);
  });
});

describe('a giver who is named by role', () => {
  it('is a code in timings, consents and tellings', async () => {
    const { entry, consent } = await give('role');
    const { items } = (await village.officer.get(variantsPath(entry.id)).expect(200)).body as {
      items: Variant[];
    };
    expect(items).toMatchObject([{ content: { giver: GIVER_BY_ROLE, giverId: null } }]);
    const read = await village.officer.get(consentsPath(village.officer, consent.id)).expect(200);
    expect(read.body).toMatchObject({ giverName: GIVER_BY_ROLE, content: { giverName: GIVER_BY_ROLE } });
    const version = await publish(village, await submit(village.officer, calendar.id));
    const [frozen] = (await readVersion(village.officer, version)).entries;
    expect(frozen).toMatchObject({ variants: [{ content: { giver: GIVER_BY_ROLE } }] });
  });

  it('is a code beside what a figure’s people tell, and keeps the name there', async () => {
    const sharing = details({ naming: 'role' });
    const telling = { toldBy: NAME, text: 'Three men carry it.' };
    const figure = await addFigure(village.officer, { variants: [telling], sharing });
    const path = `/api/communities/${village.officer.communityId}/figures/${figure.id}`;
    const seen = (await village.elder.get(path).expect(200)).body as Figure;
    expect(seen.variants).toEqual([{ ...telling, toldBy: GIVER_BY_ROLE }]);
    const changed = { ...figureInput({ variants: [telling], sharing }), story: 'Told anew', version: 1 };
    await village.officer.put(path, changed).expect(200);
    const own = (await village.officer.get(path).expect(200)).body as Figure;
    expect(own.variants).toEqual([telling]);
  });

  it('is not told by a note that they wrote, where they wish so', async () => {
    const entry = await addEntry(village.officer, calendar.id);
    const note = await addNote(village.elder, { subjectId: entry.id });
    const sharing = { level: 'village', ...details({ naming: 'not-named' }) };
    const path = `/api/communities/${village.elder.communityId}/items/note/${note.id}/sharing`;
    await village.elder.put(path, { sharing, version: 1 }).expect(200);
    expect((await notesOn(village.officer, 'entry', entry.id))[0]?.authorName).toBe('');
    expect((await notesOn(village.elder, 'entry', entry.id))[0]?.authorName).toBe('Elder A-1');
  });
});

describe('a name that is taken off an entry', () => {
  it('is nowhere any more: not in timings, recordings and consents of the same giver, nor in any table', async () => {
    const given = await give('named');
    await publish(village, await submit(village.officer, calendar.id));
    expect((await readsAt(observer, NAME, given)).length).toBeGreaterThan(2);
    await takeOff(given.entry);
    for (const client of [village.officer, village.steward, village.elder, observer]) {
      expect(await readsAt(client, NAME, given)).toEqual([]);
    }
    expect(await tablesWith(api, NAME)).toEqual([]);
  }, 120_000);

  it('leaves the names of others who gave beside it', async () => {
    const { entry } = await give('named');
    const other = variantInput({ giver: 'Marrun', giverId: village.elder2.personId });
    await village.officer.post(variantsPath(entry.id), other).expect(201);
    await takeOff(entry);
    const { items } = await timings(entry);
    expect(items.map(({ content }) => content.giver).sort()).toEqual(['', 'Marrun']);
  });

  it('leaves what was agreed as it is, and it can be asked for again without a name', async () => {
    const { entry, consent } = await give('named');
    await takeOff(entry);
    const path = consentsPath(village.officer, consent.id);
    const read = (await village.officer.get(path).expect(200)).body as {
      content: object;
      version: number;
      uses: string[];
    };
    expect(read.uses).toEqual(['keep', 'show']);
    await village.officer.put(path, { content: read.content, version: read.version }).expect(200);
  });

  const timings = async ({ id }: Entry) =>
    (await village.officer.get(variantsPath(id)).expect(200)).body as { items: Variant[] };
  const takeOff = ({ id }: Entry) =>
    village.elder
      .post(`/api/communities/${village.elder.communityId}/items/entry/${id}/name-removal`)
      .expect(204);
});
