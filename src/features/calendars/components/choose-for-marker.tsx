import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import type { Calendar } from '#shared/contracts/calendars.js';
import { skySignIconKey } from '#shared/sheet/lead-icons.js';
import { markersQuery } from '#src/lib/calendar-queries.js';
import { useCurrentPlace } from '#src/lib/community.js';
import { useEntryWords } from '#src/lib/entry-words.js';
import type { NamesByKey } from '#src/lib/marker-names.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { PhenomenonIcon } from '#src/ui/icons/phenomenon-icon.js';
import { Board } from '#src/ui/surfaces.js';
import type { WantedMarker } from '../model/wanted-marker.js';

const NO_NAMES: NamesByKey = new Map();

/** Says what the new entry will go by while the person chooses its calendar. */
export function ChooseForMarker({
  wanted,
  calendars,
}: {
  wanted: WantedMarker;
  calendars: readonly Calendar[];
}) {
  const { t } = useTranslation('calendars');
  const words = useEntryWords();
  const { place } = useCurrentPlace();
  const [first] = calendars;
  // Only the name is needed here; the calendar's own page wants the same list next.
  const { data } = useQuery({
    ...markersQuery(first?.placeId ?? place?.id ?? '', first?.year ?? new Date().getFullYear()),
    enabled: first !== undefined || place !== null,
  });
  return (
    <Board className="mb-4" title={t('list.chooseFor')}>
      <p className="flex items-center gap-3">
        {wanted.type === 'sky' ? (
          <SignIcon sign={skySignIconKey(wanted.spec)} size={36} className="shrink-0" />
        ) : (
          <PhenomenonIcon phenomenon={wanted.phenomenon} size={36} />
        )}
        <strong>{words.leadAlone({ lead: wanted }, data?.byKey ?? NO_NAMES)}</strong>
      </p>
    </Board>
  );
}
