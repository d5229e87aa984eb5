import { useTranslation } from 'react-i18next';
import type { ListedWord, WordListName } from '#shared/contracts/word-lists.js';
import { Well } from '#src/ui/surfaces.js';
import { useUsualName } from '../model/usual-names.js';

interface RenameNoteProps {
  list: WordListName;
  stored: ListedWord;
  written: ListedWord;
}

/** What a new name does to what is written already, told before it is saved. */
export function RenameNote({ list, stored, written }: RenameNoteProps) {
  const { t } = useTranslation('words');
  const usual = useUsualName(list);
  const named = ({ word, like }: ListedWord) => (word.trim() === '' ? usual(like) : word.trim());
  const names = { before: named(stored), now: named(written) };
  if (stored.key === '' || names.now === '' || names.now === names.before) return null;
  return (
    <Well className="grid gap-1 text-small">
      <p>{t(`form.renames.${list}`, names)}</p>
      <p>{t(`form.asks.${list}`)}</p>
    </Well>
  );
}
