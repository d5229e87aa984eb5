import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import type { ReviewedEntry } from '#shared/contracts/season-reviews.js';
import { useSeasonWords } from '#src/features/season-reviews/model/season-words.js';
import { renderOnBoard } from '#tests/support/on-board.js';

function Head({ label, published }: { label: string | null; published: boolean[] }) {
  const entries = published.map((isPublished) => ({ isPublished }) as ReviewedEntry);
  return <p role="note">{useSeasonWords().under({ placeName: 'Upper terraces', label, entries })}</p>;
}

it.each([
  ['2027-1', [true, true], 'Upper terraces. By the calendar 2027-1'],
  [
    '2027-1',
    [true, false],
    'Upper terraces. By the calendar 2027-1, and 1 entry that stands in the draft alone',
  ],
  [
    '2027-1',
    [false, true, false],
    'Upper terraces. By the calendar 2027-1, and 2 entries that stand in the draft alone',
  ],
  [null, [false, false], 'Upper terraces. By the draft: nothing is published'],
])('the head of a year by %s counts what the draft alone holds: %j', async (label, published, line) => {
  await renderOnBoard(<Head label={label} published={published} />);
  expect(screen.getByRole('note').textContent).toBe(line);
});
