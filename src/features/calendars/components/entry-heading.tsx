import { useTranslation } from 'react-i18next';
import type { EntryInput } from '#shared/contracts/calendars.js';
import type { Language } from '#shared/contracts/people.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';

/** Picture and name of an entry, in the officer's and the village's words. */
export function EntryHeading({
  id,
  content,
  villageLanguage,
}: {
  id: string;
  content: EntryInput;
  villageLanguage: Language | null;
}) {
  const { t } = useTranslation('calendars');
  return (
    <h2 id={id} className="flex items-center gap-3">
      <SignIcon sign={content.icon} size={40} />
      <span className="min-w-0">
        {content.titleOfficer || t('editor.untitled')}
        {content.titleVillage !== '' && (
          <span className="own-words text-lead text-umber-soft" lang={villageLanguage?.tag}>
            {' · '}
            {content.titleVillage}
          </span>
        )}
      </span>
    </h2>
  );
}
