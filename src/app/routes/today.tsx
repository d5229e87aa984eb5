import { AskedBoard } from '#src/features/sharing/components/asked-board.js';
import { TodayPage } from '#src/features/today/components/today-page.js';

/** Today, with the wider circles that wait for this person's word. */
export function Component() {
  return <TodayPage asked={<AskedBoard />} />;
}
