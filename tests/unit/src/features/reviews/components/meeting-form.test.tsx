import { screen, within } from '@testing-library/react';
import { afterEach, expect, it, vi } from 'vitest';
import type { Answer, ElderProgress } from '#shared/contracts/reviews.js';
import { versionsEndpoints, type Version } from '#shared/contracts/versions.js';
import { MeetingForm } from '#src/features/reviews/components/meeting-form.js';
import { answerWith } from '#tests/support/answers.js';
import { renderOnBoard } from '#tests/support/on-board.js';
import { sampleOf } from '#tests/support/sample-of-schema.js';

const ID = '0190a3a0-0000-7000-8000-0000000000c1';
const SECOND = '0190a3a0-0000-7000-8000-0000000000c2';
const sample = sampleOf(versionsEndpoints.read.response, { text: 'Sow', id: ID }) as Version;
const [entry] = sample.entries;
if (entry === undefined) throw new Error('The sample has an entry.');
const version: Version = { ...sample, entries: [entry, { ...entry, entryId: SECOND }] };
const elders = ['Elder A-1', 'Elder A-2'].map((elderName, index): ElderProgress => ({
  ...{ elderId: `0190a3a0-0000-7000-8000-0000000000e${index}`, elderName },
  ...{ answered: 0, of: 2, signed: false, wroteTheDraft: false },
}));
const ownHand = (elder: ElderProgress, entryId: string): Answer => ({
  ...{ id: ID, entryId, entryHash: entry.hash, elderId: elder.elderId, elderName: elder.elderName },
  ...{ answer: 'agree', note: '', letStand: false, recordedByName: null, witness: null },
  ...{ proof: null, spoken: null, answeredAt: '2027-03-01T06:00:00.000Z', mine: false },
});

afterEach(() => {
  vi.unstubAllGlobals();
  localStorage.clear();
});

it('offers boxes only where the elder’s own hand has not answered, and a box pressed again is empty', async () => {
  answerWith({});
  const given = elders.map((elder) => ownHand(elder, SECOND));
  const { user } = await renderOnBoard(<MeetingForm version={version} elders={elders} given={given} />);
  expect(screen.getAllByRole('group', { name: /: answer$/u })).toHaveLength(2);
  screen.getByText('1 entry that every elder answered with their own hand');
  const row = within(screen.getByRole('group', { name: 'Elder A-1: answer' }));
  const agree = row.getByRole('button', { name: 'Agree' });
  await user.click(agree);
  expect(agree.getAttribute('aria-pressed')).toBe('true');
  await user.click(agree);
  expect(agree.getAttribute('aria-pressed')).toBe('false');
  await user.click(screen.getByRole('button', { name: 'Keep what stands on the paper' }));
  await screen.findByText('Nothing is typed in yet.');
});

it('sends nothing before day, witness, picture and the words to a change are there; a reload keeps the marks', async () => {
  const sent = answerWith({});
  const form = <MeetingForm version={version} elders={elders} given={[]} />;
  const { user, unmount } = await renderOnBoard(form);
  const [row] = screen.getAllByRole('group', { name: 'Elder A-2: answer' });
  await user.click(within(row as HTMLElement).getByRole('button', { name: 'Change this' }));
  await user.click(screen.getByRole('button', { name: 'Keep what stands on the paper' }));
  await screen.findByText('Choose the picture of the paper.');
  await screen.findByText('Say what should be different: write it, or speak it.');
  expect(sent.some(({ method }) => method === 'POST')).toBe(false);
  unmount();
  await renderOnBoard(form);
  const [again] = screen.getAllByRole('group', { name: 'Elder A-2: answer' });
  const marked = within(again as HTMLElement).getByRole('button', { name: 'Change this' });
  expect(marked.getAttribute('aria-pressed')).toBe('true');
});
