import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { DriftPage } from '#src/features/drift/components/drift-page.js';
import { answerWith, type Sent } from '#tests/support/answers.js';
import { drifted } from '#tests/support/finder-of-tazimel.js';
import { renderOnBoard } from '#tests/support/on-board.js';
import { TAZIMEL } from '#tests/support/stars-of-tazimel.js';

vi.setConfig({ testTimeout: 20_000 });

beforeEach(() => {
  vi.useFakeTimers({ shouldAdvanceTime: true, now: new Date('2027-06-07T09:00:00Z') });
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

async function open(markerKey: string, query: string) {
  answerWith({
    [`GET /api/communities/${TAZIMEL.communityId}/places`]: { items: [TAZIMEL], nextCursor: null },
    [`GET /api/places/${TAZIMEL.id}/drift/${markerKey}`]: (_: Sent, search: URLSearchParams) =>
      drifted(markerKey, search),
  });
  const view = await renderOnBoard(<DriftPage />, {
    path: `/stars/${markerKey}/drift?${query}`,
    pattern: '/stars/:markerKey/drift',
  });
  await screen.findByRole('heading', { name: 'Its day through the centuries' });
  return view;
}
const plain = (element: Element | null | undefined) => element?.textContent.replaceAll('\u00a0', ' ') ?? '';

describe('how a marker moved', () => {
  it('is a picture with a sentence: where it began, where it ends, and its pace', async () => {
    await open('pleiades', 'from=-1000&to=2100&year=2027');
    const picture = screen.getByRole('img', { name: /^Pleiades, first morning seen/ });
    expect(picture.getAttribute('aria-label')?.replaceAll('\u00a0', ' ')).toMatch(
      /from 1001 BC to 2100: \d+ April in 1001 BC, \d+ June in 2100\. It moves later by about 1\.3 days in a century\./,
    );
    expect(screen.getByText(/The peg stands at 2027: about \d+.June\./)).toBeTruthy();
  });

  it('has the same as a table with both calendars and the Sun’s longitude', async () => {
    const answer = await drifted('hr2491', new URLSearchParams('from=-1000&to=2000'));
    const { user } = await open('hr2491', 'from=-1000&to=2000');
    await user.click(screen.getByText('Show as a table'));
    const table = screen.getByRole('table', { name: /^Sirius, first morning seen, from 1001 BC to 2000/ });
    const rows = within(table).getAllByRole('row');
    expect(rows).toHaveLength(answer.epochs.length + 1);
    const first = answer.epochs[0]?.phenomena['heliacal-rising'].occurrences[0];
    const text = plain(rows[1]);
    expect(text).toContain('1001 BC');
    expect(text).toContain(`${String(Number(first?.expected.julian.slice(-2)))} `);
    expect(text).toContain(`${first?.sunLongitudeDeg.toFixed(1) ?? ''}°`);
  });

  it('can be taken along as a file, and leads to what falls on the old day now', async () => {
    await open('pleiades', 'from=1000&to=2100&its=heliacal-setting');
    expect(screen.getByRole('link', { name: /as a CSV file/ }).getAttribute('href')).toBe(
      `/api/places/${TAZIMEL.id}/drift/pleiades/table.csv?from=1000&to=2100`,
    );
    expect(
      screen.getByRole('link', { name: 'Which signs fall on its old day now?' }).getAttribute('href'),
    ).toMatch(/^\/finder\?.*by=old&old=pleiades&its=heliacal-setting&since=1500$/);
  });

  it('says so where a star has no such day in any of the years', async () => {
    await open('hr424', 'from=1500&to=2100');
    expect(screen.getByText(/It has no such day here in any of these years\. It never sets/)).toBeTruthy();
    expect(screen.queryByRole('img', { name: /^Polaris/ })).toBeNull();
  });
});
