import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Problem } from '#shared/contracts/problem.js';
import type { SheetPreview } from '#shared/contracts/sheets.js';
import type { Version } from '#shared/contracts/versions.js';
import type { SheetPage } from '#shared/sheet/primitives.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { asBuffer } from '#tests/support/bytes-of.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  publishDraft,
  submit,
  takeBack,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';
import { addConsent } from '#tests/support/consent-api.js';
import { readPdfPages, ringsIn, scaleBarsIn } from '#tests/support/pdf/pdf-content.js';
import { readPdfText } from '#tests/support/pdf/read-text.js';
import { allWords } from '#tests/support/sheet/page-checks.js';

let api: TestApi;
let village: Village;
let staff: Client;
let calendarId: string;
let published: Version;
/** One calendar with a published version 1, a taken-back submission 2, and an open draft. */
beforeAll(async () => {
  api = await openTestApi();
  village = await openVillage(api);
  staff = await api.signIn('staff');
  const { officer } = village;
  calendarId = (await beginCalendar(village)).id;
  await addEntry(officer, calendarId, { titleOfficer: 'Sow long millet', otherSigns: 'soil wet' });
  await addEntry(officer, calendarId, {
    titleOfficer: 'Kept among the givers',
    kind: 'belief',
    agreedToPrint: false,
    lead: { type: 'marker', markerKey: 'hr2326', phenomenon: 'heliacal-rising', occurrence: 1 },
  });
  const feast = await addEntry(officer, calendarId, { titleOfficer: 'Feast of lamps', kind: 'belief' });
  await addConsent(officer, 'entry', feast.id, { uses: ['keep', 'show', 'print'] });
  await addEntry(officer, calendarId, {
    titleOfficer: 'Grazing opens',
    lead: { type: 'fixed-date', date: { month: 10, day: 4 }, source: 'Water committee' },
  });
  published = await publishDraft(village, calendarId);
  await addEntry(officer, calendarId, { titleOfficer: 'Weed the lower plots' });
  await takeBack(officer, await submit(officer, calendarId));
}, 60_000);
afterAll(() => api.close());

const sheetPath = (number: string | number, query = '') =>
  `/api/calendars/${calendarId}/versions/${number}/sheet${query}`;
const pdfPath = (number: string | number, query = '') => sheetPath(number, `.pdf${query}`);

async function pdf(client: Client, path: string): Promise<Buffer> {
  const answer = await client.get(path).buffer(true).parse(asBuffer).expect(200);
  return answer.body as Buffer;
}
async function preview(client: Client, path: string): Promise<SheetPreview> {
  return (await client.get(path).expect(200)).body as SheetPreview;
}
const pagesOf = ({ pages }: SheetPreview) => pages as unknown as SheetPage[];

describe.each([
  ['month-cards', 12],
  ['year-board', 9],
] as const)('a published version as %s', (layout, leastPages) => {
  let file: Buffer;
  let text: string;
  beforeAll(async () => {
    file = await pdf(staff, pdfPath(1, `?layout=${layout}`));
    text = readPdfText(file).replace(/\s+/gu, ' ');
  }, 60_000);

  it('is a PDF with a ring for each of the 365 days and two bars of 100 mm on every page', () => {
    const pages = readPdfPages(file);
    expect(pages.length).toBeGreaterThanOrEqual(leastPages);
    const rings = pages.flatMap(ringsIn).filter(({ radius }) => Math.abs(radius - 3) < 0.01);
    expect(rings).toHaveLength(365);
    for (const page of pages) {
      const bars = scaleBarsIn(page);
      expect(bars.map(({ axis }) => axis).sort()).toEqual(['across', 'down']);
      for (const { lengthMm } of bars) expect(Math.abs(lengthMm - 100)).toBeLessThan(0.1);
    }
  });

  it('names label, place, contacts, cautions, signers and basis', () => {
    expect(text).toContain('2027-1');
    expect(text).toContain('Upper terraces');
    expect(text).toContain('Weather service: National weather service, call 900.');
    expect(text).toContain('Stars tell the season, not the rain.');
    expect(text).toContain('Signed by Elder A-1, Elder A-2, and Ostrel.');
    expect(text).toContain('three-class rule');
    expect(text).not.toContain('Draft');
  });

  it('says who set a date that work goes by', () => {
    expect(text).toContain('The date is set by: Water committee.');
  });

  it('prints a belief only where its giver agreed, and leaves no trace of another', () => {
    expect(text).toContain('Feast of lamps');
    expect(text).not.toContain('Kept among');
    expect(text).not.toContain('Canopus');
  });

  it('is what the screen showed before', async () => {
    const shown = await preview(staff, sheetPath(1, `?layout=${layout}`));
    expect(shown).toMatchObject({
      layout,
      paper: 'A4',
      label: '2027-1',
      fileBytes: file.length,
      missingLetters: [],
    });
    expect(shown.pages).toHaveLength(readPdfPages(file).length);
    expect(allWords(pagesOf(shown))).toContain('Sow long millet');
  });
});

describe('the file', () => {
  it('is named after village, label and layout, and is a whole version, not what the draft says now', async () => {
    const answer = await staff.get(pdfPath(1)).buffer(true).parse(asBuffer).expect(200);
    expect(answer.headers['content-type']).toBe('application/pdf');
    expect(answer.headers['content-disposition']).toContain(
      "filename*=UTF-8''Upper%20Tazimel%202027-1%20month%20cards.pdf",
    );
    expect(readPdfText(answer.body as Buffer)).not.toContain('Weed the lower plots');
  });

  it('says letters that no typeface has before somebody prints empty boxes', async () => {
    // Adlam, which none of the shipped typefaces can draw.
    const { officer } = village;
    const other = await beginCalendar(village, 2029);
    await addEntry(officer, other.id, { titleVillage: '𞤀𞤣' });
    const shown = await preview(officer, `/api/calendars/${other.id}/versions/draft/sheet`);
    expect(shown.missingLetters).toEqual(['𞤀', '𞤣']);
  });

  it('has a dashed ring for 29 February in a leap year, and 366 rings', async () => {
    const { officer } = village;
    const leap = await beginCalendar(village, 2028);
    await addEntry(officer, leap.id);
    const shown = await preview(officer, `/api/calendars/${leap.id}/versions/draft/sheet`);
    const rings = pagesOf(shown).flatMap(({ primitives }) =>
      primitives.filter(({ type }) => type === 'ring'),
    );
    expect(rings).toHaveLength(366);
    expect(rings.filter((ring) => ring.type === 'ring' && ring.dashed)).toMatchObject([
      { date: '2028-02-29' },
    ]);
  });
});

describe('what is not published', () => {
  it.each([
    ['the draft', 'draft', 'Draft'],
    ['a submission', 2, 'Changes asked'],
  ])('shows its state across every page: %s', async (_what, number, state) => {
    for (const layout of ['month-cards', 'year-board']) {
      const shown = await preview(village.elder, sheetPath(number, `?layout=${layout}`));
      expect(shown.label).toBeNull();
      for (const page of pagesOf(shown)) expect(allWords([page])).toContain(state);
    }
  });

  it('is not there for staff and observers', async () => {
    const observer = await api.signIn('observer');
    for (const client of [staff, observer]) {
      for (const number of ['draft', 2]) {
        await client.get(pdfPath(number)).expect(404);
        await client.get(sheetPath(number)).expect(404);
      }
      await client.get(sheetPath(published.number)).expect(200);
    }
  });

  it('is there for whoever compiles, reviews and signs', async () => {
    for (const client of [village.officer, village.elder, village.steward]) {
      await client.get(sheetPath('draft')).expect(200);
    }
  });
});

describe('the path', () => {
  it.each(['0', '-1', '1.5', 'latest', '2027-1', '01'])('answers 422 to the number %s', async (number) => {
    for (const path of [pdfPath(number), sheetPath(number)]) {
      const answer = await village.officer.get(path);
      expect(answer.status).toBe(422);
      expect((answer.body as Problem).errors).toMatchObject([{ field: 'number', code: 'version-number' }]);
    }
  });

  it('answers 404 to a submission that was never made', async () => {
    await village.officer.get(pdfPath(7)).expect(404);
  });

  it.each([
    ['layout', 'wheel'],
    ['paper', 'A3'],
  ])('answers 422 to a %s that is not offered', async (field, value) => {
    const answer = await village.officer.get(pdfPath(1, `?${field}=${value}`));
    expect(answer.status).toBe(422);
    expect((answer.body as Problem).errors).toMatchObject([{ field, code: 'not-in-list' }]);
  });

  it('is closed to another village', async () => {
    const stranger = await api.signIn('officer2');
    await stranger.get(pdfPath(1)).expect(404);
  });
});

describe('a board that is mended inside its year', () => {
  it.each(['month-cards', 'year-board'])(
    'says what changed as %s, and nothing of what it may not show',
    async (layout) => {
      const said = allWords(pagesOf(await preview(staff, mendedPath(`?layout=${layout}`)))).replaceAll(
        '\n',
        ' ',
      );
      expect(said).toContain('Changed since 2030-1');
      expect(said).toContain('Mend the weir: new');
      expect(said).toContain('Burn the stubble: taken off the board');
      expect(said).not.toContain('Water the young trees');
    },
  );

  it('has a card of its own for it, after the months, in the file as on the screen', async () => {
    const pages = pagesOf(await preview(staff, mendedPath()));
    expect(pages.at(-1)).toMatchObject({ kind: 'words-card', month: null, name: 'Changed since 2030-1' });
    const file = await pdf(staff, mendedPath('', '.pdf'));
    expect(readPdfPages(file)).toHaveLength(pages.length);
    expect(readPdfText(file).replace(/\s+/gu, ' ')).toContain('Burn the stubble: taken off the board');
  });

  let mended: Version;
  const mendedPath = (query = '', ending = '') => `${versionPath(mended)}/sheet${ending}${query}`;
  /** One entry comes, one goes, and one becomes a belief, which is not printed without its giver's yes. */
  beforeAll(async () => {
    const { officer } = village;
    const { id } = await beginCalendar(village, 2030);
    await addEntry(officer, id, { titleOfficer: 'Sow long millet' });
    const gone = await addEntry(officer, id, { titleOfficer: 'Burn the stubble' });
    const held = await addEntry(officer, id, { titleOfficer: 'Water the young trees' });
    const first = await publishDraft(village, id);
    const before = allWords(pagesOf(await preview(staff, `${versionPath(first)}/sheet`)));
    expect(before).toContain('Water the young trees');
    await addEntry(officer, id, { titleOfficer: 'Mend the weir' });
    await officer.delete(`/api/calendars/${id}/entries/${gone.id}`).expect(204);
    const content = { ...held.content, kind: 'belief' as const };
    await officer
      .put(`/api/calendars/${id}/entries/${held.id}`, { content, version: held.version })
      .expect(200);
    mended = await publishDraft(village, id);
  }, 60_000);
});

describe('a recalled version', () => {
  it('still prints for everybody, with its state across', async () => {
    const path = `/api/calendars/${calendarId}/versions/1/recall`;
    await village.officer.post(path, { note: 'A wrong last date' }).expect(200);
    const shown = await preview(staff, sheetPath(1));
    for (const page of pagesOf(shown)) expect(allWords([page])).toContain('Recalled');
  });
});
