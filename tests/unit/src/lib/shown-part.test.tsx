import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { MoreOfThem, useShownPart } from '#src/lib/shown-part.js';
import { renderOnBoard } from '#tests/support/on-board.js';

const WORKS = Array.from({ length: 100 }, (_, index) => `Work ${index + 1}`);

function List() {
  const { shown, left, more } = useShownPart(WORKS);
  return (
    <>
      <ul>
        {shown.map((work) => (
          <li key={work}>{work}</li>
        ))}
      </ul>
      <MoreOfThem left={left} more={more} />
    </>
  );
}

it('draws a part of a long list, the rest when asked, and all of it on paper', async () => {
  const { user } = await renderOnBoard(<List />, { path: '/', pattern: '/' });
  expect(screen.getAllByRole('listitem')).toHaveLength(40);
  await user.click(screen.getByRole('button', { name: 'Show more of the other 60' }));
  expect(screen.getAllByRole('listitem')).toHaveLength(80);
  window.dispatchEvent(new Event('beforeprint'));
  expect(screen.getAllByRole('listitem')).toHaveLength(100);
  expect(screen.queryByRole('button')).toBeNull();
});
