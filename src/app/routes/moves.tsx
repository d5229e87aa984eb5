import { TakeAlongBoard } from '#src/features/exports/components/take-along-board.js';
import { MovesPage } from '#src/features/imports/components/moves-page.js';

export function Component() {
  return (
    <MovesPage
      takeAlong={({ id }) => <TakeAlongBoard calendarId={id} number="draft" isPublished={false} />}
    />
  );
}
