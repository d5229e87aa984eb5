import { screen } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { Button } from '#src/ui/button.js';
import { renderOnBoard } from '#tests/support/on-board.js';

describe('a closed button', () => {
  it('can be reached, says why, and does nothing', async () => {
    const press = vi.fn();
    const submit = vi.fn();
    const { user } = await renderOnBoard(
      <form onSubmit={submit}>
        <Button type="submit" onClick={press} closedBecause="two entries have no giver">
          Submit for review
        </Button>
      </form>,
    );
    const button = screen.getByRole('button', { name: 'Submit for review' });
    await user.tab();
    expect(document.activeElement).toBe(button);
    expect(document.getElementById(button.getAttribute('aria-describedby') ?? '')?.textContent).toBe(
      'Not yet: two entries have no giver',
    );
    await user.keyboard('{Enter}');
    await user.click(button);
    expect(press).not.toHaveBeenCalled();
    expect(submit).not.toHaveBeenCalled();
  });
});

describe('a busy button', () => {
  it('does not do its work twice', async () => {
    const press = vi.fn();
    const { user } = await renderOnBoard(
      <Button busy onClick={press}>
        Save
      </Button>,
    );
    await user.click(screen.getByRole('button'));
    expect(press).not.toHaveBeenCalled();
  });
});
