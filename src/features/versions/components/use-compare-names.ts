import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { Comparison } from '#shared/contracts/versions.js';
import { calendarQuery, markersQuery, versionQuery } from '#src/lib/calendar-queries.js';
import type { NamesByKey } from '#src/lib/entry-words.js';

const NO_NAMES: NamesByKey = new Map();

/** Names of the markers on both sides: frozen ones come with their version, the draft's from the place's stars. */
export function useCompareNames(calendarId: string, { from, to, year }: Comparison): NamesByKey {
  const before = useSideNames(calendarId, from, year);
  const after = useSideNames(calendarId, to, year);
  return useMemo(() => new Map([...before, ...after]), [before, after]);
}

function useSideNames(calendarId: string, side: string, year: number): NamesByKey {
  const isDraft = side === 'draft';
  const { data: calendar } = useQuery({ ...calendarQuery(calendarId), enabled: isDraft });
  const { data: markers } = useQuery({
    ...markersQuery(calendar?.placeId ?? '', year),
    enabled: isDraft && calendar !== undefined,
  });
  const { data: version } = useQuery({
    ...versionQuery(calendarId, isDraft ? 0 : Number(side)),
    enabled: !isDraft,
  });
  return useMemo(() => {
    if (isDraft) return markers?.byKey ?? NO_NAMES;
    return new Map(version?.header.markers.map((marker) => [marker.markerKey, marker]) ?? []);
  }, [isDraft, markers, version]);
}
