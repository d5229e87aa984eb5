import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { LetterEntity } from '#server/db/entities/letter.entity.js';
import type { LetterChoice, StillToAsk } from '#shared/contracts/letters.js';
import type { AddedPerson } from '#shared/contracts/people.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  answerAll,
  beginCalendar,
  openVillage,
  submit,
  versionPath,
} from '#tests/support/calendar-api.js';
import { addGroup, details } from '#tests/support/sharing-api.js';
import { linkOf, openTestPost } from '#tests/support/letters.js';

const post = openTestPost();
let api: TestApi;
beforeAll(async () => {
  api = await openTestApi({ mailer: post });
});
beforeEach(async () => {
  await api.reset();
  Object.assign(post, { sent: [], trouble: null, attempts: 0 });
  // Noon at the village: nobody's quiet hours.
  at('2026-12-01T09:00:00Z');
});
afterAll(() => api.close());

const at = (text: string) => {
  api.clock.set(new Date(text));
};
const round = async () => {
  await api.app.letters?.run();
};
const rows = () => api.dataSource.getRepository(LetterEntity);
const receivers = () => post.sent.map(({ to }) => to.address.split('@')[0]).sort();

async function ask(): Promise<void> {
  await (await api.visitor()).post('/api/letters/reset', { email: 'officer@dawnpeg.example' }).expect(204);
}

async function inReview() {
  const village = await openVillage(api);
  const calendar = await beginCalendar(village);
  await addEntry(village.officer, calendar.id, { titleOfficer: 'A secret rite' });
  return { ...village, version: await submit(village.officer, calendar.id) };
}

async function choose(client: Client, change: Partial<LetterChoice>): Promise<void> {
  const { lettersOn: _on, ...choice } = (await client.get('/api/letters/choice').expect(200))
    .body as LetterChoice;
  await client.put('/api/letters/choice', { ...choice, ...change }).expect(200);
}

describe('the outbox', () => {
  it('tries again after growing pauses with the same Message-ID, and the letter arrives once', async () => {
    await ask();
    post.trouble = 'unreachable';
    await round();
    await round();
    expect(post.attempts).toBe(1);
    at('2026-12-01T09:01:00Z');
    await round();
    at('2026-12-01T09:02:00Z');
    await round();
    expect(post.attempts).toBe(2);
    post.trouble = null;
    at('2026-12-01T09:06:00Z');
    await round();
    await round();
    const [row] = await rows().find();
    expect(post.sent.map(({ messageId }) => messageId)).toEqual([`<${row?.id ?? ''}@dawnpeg.example>`]);
    expect(row).toMatchObject({ state: 'sent', attempts: 3, reason: null });
  });

  it('sends a letter once when two processes look at the same moment', async () => {
    await ask();
    const first = api.app;
    api.restart();
    await Promise.all([first.letters?.run(), api.app.letters?.run()]);
    expect([post.sent.length, post.attempts]).toEqual([1, 1]);
  });

  it('never sends again what a process was sending when it ended', async () => {
    await ask();
    post.trouble = 'lost';
    await expect(round()).rejects.toThrow('the process ended');
    post.trouble = null;
    at('2026-12-01T09:11:00Z');
    await round();
    expect([post.sent.length, (await rows().find())[0]?.state]).toEqual([0, 'unsure']);
  });

  it.each([
    ['refused', 'given-up'],
    ['unsure', 'unsure'],
  ] as const)('does not try again what was %s', async (trouble, state) => {
    await ask();
    post.trouble = trouble;
    await round();
    at('2026-12-01T10:00:00Z');
    await round();
    expect([post.attempts, (await rows().find())[0]?.state]).toEqual([1, state]);
  });

  it('gives up in the end and keeps the reason', async () => {
    await ask();
    post.trouble = 'unreachable';
    await round();
    at('2026-12-01T11:00:00Z');
    await round();
    expect((await rows().find())[0]).toMatchObject({ state: 'given-up', reason: 'unreachable', email: null });
  });
});

describe('a submission', () => {
  it('brings each elder one letter that says only that something waits, with a link', async () => {
    const { version } = await inReview();
    await round();
    await round();
    expect(receivers()).toEqual(['elder', 'elder2', 'elder3']);
    const [letter] = post.sent;
    expect(linkOf(letter)).toBe(`/calendars/${version.calendarId}/versions/1/review`);
    expect(JSON.stringify(post.sent)).not.toMatch(/secret rite|Beyno/u);
  });

  it('reminds after three and ten days, and then no more', async () => {
    const { elder2, elder3, version } = await inReview();
    await round();
    await answerAll(elder2, version);
    await answerAll(elder3, version);
    post.sent = [];
    at('2026-12-03T09:00:00Z');
    await round();
    expect(receivers()).not.toContain('elder');
    for (const day of ['04', '05', '11', '12', '20']) {
      at(`2026-12-${day}T09:30:00Z`);
      await round();
    }
    expect(post.sent.filter(({ to }) => to.address === 'elder@dawnpeg.example')).toHaveLength(2);
  });

  it('waits for the end of quiet hours, and is not written about once it is answered', async () => {
    const { elder, elder2, version } = await inReview();
    await choose(elder2, { quietHours: { fromHour: 0, toHour: 23 } });
    at('2026-12-01T19:00:00Z');
    await round();
    expect(receivers()).toEqual([]);
    await answerAll(elder, version);
    at('2026-12-02T09:00:00Z');
    await round();
    // Elder has one about signing, none about what is answered; for Elder 2 these hours are quiet too.
    expect(receivers()).toEqual(['elder', 'elder3']);
    expect(post.sent.map(({ to }) => to.address)).not.toContain('elder2@dawnpeg.example');
    at('2026-12-02T20:00:00Z');
    await round();
    expect(receivers()).toContain('elder2');
  });

  it('comes as one letter in the morning to whoever chose that, and not at all to whoever wants none', async () => {
    const { elder, elder2 } = await inReview();
    await choose(elder, { rhythm: 'daily' });
    await choose(elder2, { channel: 'none' });
    await round();
    expect(receivers()).toEqual(['elder3']);
    at('2026-12-02T07:30:00Z');
    await round();
    expect(receivers()).toEqual(['elder', 'elder3']);
    expect(post.sent.at(-1)?.subject).toBe('1 thing waits for you in Upper Tazimel');
  });

  it('shows the officer who is still to be asked, who wants a visit, and what became of the letter', async () => {
    const { officer, elder, elder2, elder3, version } = await inReview();
    await choose(elder, { visitMe: true, channel: 'none' });
    await answerAll(elder3, version);
    await round();
    const path = `/api/communities/${officer.communityId}/still-to-ask`;
    const { items } = (await officer.get(path).expect(200)).body as { items: StillToAsk[] };
    const of = (client: Client) => items.find(({ personId }) => personId === client.personId);
    expect(of(elder)).toMatchObject({ does: 'answer', visitMe: true, letter: 'none' });
    expect(of(elder2)).toMatchObject({ does: 'answer', visitMe: false, letter: 'sent' });
    expect(of(officer)).toBeUndefined();
  });
});

describe('whoever keeps an entry with others', () => {
  async function keptInReview() {
    const village = await openVillage(api);
    const observer = await api.signIn('observer');
    const group = await addGroup(village.elder, 'Lamp-makers', [village.elder, observer]);
    const calendar = await beginCalendar(village);
    await addEntry(village.officer, calendar.id);
    const kept = await addEntry(village.elder, calendar.id, {
      ...{ titleOfficer: 'Lamp evening', sharingLevel: 'group' },
      sharing: details({ groupId: group.id }),
    });
    const version = await submit(village.officer, calendar.id);
    const own = `${versionPath(version)}/own-entries/${kept.id}/answer`;
    return { ...village, observer, version, own };
  }
  const toObserver = () => post.sent.filter(({ to }) => to.address === 'observer@dawnpeg.example');

  it('gets a letter that says only that something waits, with a link to what they keep, and is reminded', async () => {
    const { version } = await keptInReview();
    await round();
    await round();
    expect(receivers()).toEqual(['elder', 'elder2', 'elder3', 'observer']);
    expect(toObserver().map(linkOf)).toEqual([`/calendars/${version.calendarId}/versions/1/own`]);
    expect(JSON.stringify(post.sent)).not.toMatch(/Lamp/u);
    at('2026-12-04T09:30:00Z');
    await round();
    expect(toObserver()).toHaveLength(2);
  });

  it('is written to no more once they have answered', async () => {
    const { observer, own } = await keptInReview();
    await round();
    await observer.put(own, { answer: 'agree', note: '' }).expect(200);
    at('2026-12-04T09:30:00Z');
    await round();
    expect(toObserver()).toHaveLength(1);
  });

  it('stands on nobody’s list: who keeps what is theirs to know', async () => {
    const { observer, officer, steward } = await keptInReview();
    await round();
    for (const client of [officer, steward]) {
      const { text } = await client.get(`/api/communities/${client.communityId}/still-to-ask`).expect(200);
      expect(text).toContain('Elder A-2');
      expect(text).not.toContain(observer.personId);
    }
  });
});

describe('whoever has no e-mail address', () => {
  it('gets no letter and no invitation, and is visited', async () => {
    const { steward, officer } = await inReview();
    const people = `/api/communities/${steward.communityId}/people`;
    const added = await steward
      .post(people, { email: '', displayName: 'Orra', roles: ['elder'] })
      .expect(201);
    const { id } = (added.body as AddedPerson).person;
    await steward
      .post(`${people}/${id}/invitation`)
      .expect(409)
      .expect(({ body }) => {
        expect(body).toMatchObject({ reason: 'no-address' });
      });
    await round();
    expect(receivers()).toEqual(['elder', 'elder2', 'elder3']);
    expect(await rows().countBy({ personId: id })).toBe(0);
    const path = `/api/communities/${officer.communityId}/still-to-ask`;
    const { items } = (await officer.get(path).expect(200)).body as { items: StillToAsk[] };
    expect(items.find(({ personId }) => personId === id)).toMatchObject({ visitMe: true, letter: 'none' });
  });
});

describe('how a person is asked', () => {
  it('is saved over the state that was seen, and answers 409 with both otherwise', async () => {
    const elder = await api.signIn('elder');
    const choice = { channel: 'e-mail', rhythm: 'daily', visitMe: true, quietHours: null, version: 0 };
    const saved = await elder.put('/api/letters/choice', choice).expect(200);
    expect(saved.body).toMatchObject({ rhythm: 'daily', visitMe: true, quietHours: null, version: 1 });
    const late = await elder.put('/api/letters/choice', { ...choice, visitMe: false });
    expect(late.status).toBe(409);
    expect(late.body).toMatchObject({ current: { visitMe: true }, sent: { visitMe: false } });
  });
});
