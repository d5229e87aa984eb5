import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { ConsentLine } from '#shared/contracts/consents.js';
import { openTestApi, TEST_NOW, type Client, type TestApi } from '#tests/support/api.js';
import { addPicture } from '#tests/support/attachment-api.js';
import {
  changeConsent,
  furnishAskedVillage,
  refusedFields,
  registerOf,
  withdrawConsent,
  wordsOnSheet,
  type AskedVillage,
} from '#tests/support/asked-village.js';
import { addEntry, beginCalendar, entriesOf } from '#tests/support/calendar-api.js';
import { BeliefConsents1798400000000 } from '#server/db/migrations/1798400000000-belief-consents.js';
import { addConsent, asked, consentContent, consentsPath } from '#tests/support/consent-api.js';
import { addFigure } from '#tests/support/figure-api.js';

let api: TestApi;
let village: AskedVillage;
beforeAll(async () => {
  api = await openTestApi();
});
afterAll(() => api.close());
beforeEach(async () => {
  village = await furnishAskedVillage(api);
}, 60_000);

const sheet = (client = village.staff) => wordsOnSheet(client, village.calendarId);
const shownTo = async (client: Client, title: string) =>
  (await client.get(`/api/calendars/${village.calendarId}/versions/1`).expect(200)).text.includes(title);

describe('printing', () => {
  it('goes by the tick for print alone: every other yes together prints nothing', async () => {
    expect(await sheet()).toContain('Sow long millet');
    const consent = await addConsent(village.officer, 'entry', village.millet, {
      uses: ['keep', 'show', 'feed', 'message', 'radio', 'training', 'research', 'translation'],
    });
    expect(await sheet()).not.toContain('Sow long millet');
    await changeConsent(village.officer, consent, consentContent({ uses: ['keep', 'show', 'print'] })).expect(
      200,
    );
    expect(await sheet()).toContain('Sow long millet');
  });

  it('of a belief goes by its consent alone, whatever an older tick in the entry says', async () => {
    expect(await sheet()).not.toContain('Feast of lamps');
    await addConsent(village.officer, 'entry', village.feast);
    await addConsent(village.officer, 'entry', village.quietDays, { uses: ['keep', 'show', 'print'] });
    expect(await sheet()).not.toContain('Feast of lamps');
    expect(await sheet()).toContain('Quiet days');
  });

  it('of a belief that was agreed to before there was a register goes on, by a record that is due to be asked', async () => {
    const migrate = async () => {
      const runner = api.dataSource.createQueryRunner();
      await new BeliefConsents1798400000000().up(runner);
      await runner.release();
    };
    await migrate();
    await migrate();
    const lines = await registerOf(village.officer);
    expect(lines).toMatchObject([
      {
        itemId: village.feast,
        state: 'given',
        isDue: true,
        uses: expect.arrayContaining(['print']) as unknown,
      },
    ]);
    const [record] = lines;
    const read = await village.officer.get(consentsPath(village.officer, record?.id)).expect(200);
    expect(read.body).toMatchObject({ content: { proof: null, explanation: 'before there was a register' } });
    expect(await sheet()).toContain('Feast of lamps');
  });

  it('stops while somebody is asked and has not answered: silence is no yes', async () => {
    await addConsent(village.officer, 'entry', village.millet, asked());
    expect(await sheet()).not.toContain('Sow long millet');
    expect(await shownTo(village.staff, 'Sow long millet')).toBe(true);
  });

  it('needs the yes for the village’s own figure that an entry goes by', async () => {
    const { officer } = village;
    const figure = await addFigure(officer);
    const other = await beginCalendar(village, 2028);
    await addEntry(officer, other.id, {
      titleOfficer: 'Weed by the figure',
      lead: { type: 'marker', markerKey: figure.markerKey, phenomenon: 'heliacal-rising', occurrence: 1 },
    });
    const draft = async () =>
      (await officer.get(`/api/calendars/${other.id}/versions/draft/sheet`).expect(200)).text;
    expect(await draft()).toContain('Weed by the figure');
    await addConsent(officer, 'figure', figure.id, { uses: ['keep', 'show'] });
    expect(await draft()).not.toContain('Weed by the figure');
  });

  it('cannot be got round by copying the entry', async () => {
    const { officer } = village;
    await addConsent(officer, 'entry', village.millet, { uses: ['keep', 'show'] });
    await officer.post(`/api/calendars/${village.calendarId}/entries/${village.millet}/copy`).expect(201);
    const draft = await officer.get(`/api/calendars/${village.calendarId}/versions/draft/sheet`).expect(200);
    expect(draft.text).not.toContain('Sow long millet');
  });
});

describe('opening a voice or a picture', () => {
  it('goes by its own tick: without it what is written down stays, and the picture itself is for its sender', async () => {
    const { officer, staff, elder, millet } = village;
    const picture = await addPicture(elder, millet, { subjectType: 'entry' });
    const statuses = async (client: Client) => [
      (await client.get(`/api/attachments/${picture.id}`)).status,
      (await client.get(`/api/attachments/${picture.id}/parts/1`)).status,
      (await client.get(`/api/attachments/${picture.id}/thumbnail`)).status,
    ];
    expect(await statuses(staff)).toEqual([200, 200, 200]);
    const consent = await addConsent(officer, 'entry', millet);
    expect(await statuses(staff)).toEqual([200, 404, 404]);
    expect(await statuses(elder)).toEqual([200, 200, 200]);
    await changeConsent(officer, consent, consentContent({ uses: ['keep', 'show', 'recording'] })).expect(
      200,
    );
    expect(await statuses(staff)).toEqual([200, 200, 200]);
  });
});

describe('showing', () => {
  it.each([
    ['keep', ['show', 'print']],
    ['show', ['keep', 'print']],
  ] as const)('ends at once where the yes to %s is missing, for everybody', async (_use, uses) => {
    await addConsent(village.officer, 'entry', village.millet, { uses: [...uses] });
    for (const client of [village.staff, village.observer, village.officer, village.elder, village.steward]) {
      expect(await shownTo(client, 'Sow long millet')).toBe(false);
    }
    expect(await sheet()).not.toContain('Sow long millet');
  });

  it('ends with a no, and not with “not now”', async () => {
    const { officer } = village;
    const consent = await addConsent(officer, 'entry', village.millet, asked({ answer: 'not-now' }));
    expect(await shownTo(village.staff, 'Sow long millet')).toBe(true);
    await changeConsent(officer, consent, asked({ answer: 'refused' })).expect(200);
    expect(await shownTo(village.staff, 'Sow long millet')).toBe(false);
    expect((await entriesOf(officer, village.calendarId)).map(({ id }) => id)).not.toContain(village.millet);
  });

  it('lasts through the last day of a consent and ends with it, by the clock of the village', async () => {
    await addConsent(village.officer, 'entry', village.millet, {
      uses: ['keep', 'show', 'print'],
      until: '2027-06-10',
    });
    const seen: Record<string, [boolean, boolean, string | undefined]> = {};
    // Upper Tazimel is three hours ahead of universal time.
    for (const at of ['2027-06-10T20:59:00Z', '2027-06-10T21:01:00Z']) {
      api.clock.set(new Date(at));
      const client = await api.signIn('staff');
      const [line] = await registerOf(await api.signIn('steward'));
      seen[at] = [
        await shownTo(client, 'Sow long millet'),
        (await sheet(client)).includes('Sow long millet'),
        line?.state,
      ];
    }
    api.clock.set(TEST_NOW);
    expect(Object.values(seen)).toEqual([
      [true, true, 'given'],
      [false, false, 'lapsed'],
    ]);
  });

  it('comes back with a new yes after one was taken back, and never by asking once more', async () => {
    const { officer, elder } = village;
    const consent = await addConsent(elder, 'entry', village.millet, {
      giverId: elder.personId,
      proof: null,
      uses: ['keep', 'show', 'print'],
    });
    const gone = (await withdrawConsent(officer, consent).expect(200)).body as ConsentLine;
    expect(gone.state).toBe('withdrawn');
    expect(await shownTo(village.staff, 'Sow long millet')).toBe(false);
    const again = await changeConsent(officer, gone, asked()).expect(422);
    expect(refusedFields(again)).toEqual([['content.answer', 'answered-before']]);
    const given = consentContent({ giverId: elder.personId, proof: null, uses: ['keep', 'show', 'print'] });
    await changeConsent(elder, gone, given).expect(200);
    expect(await shownTo(village.staff, 'Sow long millet')).toBe(true);
  });
});
