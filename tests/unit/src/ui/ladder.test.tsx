import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { Ladder } from '#src/ui/ladder.js';
import { renderOnBoard } from '#tests/support/on-board.js';

it('shows a small hole for each day between, says the number, and shortens long gaps', async () => {
  const rungs = [
    { key: 'a', title: 'Today', daysSinceLast: 0, here: true },
    { key: 'b', title: '8 June', daysSinceLast: 1 },
    { key: 'c', title: '14 July', daysSinceLast: 36 },
  ];
  await renderOnBoard(<Ladder rungs={rungs} label="Coming up" />);
  const gaps = screen.getByRole('list', { name: 'Coming up' }).querySelectorAll('.between');
  expect([...gaps].map((gap) => gap.querySelectorAll('i').length)).toEqual([1, 10]);
  expect(screen.getByText('1 day')).toBeDefined();
  expect(screen.getByText('36 days')).toBeDefined();
});
