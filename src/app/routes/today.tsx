import { AskedBoard } from '#src/features/sharing/components/asked-board.js';
import { SignsBoard } from '#src/features/signs/components/signs-board.js';
import { TodayPage } from '#src/features/today/components/today-page.js';
import { SheetsToReplaceBoard } from '#src/features/withdrawals/components/sheets-to-replace-board.js';

/** Today, with the wider circles that wait for this person's word and the sheets that must come down. */
export function Component() {
  return <TodayPage urgent={<SheetsToReplaceBoard />} asked={<AskedBoard />} signs={<SignsBoard />} />;
}
