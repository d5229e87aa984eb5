import { fireEvent, screen } from '@testing-library/react';
import { useState } from 'react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { MapField } from '#src/features/places/components/map-field.js';
import { emptyDraft, type PlaceDraft } from '#src/features/places/model/place-draft.js';
import { renderOnBoard } from '#tests/support/on-board.js';

vi.setConfig({ testTimeout: 20_000 });

afterEach(() => {
  vi.restoreAllMocks();
});

/** A coordinate never breaks. */
const noBreak = (text: string) => text.replaceAll(' ', '\u00a0');

let draft: PlaceDraft;

/** The field with a draft that lives in the test, and both coordinates to type. */
function Field() {
  const [own, setOwn] = useState<PlaceDraft>(() => draft);
  draft = own;
  return (
    <>
      <button
        type="button"
        onClick={() => {
          setOwn({ ...own, latitude: '66 N', longitude: '23 E' });
        }}
      >
        Type them
      </button>
      <MapField
        draft={own}
        change={(patch) => {
          setOwn((before) => ({ ...before, ...(typeof patch === 'function' ? patch(before) : patch) }));
        }}
        touch={() => undefined}
        problem={() => undefined}
      />
    </>
  );
}

describe('the map of a place', () => {
  it('writes the coordinates of a tap, and moves its peg to typed ones', async () => {
    draft = emptyDraft();
    // jsdom has no pointer capture.
    Object.assign(Element.prototype, { setPointerCapture: () => undefined });
    const { user } = await renderOnBoard(<Field />);
    await user.click(screen.getByRole('button', { name: 'Find it on a map' }));
    const map = await screen.findByRole('img', { name: /without a peg/u });
    const paper = map.parentElement as HTMLElement;
    vi.spyOn(paper, 'getBoundingClientRect').mockReturnValue(new DOMRect(0, 0, 600, 300));
    // A quarter of the width east of the middle, which stands at 20° E: 90° further on.
    fireEvent.pointerDown(paper, { pointerId: 1, isPrimary: true, clientX: 450, clientY: 150 });
    fireEvent.pointerUp(paper, { pointerId: 1, isPrimary: true, clientX: 450, clientY: 150 });
    expect([draft.latitude, draft.longitude]).toEqual(['10° 0′ N', '110° 0′ E'].map(noBreak));
    await user.click(screen.getByRole('button', { name: 'Type them' }));
    expect(screen.getByText(/The peg stands at 66° 0′ N, 23° 0′ E/u)).toBeTruthy();
  });

  it('works by keyboard: move, come nearer, and take the middle', async () => {
    draft = emptyDraft();
    const { user } = await renderOnBoard(<Field />);
    await user.click(screen.getByRole('button', { name: 'Find it on a map' }));
    await screen.findByRole('img', { name: /without a peg/u });
    await user.click(screen.getByRole('button', { name: 'Move north' }));
    await user.click(screen.getByRole('button', { name: 'Come nearer' }));
    await user.click(screen.getByRole('button', { name: 'The place is in the middle' }));
    // 60 of 600 pixels are 36 degrees.
    expect([draft.latitude, draft.longitude]).toEqual(['46° 0′ N', '20° 0′ E'].map(noBreak));
  });
});
