import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { LETTER_KINDS, LetterEntity, type LetterKind } from '#server/db/entities/letter.entity.js';
import { startDevInbox } from '#server/mail/dev-inbox.js';
import type { DevInbox, ReceivedLetter } from '#server/mail/inbox.js';
import { createSmtpMailer } from '#server/mail/smtp-mailer.js';
import type { AddedPerson } from '#shared/contracts/people.js';
import { openTestApi, TEST_NOW, type TestApi } from '#tests/support/api.js';
import { furnishLevels, type LevelledVillage } from '#tests/support/levelled-village.js';

/**
 * Letters tell only that something waits. One of each kind that there is goes out over SMTP while marker words stand
 * in things of every level, and is read as it arrived: headers, subject and both texts. A new kind has to be made here.
 */
let inbox: DevInbox;
let api: TestApi;
let village: LevelledVillage;
let letters: Map<LetterKind, ReceivedLetter[]>;

beforeAll(async () => {
  inbox = await startDevInbox(0);
  api = await openTestApi({
    mailer: createSmtpMailer({ url: inbox.smtpUrl, from: 'letters@dawnpeg.example' }),
  });
  village = await furnishLevels(api);
  await sendOneOfEach();
  letters = await lettersByKind();
}, 60_000);
afterAll(async () => {
  await api.close();
  await inbox.close();
});

describe('letters of a village with things of every level', () => {
  it('go out in every kind that there is', () => {
    expect([...letters.keys()].sort()).toEqual([...LETTER_KINDS].sort());
  });

  it.each(LETTER_KINDS)('hold no word of anything that was given, whoever gets them: %s', (kind) => {
    for (const letter of letters.get(kind) ?? []) {
      const { recipients, headers, subject, text, html } = letter;
      const told = village.planted.filter(({ word }) =>
        [headers, subject, text, html].some((part) => part.includes(word)),
      );
      expect([kind, recipients, told]).toEqual([kind, recipients, []]);
      // What was searched is a whole letter.
      expect(headers).toContain('Message-ID');
      expect(text).toContain('http');
      expect(html).toContain('href');
    }
  });

  it('are made from rows that hold no word of it either', async () => {
    const rows = JSON.stringify(await api.dataSource.getRepository(LetterEntity).find());
    expect(village.planted.filter(({ word }) => rows.includes(word))).toEqual([]);
  });
});

async function sendOneOfEach(): Promise<void> {
  const { steward, elder, elder2, elder3 } = village;
  // Letters at any hour; the elders have entries to answer in the submission that is in review.
  for (const [client, rhythm] of [
    [elder, 'each'],
    [elder2, 'daily'],
    [elder3, 'each'],
  ] as const) {
    const choice = { channel: 'e-mail', rhythm, visitMe: false, quietHours: null, version: 0 };
    await client.put('/api/letters/choice', choice).expect(200);
  }
  const people = `/api/communities/${steward.communityId}/people`;
  const guest = { email: 'guest@example.org', displayName: 'Guest', roles: ['observer'] };
  const { person } = (await steward.post(people, guest).expect(201)).body as AddedPerson;
  await steward.post(`${people}/${person.id}/invitation`).expect(204);
  const visitor = await api.visitor();
  await visitor.post('/api/letters/reset', { email: 'officer@dawnpeg.example' }).expect(204);
  for (const afterDays of [0, 1, 4]) {
    api.clock.set(new Date(TEST_NOW.getTime() + afterDays * 24 * 60 * 60_000));
    await api.app.letters?.run();
  }
}

/** Each that arrived, with the kind of the row that it was made from. */
async function lettersByKind(): Promise<Map<LetterKind, ReceivedLetter[]>> {
  const rows = await api.dataSource.getRepository(LetterEntity).find();
  const byKind = new Map<LetterKind, ReceivedLetter[]>();
  for (const letter of inbox.letters()) {
    const row = rows.find(({ id }) => letter.messageId.includes(id));
    if (row === undefined) throw new Error(`${letter.messageId} came from nowhere`);
    byKind.set(row.kind, [...(byKind.get(row.kind) ?? []), letter]);
  }
  return byKind;
}
