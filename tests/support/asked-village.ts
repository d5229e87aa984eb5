import type { EntryInput } from '#shared/contracts/calendars.js';
import type { ConsentContent, ConsentLine } from '#shared/contracts/consents.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { Client, TestApi } from './api.js';
import { asBuffer } from './bytes-of.js';
import { addEntry, beginCalendar, openVillage, publishDraft, type Village } from './calendar-api.js';
import { consentsPath } from './consent-api.js';
import { readPdfText } from './pdf/read-text.js';

/** A published calendar: farm work, two beliefs (one ticked as agreed in the old way), and what an elder keeps. */
export interface AskedVillage extends Village {
  staff: Client;
  observer: Client;
  calendarId: string;
  millet: string;
  feast: string;
  quietDays: string;
  kept: string;
}

export async function furnishAskedVillage(api: TestApi): Promise<AskedVillage> {
  await api.reset();
  const village = await openVillage(api);
  const [staff, observer] = await Promise.all([api.signIn('staff'), api.signIn('observer')]);
  const { officer, elder } = village;
  const { id: calendarId } = await beginCalendar(village);
  const give = async (by: Client, titleOfficer: string, changes: Partial<EntryInput>) =>
    (await addEntry(by, calendarId, { titleOfficer, ...changes })).id;
  const things = {
    millet: await give(officer, 'Sow long millet', { sharingLevel: 'village', giverId: elder.personId }),
    feast: await give(officer, 'Feast of lamps', { kind: 'belief', agreedToPrint: true }),
    quietDays: await give(officer, 'Quiet days', { kind: 'belief' }),
    kept: await give(elder, 'Words of the kin', { sharingLevel: 'elders' }),
  };
  await publishDraft(village, calendarId);
  return { ...village, ...things, staff, observer, calendarId };
}

/** The words on the published month cards. */
export async function wordsOnSheet(client: Client, calendarId: string): Promise<string> {
  return wordsOfPdf(client, `/api/calendars/${calendarId}/versions/1/sheet.pdf?layout=month-cards`);
}

export async function wordsOfPdf(client: Client, path: string): Promise<string> {
  const answer = await client.get(path).buffer(true).parse(asBuffer).expect(200);
  return readPdfText(answer.body as Buffer).replace(/\s+/gu, ' ');
}

export async function registerOf(client: Client): Promise<ConsentLine[]> {
  return ((await client.get(consentsPath(client)).expect(200)).body as { items: ConsentLine[] }).items;
}

export function changeConsent(client: Client, { id, version }: ConsentLine, content: ConsentContent) {
  return client.put(consentsPath(client, id), { content, version });
}

export function withdrawConsent(client: Client, { id, version }: ConsentLine) {
  return client.post(consentsPath(client, id, '/withdrawal'), { version });
}

/** Field and code of everything that was refused. */
export function refusedFields({ body }: { body: unknown }): [string, string][] | undefined {
  return (body as Problem).errors?.map(({ field, code }) => [field, code]);
}
