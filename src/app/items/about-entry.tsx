import { useQuery } from '@tanstack/react-query';
import { Info } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import { calendarQuery } from '#src/lib/calendar-queries.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { AboutItem } from './about-item.js';
import { textsOfEntry } from './noted-texts.js';

/** What belongs to an entry of a version, as a part of the page. */
export function AboutFrozenEntry({ entry }: { entry: VersionEntryBody }) {
  const { calendarId = '' } = useParams();
  const { data: calendar } = useQuery(calendarQuery(calendarId));
  if (calendar === undefined) return null;
  const { communityId } = calendar;
  return (
    <AboutItem
      key={entry.entryId}
      look="plain"
      item={{ communityId, itemType: 'entry', itemId: entry.entryId }}
      texts={textsOfEntry(entry.content)}
    />
  );
}

/** The same one press away, for a list of many entries. */
export function AboutEntryButton({ entry }: { entry: VersionEntryBody }) {
  const { t } = useTranslation('notes');
  const [isOpen, setIsOpen] = useState(false);
  return (
    <>
      <Button
        look="quiet"
        icon={<Info aria-hidden size={20} />}
        onClick={() => {
          setIsOpen(true);
        }}
      >
        {t('aboutEntry')}
      </Button>
      {isOpen && (
        <Dialog
          title={entry.content.titleOfficer}
          isOpen
          closesBeside={false}
          onClose={() => {
            setIsOpen(false);
          }}
        >
          <div className="grid gap-5">
            <AboutFrozenEntry entry={entry} />
          </div>
        </Dialog>
      )}
    </>
  );
}
