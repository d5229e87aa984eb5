import { fireEvent, render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { BarMoves } from '#src/ui/pictures/bar-surface.js';
import { YearBoard, type BoardBar } from '#src/ui/pictures/year-board.js';

const MOVES: BarMoves = {
  mayMove: () => true,
  onMove: () => undefined,
  preview: () => ({ earliest: 0, bestFrom: 0, bestTo: 0, lastAdvised: 0 }),
  words: { label: (name) => name, value: () => 'days', say: () => 'days' },
};

function bar(key: string, earliest: number): BoardBar {
  const days = { earliest, bestFrom: earliest + 2, bestTo: earliest + 8, lastAdvised: earliest + 10 };
  return { key, name: `Work ${key}`, days };
}

const board = (bars: readonly BoardBar[]) => (
  <YearBoard
    span={{ first: 0, last: 364 }}
    {...{ months: [], lanes: [], bars, moves: MOVES }}
    barsName="Work"
    label="The work of the year"
    onChoose={() => undefined}
  />
);

const handles = () => screen.getAllByRole('slider');

describe('handles of bars', () => {
  it('stay where they are in the page while their bars are moved past each other, so none loses the focus', () => {
    const { rerender } = render(board([bar('sow', 100), bar('weed', 160), bar('reap', 220)]));
    const before = handles();
    before[0]?.focus();
    let left = 0;
    before[0]?.addEventListener('blur', () => (left += 1));
    rerender(board([bar('sow', 300), bar('weed', 160), bar('reap', 220)]));
    expect(handles()).toEqual(before);
    expect(document.activeElement).toBe(before[0]);
    expect(left).toBe(0);
  });

  it('follow each other by their days under the keys up and down, whatever the order of the entries', () => {
    render(board([bar('sow', 300), bar('weed', 160), bar('reap', 220)]));
    const [sow, weed, reap] = handles();
    expect(handles().map(({ tabIndex }) => tabIndex)).toEqual([-1, 0, -1]);
    weed?.focus();
    for (const next of [reap, sow]) {
      fireEvent.keyDown(document.activeElement ?? document.body, { key: 'ArrowDown' });
      expect(document.activeElement).toBe(next);
    }
    fireEvent.keyDown(document.activeElement ?? document.body, { key: 'Home' });
    expect(document.activeElement).toBe(weed);
  });
});
