import { LetterChoiceBoard } from '#src/features/letters/components/letter-choice-board.js';
import { AccountPage } from '#src/features/session/components/account-page.js';

export function Component() {
  return <AccountPage letters={<LetterChoiceBoard />} />;
}
