import { expect, type Page } from '@playwright/test';
import type { CalendarFile } from '#shared/contracts/calendar-file.js';
import type { SessionState } from '#shared/contracts/session.js';
import { attachmentInput } from './attachment-api.js';
import { plainPicture } from './media.js';

/** The person on the page adds a picture for the village to an entry of a calendar's file, by the office's name of it. */
export async function addPictureTo(page: Page, file: CalendarFile, titleOfficer: string): Promise<void> {
  const entry = file.entries.find(({ content }) => content.titleOfficer === titleOfficer);
  const session = (await (await page.request.get('/api/session')).json()) as SessionState;
  const input = attachmentInput({
    subjectType: 'entry',
    subjectId: entry?.entryId ?? '',
    title: 'A handful',
  });
  const answer = await page.request.post(
    `/api/communities/${session.memberships?.[0]?.communityId ?? ''}/attachments`,
    {
      headers: { 'X-CSRF-Token': session.csrfToken },
      multipart: {
        meta: JSON.stringify(input),
        file: { name: 'handful.png', mimeType: 'image/png', buffer: await plainPicture() },
      },
    },
  );
  expect(answer.status()).toBe(201);
}
