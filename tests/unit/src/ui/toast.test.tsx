import { act, fireEvent, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { useToast } from '#src/ui/toast.js';
import { renderOnBoard } from '#tests/support/on-board.js';

const onUndo = vi.fn();

function Remover() {
  const say = useToast();
  return (
    <>
      <button onClick={() => say('Bird-scaring is taken out.', { onUndo })}>take out</button>
      <button onClick={() => say('Saved.')}>save</button>
    </>
  );
}

const pass = (ms: number) => {
  act(() => {
    vi.advanceTimersByTime(ms);
  });
};

beforeEach(() => {
  onUndo.mockClear();
  vi.useFakeTimers({ shouldAdvanceTime: true });
});
afterEach(() => {
  vi.useRealTimers();
});

describe('a toast', () => {
  it('says what happened in a live region and takes it back once', async () => {
    await renderOnBoard(<Remover />);
    fireEvent.click(screen.getByText('take out'));
    expect(screen.getByRole('status').textContent).toContain('Bird-scaring is taken out.');
    fireEvent.click(screen.getByText('Undo'));
    expect(onUndo).toHaveBeenCalledTimes(1);
    expect(screen.queryByText('Bird-scaring is taken out.')).toBeNull();
  });

  it('leaves by itself, one with Undo later than one without', async () => {
    await renderOnBoard(<Remover />);
    fireEvent.click(screen.getByText('take out'));
    fireEvent.click(screen.getByText('save'));
    pass(7_000);
    expect(screen.queryByText('Saved.')).toBeNull();
    expect(screen.getByText('Bird-scaring is taken out.')).toBeDefined();
    pass(14_000);
    expect(screen.queryByText('Bird-scaring is taken out.')).toBeNull();
  });

  it('stays while somebody stands on it', async () => {
    await renderOnBoard(<Remover />);
    fireEvent.click(screen.getByText('take out'));
    screen.getByText('Undo').focus();
    pass(60_000);
    expect(screen.getByText('Undo')).toBeDefined();
    screen.getByText('Undo').blur();
    pass(2_000);
    expect(screen.queryByText('Undo')).toBeNull();
  });
});
