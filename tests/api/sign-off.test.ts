import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { AuditEventEntity } from '#server/db/entities/audit-event.entity.js';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { Community, SignOffRule } from '#shared/contracts/people.js';
import type { AnswerInput } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  answerAll,
  outcomes,
  openSubmission,
  readVersion,
  reasonOf,
  says,
  sign,
  signOff,
  submit,
  takeBack,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
let version: Version;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  ({ village, calendar, version } = await openSubmission(api));
});
afterAll(() => api.close());

const answerPath = (index: number, of = version) =>
  `${versionPath(of)}/entries/${of.entries[index]?.entryId ?? ''}/answer`;
const answer = (client: Client, index: number, changes: Partial<AnswerInput> = {}) =>
  client.put(answerPath(index), says(changes));
const askForChange = (client: Client, index = 0) =>
  answer(client, index, { answer: 'change-this', note: 'I wait for the red star' }).expect(200);
const letStand = (client: Client, index = 0) => client.post(`${answerPath(index)}/stand`);

describe('sign-off', () => {
  it('comes with the last signature of the village’s rule, and with nothing else', async () => {
    expect((await readVersion(village.officer, version)).gaps).toMatchObject([
      { code: 'needs-elders', count: 2 },
      { code: 'needs-person', names: ['Elder A-2'] },
      { code: 'needs-one-of', names: ['Elder A-1', 'Elder A-3'] },
      { code: 'needs-steward', count: 1 },
      { code: 'entry-without-agree', names: ['Sow long millet', 'Seed check'], count: 2 },
    ]);
    for (const elder of [village.elder, village.elder2, village.elder3]) await answerAll(elder, version);
    expect((await readVersion(village.officer, version)).state).toBe('in-review');
    await sign(village.steward, version, 'steward').expect(200);
    await sign(village.elder, version, 'elder').expect(200);
    expect((await sign(village.elder3, version, 'elder').expect(200)).body).toMatchObject({
      state: 'in-review',
      gaps: [{ code: 'needs-person', names: ['Elder A-2'] }],
    });
    expect((await sign(village.elder2, version, 'elder').expect(200)).body).toMatchObject({
      state: 'signed-off',
      gaps: [],
      may: { answer: false, signAsElder: false, signClosedBy: 'not-in-review' },
    });
    expect(reasonOf(await answer(village.elder, 0))).toBe('409 not-in-review');
  });

  it('waits while a "change this" stands: the last signature is taken once it is let stand', async () => {
    await answerAll(village.elder, version);
    await answerAll(village.elder2, version);
    await askForChange(village.elder3);
    await sign(village.elder, version, 'elder').expect(200);
    await sign(village.elder2, version, 'elder').expect(200);
    expect(await readVersion(village.steward, version)).toMatchObject({
      gaps: [{ code: 'needs-steward' }, { code: 'change-stands', names: ['Sow long millet'], count: 1 }],
      may: { signAsSteward: false, signClosedBy: 'something-stands' },
    });
    expect(reasonOf(await sign(village.steward, version, 'steward'))).toBe('409 something-stands');
    await letStand(village.elder3).expect(200);
    expect((await readVersion(village.steward, version)).state).toBe('in-review');
    expect((await sign(village.steward, version, 'steward').expect(200)).body).toMatchObject({
      state: 'signed-off',
    });
  });

  it('never comes over a "not for the board": the officer takes the entry out and submits again', async () => {
    await answerAll(village.elder, version);
    await answerAll(village.elder2, version);
    await answer(village.elder3, 1, { answer: 'not-for-the-board' }).expect(200);
    await sign(village.elder, version, 'elder').expect(200);
    await sign(village.elder2, version, 'elder').expect(200);
    expect(reasonOf(await letStand(village.elder3, 1))).toBe('409 no-change-asked');
    expect(reasonOf(await sign(village.steward, version, 'steward'))).toBe('409 something-stands');
    await takeBack(village.officer, version);
    const gone = version.entries[1]?.entryId ?? '';
    await village.officer.delete(`/api/calendars/${calendar.id}/entries/${gone}`).expect(204);
    version = await submit(village.officer, calendar.id);
    expect((await readVersion(village.officer, version)).signatures).toEqual([]);
    for (const elder of [village.elder, village.elder2]) await sign(elder, version, 'elder').expect(200);
    expect((await sign(village.steward, version, 'steward').expect(200)).body).toMatchObject({
      state: 'signed-off',
    });
  });

  it('needs an agree for every entry: "not mine to say" from all is silence', async () => {
    for (const elder of [village.elder, village.elder2]) {
      await answer(elder, 0).expect(200);
      await answer(elder, 1, { answer: 'not-mine-to-say' }).expect(200);
      await sign(elder, version, 'elder').expect(200);
    }
    expect(reasonOf(await sign(village.steward, version, 'steward'))).toBe('409 something-stands');
    await answer(village.elder3, 1).expect(200);
    await sign(village.steward, version, 'steward').expect(200);
  });

  it('goes by the rule as it stood when the draft was submitted', async () => {
    await changeRule({ minElders: 3, mustSign: [], oneOf: [], steward: false });
    expect((await readVersion(village.officer, version)).signOffRule.minElders).toBe(2);
    expect(await signOff(village, version)).toMatchObject({ state: 'signed-off' });
    await takeBack(village.officer, version);
    version = await submit(village.officer, calendar.id);
    expect((await readVersion(village.officer, version)).gaps).toMatchObject([
      { code: 'needs-elders', count: 3 },
    ]);
  });

  it('comes exactly once when the last two sign at once', async () => {
    for (const elder of [village.elder, village.elder2]) await answerAll(elder, version);
    await sign(village.elder, version, 'elder').expect(200);
    const both = await Promise.all([
      sign(village.elder2, version, 'elder'),
      sign(village.steward, version, 'steward'),
    ]);
    expect(outcomes(both)).toEqual(['200', '200']);
    expect(await readVersion(village.officer, version)).toMatchObject({ state: 'signed-off' });
    const events = api.dataSource.getRepository(AuditEventEntity);
    expect(await events.countBy({ action: 'signed-off' })).toBe(1);
    expect(await events.countBy({ action: 'signed' })).toBe(3);
  });

  it('and asking for changes at once: one of them counts, and the draft is locked exactly while it is out', async () => {
    for (const elder of [village.elder, village.elder2]) await answerAll(elder, version);
    await sign(village.elder, version, 'elder').expect(200);
    await sign(village.elder2, version, 'elder').expect(200);
    const [signed, asked] = await Promise.all([
      sign(village.steward, version, 'steward'),
      village.officer.post(`${versionPath(version)}/changes-asked`, { reason: 'taken-back', note: '' }),
    ]);
    // A signed-off submission may still be taken back; one that was taken back is never signed.
    expect(asked.status).toBe(200);
    expect(['200', '409 not-in-review']).toContain(outcomes([signed])[0]);
    expect(await readVersion(village.officer, version)).toMatchObject({ state: 'changes-asked' });
    expect((await village.officer.get(`/api/calendars/${calendar.id}`)).body).toMatchObject({
      locked: false,
    });
  });

  it('does not meet an objection that arrives at the same moment', async () => {
    for (const elder of [village.elder, village.elder2]) await answerAll(elder, version);
    await sign(village.elder, version, 'elder').expect(200);
    await sign(village.elder2, version, 'elder').expect(200);
    const [signed, objected] = await Promise.all([
      sign(village.steward, version, 'steward'),
      answer(village.elder3, 0, { answer: 'not-for-the-board' }),
    ]);
    const { state } = await readVersion(village.officer, version);
    expect(outcomes([signed, objected])).toEqual(
      state === 'signed-off' ? ['200', '409 not-in-review'] : ['200', '409 something-stands'],
    );
  });

  async function changeRule(signOffRule: SignOffRule): Promise<void> {
    const path = `/api/communities/${village.steward.communityId}`;
    const { id: _id, ...settings } = (await village.steward.get(path).expect(200)).body as Community;
    await village.steward.put(path, { ...settings, signOffRule }).expect(200);
  }
});
