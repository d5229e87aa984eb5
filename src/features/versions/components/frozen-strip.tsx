import { isStarLead } from '#shared/calendar/entry-model.js';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { boardOf } from '#shared/calendar/variants.js';
import type { FrozenMarker, Version } from '#shared/contracts/versions.js';
import { dayNumberOf } from '#shared/kernel/iso-date.js';
import { useDateWords } from '#src/lib/date-words.js';
import { todayIn } from '#src/lib/days.js';
import { windowDayNumbers } from '#src/lib/entry-words.js';
import { useLaneWords } from '#src/lib/lane-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { useWideScreen } from '#src/lib/wide-screen.js';
import { More } from '#src/ui/fold.js';
import { useSignLanes } from '#src/lib/sign-lanes.js';
import { MarkerIcon } from '#src/ui/icons/marker-icon.js';
import { LaneKey, WindowKey } from '#src/ui/pictures/lane-key.js';
import { YearBoard } from '#src/ui/pictures/year-board.js';

/** The year of a frozen version, by the days that the board goes by; on a phone each entry carries its own line instead. */
export function FrozenStrip({ version }: { version: Version }) {
  const { t } = useTranslation(['versions', 'calendars']);
  const dates = useDateWords();
  const laneWords = useLaneWords();
  const isWide = useWideScreen();
  const names = useMemo(
    () => new Map(version.header.markers.map((marker) => [marker.markerKey, marker])),
    [version.header.markers],
  );
  const signLanes = useSignLanes(version.entries, names);
  const { header, entries } = version;
  const { year } = header;
  if (!isWide || entries.length === 0) return null;
  const today = todayIn(header.place.timeZone);
  return (
    <section className="board mb-4" aria-label={t('page.strip')}>
      <YearBoard
        span={{ first: dayNumberOf(year, 1, 1), last: dayNumberOf(year, 12, 31) }}
        months={dates.months(year)}
        lanes={[
          ...starLanesOf(version).map((marker) => ({
            key: marker.markerKey,
            name: markerName(marker),
            icon: <MarkerIcon markerKey={marker.markerKey} size={20} />,
            segments: marker.strip,
            label: laneWords(markerName(marker), marker.strip),
          })),
          ...signLanes,
        ]}
        bars={entries.flatMap((entry) => {
          const { window } = boardOf(entry);
          return window
            ? [
                {
                  key: entry.entryId,
                  name: entry.content.titleOfficer,
                  days: windowDayNumbers(window),
                  kind: entry.content.protectiveWatch ? ('watch' as const) : ('work' as const),
                },
              ]
            : [];
        })}
        barsName={t('page.work')}
        label={t('page.picture', { year, count: entries.length })}
        today={dayNumberOf(today.year, today.month, today.day)}
      />
      <More label={t('calendars:strip.howToRead')}>
        <LaneKey />
        <div className="mt-2">
          <WindowKey kinds={['best', 'margin', 'watch', 'fixed']} />
        </div>
      </More>
    </section>
  );
}

/**
 * Stars whose first or last days lead, in the order in which the entries bring them, not in that of their keys. A star
 * that is named by a sign of the sky only has that sign's lane.
 */
function starLanesOf({ header, entries }: Version): FrozenMarker[] {
  const keys = entries.flatMap(({ content: { lead } }) => (isStarLead(lead) ? [lead.markerKey] : []));
  return header.markers
    .filter(({ markerKey }) => keys.includes(markerKey))
    .sort((a, b) => keys.indexOf(a.markerKey) - keys.indexOf(b.markerKey));
}
