import { act, fireEvent, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';

const isText = (value: unknown): value is string => typeof value === 'string';

function Editor({ name = 'entry' }: { name?: string }) {
  const { found, keptAt, keepDraft, dropDraft } = useKeptDraft(name, isText);
  return (
    <>
      <p>{found === null ? 'nothing kept' : `found ${found.value} over ${String(found.baseVersion)}`}</p>
      <p>{keptAt === null ? 'not kept yet' : 'kept'}</p>
      <input aria-label="text" onChange={(event) => keepDraft(event.target.value, 3)} />
      <button onClick={dropDraft}>drop</button>
    </>
  );
}

const type = (value: string) => fireEvent.change(screen.getByLabelText('text'), { target: { value } });

beforeEach(() => {
  localStorage.clear();
  vi.useFakeTimers({ shouldAdvanceTime: true });
});
afterEach(() => {
  vi.useRealTimers();
});

describe('a kept draft', () => {
  it('is found again after the page was left at once, without waiting for the pause', async () => {
    const first = await renderOnBoard(<Editor />);
    type('sow on the 17th');
    act(() => {
      dispatchEvent(new Event('pagehide'));
    });
    first.unmount();
    await renderOnBoard(<Editor />);
    expect(screen.getByText('found sow on the 17th over 3')).toBeDefined();
  });

  it('says when it was kept, after a short pause', async () => {
    await renderOnBoard(<Editor />);
    type('a');
    expect(screen.getByText('not kept yet')).toBeDefined();
    act(() => {
      vi.advanceTimersByTime(500);
    });
    expect(screen.getByText('kept')).toBeDefined();
  });

  it('is gone after saving, also when a keystroke was still on its way', async () => {
    const first = await renderOnBoard(<Editor />);
    type('a');
    fireEvent.click(screen.getByText('drop'));
    first.unmount();
    await renderOnBoard(<Editor />);
    expect(screen.getByText('nothing kept')).toBeDefined();
  });

  it('belongs to one thing and one person', async () => {
    const first = await renderOnBoard(<Editor />);
    type('mine');
    first.unmount();
    const other = await renderOnBoard(<Editor name="another entry" />);
    expect(screen.getByText('nothing kept')).toBeDefined();
    other.unmount();
    const person = { id: '0190a3a0-0000-7000-8000-000000000002', email: 'e', displayName: 'E' };
    await renderOnBoard(<Editor />, { session: { ...OFFICER, person } });
    expect(screen.getByText('nothing kept')).toBeDefined();
  });

  it('of another shape, as an older release kept it, is left alone', async () => {
    localStorage.setItem(
      `dawnpeg.draft.${OFFICER.person?.id ?? ''}.entry`,
      JSON.stringify({ value: { text: 'old' }, keptAt: '2027-01-01T00:00:00Z', baseVersion: null }),
    );
    await renderOnBoard(<Editor />);
    expect(screen.getByText('nothing kept')).toBeDefined();
  });
});
