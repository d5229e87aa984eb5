import { afterEach, describe, expect, it, vi } from 'vitest';
import type { Role } from '#shared/contracts/people.js';
import { askEarly } from '#src/features/calendars/api/ask-early.js';
import { answerWith } from '#tests/support/answers.js';
import { draftServer } from '#tests/support/draft-server.js';
import { CALENDAR, tazimelMarkers, YEAR } from '#tests/support/draft-of-tazimel.js';
import { OFFICER, testQueryClient } from '#tests/support/on-board.js';
import { starTable } from '#tests/support/stars-of-tazimel.js';

const { draft, server, calendarPath } = draftServer(await tazimelMarkers(), await starTable(YEAR));

/** What is asked for when somebody with this role opens the draft. */
async function asked(role: Role): Promise<string[]> {
  const memberships = OFFICER.memberships?.map((each) => ({ ...each, roles: [role] })) ?? null;
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

  it('is not asked for by who may not read drafts', async () => {
    expect(await asked('observer')).toEqual(['/api/session', calendarPath]);
  });
});
