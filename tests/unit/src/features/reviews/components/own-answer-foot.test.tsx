import { screen } from '@testing-library/react';
import { afterEach, expect, it, vi } from 'vitest';
import type { OwnAnswer } from '#shared/contracts/reviews.js';
import { OwnAnswerFoot } from '#src/features/reviews/components/own-answer-foot.js';
import { answerWith } from '#tests/support/answers.js';
import { renderOnBoard } from '#tests/support/on-board.js';

const calendarId = '0190a3a0-0000-7000-8000-0000000000c1';
const entryId = '0190a3a0-0000-7000-8000-0000000000f1';
const recordingId = '0190a3a0-0000-7000-8000-0000000000b1';
const answerPath = `/api/calendars/${calendarId}/versions/2/own-entries/${entryId}/answer`;
const CHANGE: OwnAnswer = { answer: 'change-this', note: 'A day later', letStand: false, spoken: null };

const foot = (answer: OwnAnswer | null, onAnswered = () => undefined) => (
  <OwnAnswerFoot
    versionRef={{ calendarId, number: 2 }}
    entryId={entryId}
    answer={answer}
    speak={({ onKept }) => (
      <button
        type="button"
        onClick={() => {
          onKept(recordingId);
        }}
      >
        The recorder
      </button>
    )}
    onAnswered={onAnswered}
  />
);

afterEach(() => {
  vi.unstubAllGlobals();
});

it('keeps a change that was spoken, without a written word', async () => {
  const sent = answerWith({ [`PUT ${answerPath}`]: () => ({ ...CHANGE, note: '' }) });
  const answered = vi.fn();
  const { user } = await renderOnBoard(foot(null, answered));
  await user.click(screen.getByRole('button', { name: 'Change this' }));
  await user.click(screen.getByRole('button', { name: 'Say it by voice' }));
  await user.click(screen.getByRole('button', { name: 'The recorder' }));
  await screen.findByText('Change this: kept.');
  expect(sent.at(-1)?.body).toEqual({ answer: 'change-this', note: '', recordingId });
  expect(answered).toHaveBeenCalledOnce();
});

it('offers to let a difference stand, and says so once it does', async () => {
  const sent = answerWith({ [`POST ${answerPath}/stand`]: () => ({ ...CHANGE, letStand: true }) });
  const { user, unmount } = await renderOnBoard(foot(CHANGE));
  await user.click(screen.getByRole('button', { name: /stand/iu }));
  await vi.waitFor(() => {
    expect(sent.some(({ method }) => method === 'POST')).toBe(true);
  });
  unmount();
  await renderOnBoard(foot({ ...CHANGE, letStand: true }));
  expect(screen.queryByRole('button', { name: /stand/iu })).toBeNull();
});
