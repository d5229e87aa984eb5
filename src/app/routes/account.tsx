import { CardScan } from '#src/features/cards/components/card-scan.js';
import { HelpingBoard } from '#src/features/helping/components/helping-board.js';
import { LetterChoiceBoard } from '#src/features/letters/components/letter-choice-board.js';
import { OwnDataBoard } from '#src/features/privacy/components/own-data-board.js';
import { AccountPage } from '#src/features/session/components/account-page.js';
import { HiddenBoard } from '#src/features/withdrawals/components/hidden-board.js';

export function Component() {
  return (
    <AccountPage
      helping={<HelpingBoard scan={(onFound) => <CardScan onFound={onFound} />} />}
      letters={<LetterChoiceBoard />}
      hidden={<HiddenBoard />}
      ownData={<OwnDataBoard />}
    />
  );
}
