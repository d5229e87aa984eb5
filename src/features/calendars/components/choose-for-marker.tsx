import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import type { Calendar } from '#shared/contracts/calendars.js';
import { markersQuery } from '#src/lib/calendar-queries.js';
import { useCurrentPlace } from '#src/lib/community.js';
import { markerName } from '#src/lib/marker-names.js';
import { Board } from '#src/ui/surfaces.js';
import { PhenomenonIcon } from '#src/ui/icons/phenomenon-icon.js';
import type { WantedMarker } from '../model/wanted-marker.js';

/** Says what the new entry will go by while the person chooses its calendar. */
export function ChooseForMarker({
  wanted,
  calendars,
}: {
  wanted: WantedMarker;
  calendars: readonly Calendar[];
}) {
  const { t } = useTranslation(['calendars', 'sky']);
  const { place } = useCurrentPlace();
  const [first] = calendars;
  // Only the name is needed here; the calendar's own page wants the same list next.
  const { data } = useQuery({
    ...markersQuery(first?.placeId ?? place?.id ?? '', first?.year ?? new Date().getFullYear()),
    enabled: first !== undefined || place !== null,
  });
  const row = data?.byKey.get(wanted.markerKey);
  return (
    <Board className="mb-4" title={t('list.chooseFor')}>
      <p className="flex items-center gap-3">
        <PhenomenonIcon phenomenon={wanted.phenomenon} size={36} />
        <strong>
          {t(wanted.occurrence === 1 ? 'list.chooseForUnder' : 'list.chooseForSecond', {
            marker: row ? markerName(row) : wanted.markerKey,
            phenomenon: t(`sky:phenomenon.${wanted.phenomenon}`),
          })}
        </strong>
      </p>
    </Board>
  );
}
