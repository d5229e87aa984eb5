import { afterEach, describe, expect, it, vi } from 'vitest';
import type { Role } from '#shared/contracts/people.js';
import { askEarly } from '#src/features/calendars/api/ask-early.js';
import { answerWith } from '#tests/support/answers.js';
import { draftServer } from '#tests/support/draft-server.js';
import { CALENDAR, tazimelMarkers, YEAR } from '#tests/support/draft-of-tazimel.js';
import { OFFICER, testQueryClient } from '#tests/support/on-board.js';
import { starTable } from '#tests/support/stars-of-tazimel.js';

const { draft, server, calendarPath } = draftServer(await tazimelMarkers(), await starTable(YEAR));

/** A village besides the one that the calendar is of. */
const OTHER = { communityId: '0f0f0f0f-0f0f-4f0f-8f0f-0f0f0f0f0f0f' };

/** What is asked for when somebody with this role opens the draft. */
async function asked(role: Role, elsewhere: Role[] = []): Promise<string[]> {
  const here = OFFICER.memberships?.slice(0, 1).map((each) => ({ ...each, roles: [role] })) ?? [];
  const others = elsewhere.flatMap((other) => here.map((each) => ({ ...each, ...OTHER, roles: [other] })));
  const memberships = [...here, ...others];
  const log = answerWith({ ...server(draft({})), 'GET /api/session': { ...OFFICER, memberships } });
  await askEarly(testQueryClient(), CALENDAR.id);
  return log.map(({ path }) => path);
}

afterEach(() => {
  vi.unstubAllGlobals();
});

describe('what a draft shows first', () => {
  it('is asked for at once, the entries before the rest', async () => {
    const [first] = (await asked('officer')).filter(
      (path) => path !== '/api/session' && path !== calendarPath,
    );
    expect(first).toBe(`${calendarPath}/entries`);
  });

  it('does not wait for whose calendar it is where somebody reads drafts in each of their villages', async () => {
    const paths = await asked('officer');
    expect(paths.slice(0, 3)).toEqual([calendarPath, '/api/session', `${calendarPath}/entries`]);
  });

  it('waits for it where they read drafts in one village and not in another', async () => {
    expect(await asked('officer', ['observer'])).toContain(`${calendarPath}/entries`);
    expect(await asked('observer', ['officer'])).not.toContain(`${calendarPath}/entries`);
  });

  it('is not asked for by who may not read drafts', async () => {
    expect(await asked('observer')).toEqual([calendarPath, '/api/session']);
  });
});
